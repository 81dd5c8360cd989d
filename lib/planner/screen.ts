import { type Choice, type Draft, emptyDraft, visitsOf } from './draft';
import { allowed, descend, fastMoves, mostMeasures } from './moves';
import type { FastOption } from './products';
import type { Response } from './response';

/** A draft and what it costs by the linear response. */
export type Screened = { draft: Draft; cost: number };

const MOST_TABLET_COUNTS = 9;
/** Up to so many fast evenings every choice of evenings is tried; more are added one by one. */
const EVENINGS_TRIED_IN_FULL = 3;
/** Rises that every choice of evenings is tried with [mg/L]; the best few are then moved measure by measure. */
const FIRST_RISES = [1.2, 2.8];
const DESCENTS_OF_ONE_START = 4;

/**
 * For every count of tablets and every evening on which they may be loaded: the best sets of fast doses to go with them, by
 * the linear response. Without a fast product, the tablets alone.
 */
export function screen(fast: FastOption | null, choice: Choice, response: Response): Screened[] {
  const starts = tabletStarts(choice, response);
  if (!fast) return starts.map((draft) => ({ draft, cost: response.roughCost(draft) }));
  const rises = response.measureRises(fast);
  const most = mostMeasures(fast, rises);
  const moves = fastMoves(choice, most);
  const fits = (draft: Draft) => allowed(draft, choice, most);
  return starts.flatMap((start) => {
    const sets = choicesOfEvenings(start, choice);
    const first = FIRST_RISES.flatMap((rise) =>
      sets.map((evenings) => {
        const count = (evening: number) =>
          evenings.includes(evening) ? Math.min(most[evening]!, Math.max(1, Math.round(rise / rises[evening]!))) : 0;
        return { ...start, fast, measures: start.measures.map((_, evening) => count(evening)) };
      }),
    );
    const tried = [{ ...start, fast }, ...first]
      .filter(fits)
      .map((draft) => ({ draft, cost: response.roughCost(draft) }));
    tried.sort((a, b) => a.cost - b.cost);
    return tried.slice(0, DESCENTS_OF_ONE_START).map(({ draft }) => descend(draft, moves, fits, response.roughCost));
  });
}

/** Drafts with every count of tablets on every evening on which they may be loaded, and nothing fast yet. */
function tabletStarts(choice: Choice, { tabletEvenings }: Response): Draft[] {
  const none = emptyDraft(choice);
  const most = choice.tablets?.most ?? 0;
  if (choice.visits === 0) return [none];
  const step = Math.max(1, Math.ceil(most / MOST_TABLET_COUNTS));
  const starts = [none];
  for (let tablets = step; tablets <= most; tablets += step)
    for (let tabletEvening = 0; tabletEvening < tabletEvenings; tabletEvening++)
      starts.push({ ...none, tablets, tabletEvening });
  return starts;
}

/** Every choice of up to so many evenings that the visits allow, the tablets' own left out. */
function choicesOfEvenings(start: Draft, choice: Choice): number[][] {
  const free = start.measures.map((_, evening) => evening).filter((evening) => !takenByTablets(start, evening));
  const most = Math.min(EVENINGS_TRIED_IN_FULL, choice.visits - visitsOf(start));
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

function takenByTablets({ tablets, tabletEvening }: Draft, evening: number): boolean {
  return tablets > 0 && evening === tabletEvening;
}
