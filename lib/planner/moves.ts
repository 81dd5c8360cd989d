import { type Choice, type Draft, sumOf, visitsOf } from './draft';
import type { FastOption } from './products';
import type { QuickCost } from './response';

/** One way to change a draft; the same draft when it does not apply. */
export type Move = (draft: Draft) => Draft;

/** Less than a tenth of a hundredth of the currency is no improvement. */
const IMPROVEMENT = 1e-3;
/** An evening's cap is divided into at most so many steps, however small the measure: an eighth of a mg/L each. */
const STEPS_OF_A_CAP = 32;

/** More or fewer measures on an evening, a dose to another evening or half of it, one measure from one dose to another. */
export function fastMoves(choice: Choice, most: readonly number[]): Move[] {
  const evenings = choice.evenings.map((_, evening) => evening);
  const step = Math.max(1, Math.round(Math.max(0, ...most) / STEPS_OF_A_CAP));
  const far = Math.max(2, Math.ceil(Math.max(0, ...most) / 6));
  const amounts = evenings.flatMap((evening) => [
    withMeasures(evening, () => 0),
    ...[-far, -step, step, far].map((by) => withMeasures(evening, (now) => now + by)),
    withMeasures(evening, (now) => (now === 0 ? Math.ceil(most[evening]! / 3) : now)),
  ]);
  const pairs = evenings.flatMap((from) => evenings.filter((to) => to !== from).map((to) => [from, to] as const));
  const shifts = pairs.flatMap(([from, to]): Move[] => [
    (draft) => (draft.measures[from]! > 0 && draft.measures[to] === 0 ? carry(draft, from, to, Infinity) : draft),
    (draft) => {
      const [left, there] = [draft.measures[from]!, draft.measures[to]!];
      return left > step ? carry(draft, from, to, there > 0 ? step : Math.floor(left / 2)) : draft;
    },
  ]);
  return [...amounts, ...shifts];
}

/** Tablets are loaded once and at most once more. */
const MOST_LOADINGS = 2;

/** One tablet more or fewer on an evening, a loading or a tablet to another evening, tablets in place of a fast dose. */
export function tabletMoves({ evenings, tablets }: Choice): Move[] {
  if (!tablets || tablets.most === 0) return [];
  const far = Math.max(2, Math.ceil(tablets.most / 6));
  const all = evenings.map((_, evening) => evening);
  const pairs = all.flatMap((from) => all.filter((to) => to !== from).map((to) => [from, to] as const));
  return [
    ...all.flatMap((evening) => [-far, -1, 1, far].map((by) => withTablets(evening, (now) => now + by))),
    ...pairs.flatMap(([from, to]): Move[] => [
      (draft) => (draft.tablets[to] === 0 ? carryTablets(draft, from, to, Infinity) : draft),
      (draft) => (draft.tablets[from]! > 1 ? carryTablets(draft, from, to, 1) : draft),
    ]),
    ...all.map((evening): Move => {
      const load = withTablets(evening, (now) => now + 1);
      const empty = withMeasures(evening, () => 0);
      return (draft) => (draft.measures[evening]! > 0 ? load(empty(draft)) : draft);
    }),
  ];
}

function withTablets(evening: number, change: (now: number) => number): Move {
  return (draft) => ({ ...draft, tablets: changed(draft.tablets, evening, change(draft.tablets[evening]!)) });
}

function carryTablets(draft: Draft, from: number, to: number, count: number): Draft {
  return draft.tablets[from] === 0 ? draft : { ...draft, tablets: carried(draft.tablets, from, to, count) };
}

function changed(counts: readonly number[], evening: number, count: number): number[] {
  return counts.map((each, index) => (index === evening ? count : each));
}

/** Up to so many from one evening to another. */
function carried(counts: readonly number[], from: number, to: number, count: number): number[] {
  const moved = Math.min(count, counts[from]!);
  return counts.map((each, evening) => each + (evening === from ? -moved : evening === to ? moved : 0));
}

function withMeasures(evening: number, change: (now: number) => number): Move {
  return (draft) => {
    const now = draft.measures[evening]!;
    const then = change(now);
    return then === now ? draft : { ...draft, measures: changed(draft.measures, evening, then) };
  };
}

function carry(draft: Draft, from: number, to: number, count: number): Draft {
  return { ...draft, measures: carried(draft.measures, from, to, count) };
}

/** Most measures on each evening under the evening's cap. */
export function mostMeasures(fast: FastOption | null, rises: readonly number[]): number[] {
  return rises.map((rise) => (fast ? Math.floor(fast.capRise / rise + 1e-9) : 0));
}

/** Whether a draft keeps to visits, caps and one product in a visit. */
export function allowed(draft: Draft, choice: Choice, most: readonly number[]): boolean {
  const { tablets, measures } = draft;
  if (visitsOf(draft) > choice.visits || sumOf(tablets) > (choice.tablets?.most ?? 0)) return false;
  let loadings = 0;
  for (let evening = 0; evening < measures.length; evening++) {
    const [count, each] = [tablets[evening]!, measures[evening]!];
    if (count < 0 || each < 0 || each > most[evening]! || (count > 0 && each > 0)) return false;
    if (count > 0) loadings++;
  }
  return loadings <= MOST_LOADINGS;
}

/** Makes moves as long as one of them makes the draft cheaper. */
export function descend(
  start: Draft,
  moves: readonly Move[],
  fits: (draft: Draft) => boolean,
  cost: QuickCost,
): { draft: Draft; cost: number } {
  let best = start;
  let least = cost.of(start);
  cost.settle();
  for (let still = 0, next = 0; still < moves.length; still++, next = (next + 1) % moves.length) {
    const draft = moves[next]!(best);
    if (draft === best || !fits(draft)) continue;
    const total = cost.of(draft, least - IMPROVEMENT);
    if (total >= least - IMPROVEMENT) continue;
    cost.settle();
    [best, least, still] = [draft, total, -1];
  }
  return { draft: best, cost: least };
}
