import { type Choice, type Draft, emptyDraft } from './draft';
import { allowed, descend, fastMoves, mostMeasures } from './moves';
import type { FastOption } from './products';
import type { Response } from './response';

/** A draft and what it costs by the linear response. */
export type Screened = { draft: Draft; cost: number };

const MOST_TABLET_COUNTS = 9;
const LOADING_EVENINGS = 2;
/** Up to so many fast evenings every choice of evenings is tried; more are added one by one. */
const EVENINGS_TRIED_IN_FULL = 3;
/** Rises that every choice of evenings is tried with [mg/L]; the best few are then moved measure by measure. */
const FIRST_RISES = [1.2, 2.8];
const DESCENTS_OF_ONE_START = 3;

/**
 * For every count of tablets and every evening on which they may be loaded: the best sets of fast doses to go with them, by
 * the linear response. Without a fast product, the tablets alone.
 */
export function screen(fast: FastOption | null, choice: Choice, response: Response): Screened[] {
  const starts = tabletStarts(choice);
  if (!fast) return starts.map((draft) => ({ draft, cost: response.roughCost(draft) }));
  const rises = response.measureRises(fast);
  const most = mostMeasures(fast, rises);
  const moves = fastMoves(choice, most);
  const fits = (draft: Draft) => allowed(draft, choice, most);
  return starts.flatMap((start) => {
    const withRise = (set: readonly number[], rise: number): Draft => {
      const count = (evening: number) =>
        set.includes(evening) ? Math.min(most[evening]!, Math.max(1, Math.round(rise / rises[evening]!))) : 0;
      return { ...start, fast, measures: start.measures.map((_, evening) => count(evening)) };
    };
    const tried = [[], ...choicesOfEvenings(start, choice)].map((set) =>
      cheapest(
        FIRST_RISES.map((rise) => withRise(set, rise)).map((draft) => ({ draft, cost: response.roughCost(draft) })),
      ),
    );
    tried.sort((a, b) => a.cost - b.cost);
    return tried.slice(0, DESCENTS_OF_ONE_START).map(({ draft }) => descend(draft, moves, fits, response.roughCost));
  });
}

function cheapest(drafts: readonly Screened[]): Screened {
  return drafts.reduce((least, each) => (each.cost < least.cost ? each : least));
}

/** Drafts with every count of tablets, loaded on the first or the second evening, and nothing fast yet. */
function tabletStarts(choice: Choice): Draft[] {
  const none = emptyDraft(choice);
  const most = choice.tablets?.most ?? 0;
  if (choice.visits === 0) return [none];
  const step = Math.max(1, Math.ceil(most / MOST_TABLET_COUNTS));
  const starts = [none];
  for (let count = step; count <= most; count += step)
    for (let loading = 0; loading < Math.min(LOADING_EVENINGS, choice.evenings.length); loading++)
      starts.push({ ...none, tablets: none.tablets.map((_, evening) => (evening === loading ? count : 0)) });
  return starts;
}

/** Every choice of up to so many evenings that the visits allow, the tablets' own left out. */
function choicesOfEvenings({ tablets, measures }: Draft, choice: Choice): number[][] {
  const free = measures.map((_, evening) => evening).filter((evening) => tablets[evening] === 0);
  const most = Math.min(EVENINGS_TRIED_IN_FULL, choice.visits - (measures.length - free.length));
  let sets: number[][] = [[]];
  const all: number[][] = [];
  for (let size = 1; size <= most; size++) {
    sets = sets.flatMap((set) =>
      free.filter((evening) => evening > (set.at(-1) ?? -1)).map((evening) => [...set, evening]),
    );
    all.push(...sets);
  }
  return all;
}
