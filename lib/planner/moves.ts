import { type Choice, type Draft, visitsOf } from './draft';
import type { FastOption } from './products';
import type { Response } from './response';

/** One way to change a draft; the same draft when it does not apply. */
export type Move = (draft: Draft) => Draft;

const IMPROVEMENT = 1e-6;

/** More or fewer measures on an evening, a dose to another evening, one measure from one dose to another. */
export function fastMoves(choice: Choice, most: readonly number[]): Move[] {
  const evenings = choice.evenings.map((_, evening) => evening);
  const far = Math.max(2, Math.ceil(Math.max(0, ...most) / 6));
  const amounts = evenings.flatMap((evening) => [
    withMeasures(evening, () => 0),
    ...[-far, -1, 1, far].map((by) => withMeasures(evening, (now) => now + by)),
    withMeasures(evening, (now) => (now === 0 ? Math.ceil(most[evening]! / 3) : now)),
  ]);
  const pairs = evenings.flatMap((from) => evenings.filter((to) => to !== from).map((to) => [from, to] as const));
  const shifts = pairs.flatMap(([from, to]): Move[] => [
    (draft) => (draft.measures[from]! > 0 && draft.measures[to] === 0 ? carry(draft, from, to, Infinity) : draft),
    (draft) => (draft.measures[from]! > 1 && draft.measures[to]! > 0 ? carry(draft, from, to, 1) : draft),
  ]);
  return [...amounts, ...shifts];
}

/** One tablet more or fewer, and each other evening on which they may be loaded. */
export function tabletMoves({ tabletEvenings }: Response): Move[] {
  const counts = [-1, 1].map((by): Move => (draft) => ({ ...draft, tablets: draft.tablets + by }));
  const evenings = Array.from({ length: tabletEvenings }, (_, tabletEvening): Move => {
    return (draft) =>
      draft.tablets > 0 && draft.tabletEvening !== tabletEvening ? { ...draft, tabletEvening } : draft;
  });
  return [...counts, ...evenings];
}

function withMeasures(evening: number, change: (now: number) => number): Move {
  return (draft) => {
    const now = draft.measures[evening]!;
    const then = change(now);
    if (then === now) return draft;
    return { ...draft, measures: draft.measures.map((each, index) => (index === evening ? then : each)) };
  };
}

function carry(draft: Draft, from: number, to: number, count: number): Draft {
  const carried = Math.min(count, draft.measures[from]!);
  const by = (evening: number) => (evening === from ? -carried : evening === to ? carried : 0);
  return { ...draft, measures: draft.measures.map((each, evening) => each + by(evening)) };
}

/** Most measures on each evening under the evening's cap. */
export function mostMeasures(fast: FastOption | null, rises: readonly number[]): number[] {
  return rises.map((rise) => (fast ? Math.floor(fast.capRise / rise + 1e-9) : 0));
}

/** Whether a draft keeps to visits, caps and one product in a visit. */
export function allowed(draft: Draft, choice: Choice, most: readonly number[]): boolean {
  const { tablets, tabletEvening, measures } = draft;
  if (tablets < 0 || tablets > (choice.tablets?.most ?? 0) || visitsOf(draft) > choice.visits) return false;
  if (tablets > 0 && measures[tabletEvening]! > 0) return false;
  return measures.every((each, evening) => each >= 0 && each <= most[evening]!);
}

/** Makes moves as long as one of them makes the draft cheaper. */
export function descend(
  start: Draft,
  moves: readonly Move[],
  fits: (draft: Draft) => boolean,
  cost: (draft: Draft) => number,
): { draft: Draft; cost: number } {
  let best = start;
  let least = cost(start);
  for (let still = 0, next = 0; still < moves.length; still++, next = (next + 1) % moves.length) {
    const draft = moves[next]!(best);
    if (draft === best || !fits(draft)) continue;
    const total = cost(draft);
    if (total >= least - IMPROVEMENT) continue;
    [best, least, still] = [draft, total, -1];
  }
  return { draft: best, cost: least };
}
