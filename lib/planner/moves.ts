import { type Choice, type Draft, sumOf, visitsOf } from './draft';
import type { FastOption } from './products';
import type { QuickCost } from './response';

/** One way to change a draft. Data, not a closure, which V8 would compile anew in every plan. */
export type Move =
  /** More or fewer measures on an evening; so many on one that has none; none on one that has some. */
  | { kind: 'more'; evening: number; by: number }
  | { kind: 'begin'; evening: number; measures: number }
  | { kind: 'empty'; evening: number }
  /** A whole dose to a free evening; one step of it to another dose, or half of it to a free evening. */
  | { kind: 'shift'; from: number; to: number }
  | { kind: 'share'; from: number; to: number; step: number }
  /** More or fewer tablets on an evening; a whole loading to a free evening; one tablet to any; one for a fast dose. */
  | { kind: 'load'; evening: number; by: number }
  | { kind: 'shift-tablets'; from: number; to: number }
  | { kind: 'share-tablets'; from: number; to: number }
  | { kind: 'tablet-for-dose'; evening: number };

/** Less than a tenth of a hundredth of the currency is no improvement. */
const IMPROVEMENT = 1e-3;
/** An evening's cap is divided into at most so many steps, however small the measure: an eighth of a mg/L each. */
const STEPS_OF_A_CAP = 32;

/** Every way to change fast doses, whether or not a draft allows it. */
export function fastMoves(choice: Choice, most: readonly number[]): Move[] {
  const evenings = choice.evenings.map((_, evening) => evening);
  const step = Math.max(1, Math.round(Math.max(0, ...most) / STEPS_OF_A_CAP));
  const far = Math.max(2, Math.ceil(Math.max(0, ...most) / 6));
  return [
    ...evenings.flatMap((evening): Move[] => [
      { kind: 'empty', evening },
      ...[-far, -step, step, far].map((by): Move => ({ kind: 'more', evening, by })),
      { kind: 'begin', evening, measures: Math.ceil(most[evening]! / 3) },
    ]),
    ...pairsOf(evenings).flatMap(([from, to]): Move[] => [
      { kind: 'shift', from, to },
      { kind: 'share', from, to, step },
    ]),
  ];
}

/** Tablets are loaded once and at most once more. */
const MOST_LOADINGS = 2;

/** Every way to change the tablets. */
export function tabletMoves({ evenings, tablets }: Choice): Move[] {
  if (!tablets || tablets.most === 0) return [];
  const far = Math.max(2, Math.ceil(tablets.most / 6));
  const all = evenings.map((_, evening) => evening);
  return [
    ...all.flatMap((evening) => [-far, -1, 1, far].map((by): Move => ({ kind: 'load', evening, by }))),
    ...pairsOf(all).flatMap(([from, to]): Move[] => [
      { kind: 'shift-tablets', from, to },
      { kind: 'share-tablets', from, to },
    ]),
    ...all.map((evening): Move => ({ kind: 'tablet-for-dose', evening })),
  ];
}

function pairsOf(evenings: readonly number[]) {
  return evenings.flatMap((from) => evenings.filter((to) => to !== from).map((to) => [from, to] as const));
}

/** A draft after a move; the same draft when the move does not apply to it. */
function after(draft: Draft, move: Move): Draft {
  const { tablets, measures } = draft;
  switch (move.kind) {
    case 'more':
      return { ...draft, measures: changed(measures, move.evening, measures[move.evening]! + move.by) };
    case 'begin':
      return measures[move.evening] === 0
        ? { ...draft, measures: changed(measures, move.evening, move.measures) }
        : draft;
    case 'empty':
      return measures[move.evening]! > 0 ? { ...draft, measures: changed(measures, move.evening, 0) } : draft;
    case 'shift':
      return measures[move.from]! > 0 && measures[move.to] === 0
        ? { ...draft, measures: carried(measures, move.from, move.to, Infinity) }
        : draft;
    case 'share': {
      const [left, there] = [measures[move.from]!, measures[move.to]!];
      if (left <= move.step) return draft;
      return {
        ...draft,
        measures: carried(measures, move.from, move.to, there > 0 ? move.step : Math.floor(left / 2)),
      };
    }
    case 'load':
      return { ...draft, tablets: changed(tablets, move.evening, tablets[move.evening]! + move.by) };
    case 'shift-tablets':
      return tablets[move.from]! > 0 && tablets[move.to] === 0
        ? { ...draft, tablets: carried(tablets, move.from, move.to, Infinity) }
        : draft;
    case 'share-tablets':
      return tablets[move.from]! > 1 ? { ...draft, tablets: carried(tablets, move.from, move.to, 1) } : draft;
    case 'tablet-for-dose':
      return measures[move.evening]! > 0
        ? {
            ...draft,
            tablets: changed(tablets, move.evening, tablets[move.evening]! + 1),
            measures: changed(measures, move.evening, 0),
          }
        : draft;
  }
}

function changed(counts: readonly number[], evening: number, count: number): number[] {
  const next = counts.slice();
  next[evening] = count;
  return next;
}

/** Up to so many from one evening to another. */
function carried(counts: readonly number[], from: number, to: number, count: number): number[] {
  const moved = Math.min(count, counts[from]!);
  const next = counts.slice();
  next[from]! -= moved;
  next[to]! += moved;
  return next;
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
    const draft = after(best, moves[next]!);
    if (draft === best || !fits(draft)) continue;
    const total = cost.of(draft, least - IMPROVEMENT);
    if (total >= least - IMPROVEMENT) continue;
    cost.settle();
    [best, least, still] = [draft, total, -1];
  }
  return { draft: best, cost: least };
}
