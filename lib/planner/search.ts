import type { PlanContext } from './context';
import { evaluate, type Evaluated } from './cost';
import { type Choice, type Draft, emptyDraft, visitsOf } from './draft';
import type { FastOption, TabletOption } from './products';
import type { Response } from './response';

const FINALISTS = 6;
const FINALISTS_OF_ONE_START = 2;
const FINALIST_MEMBERS = 16;
const MOST_TABLET_COUNTS = 9;
/** Up to so many fast evenings every choice of evenings is tried; more are added one by one. */
const EVENINGS_TRIED_IN_FULL = 3;
const FIRST_GUESS_RISE = 1.4;
const IMPROVEMENT = 1e-6;

/** What a search is free to choose. */
export type SearchSpace = {
  evenings: Choice['evenings'];
  visits: number;
  /** Null leaves the form out; a form that must be used is the only one given. */
  tablets: TabletOption | null;
  fast: readonly (FastOption | null)[];
  /** How often a finalist is moved measure by measure to where no single change helps. */
  rounds: number;
};

type Screened = { draft: Draft; choice: Choice; cost: number };

/**
 * The best plan found: for every count of tablets, evening to load them, choice of evenings and fast product the amounts
 * are brought to where no single change helps on the linear response; the best few are projected in full and moved measure
 * by measure. Deterministic; ties go to the plan found first, which has fewer tablets and earlier evenings.
 */
export function searchPlan(context: PlanContext, response: Response, space: SearchSpace): Evaluated {
  const screened = space.fast.flatMap((fast) => {
    const choice: Choice = { evenings: space.evenings, tablets: space.tablets, fast, visits: space.visits };
    return tabletStarts(choice, response).flatMap((start) => screen(start, choice, response));
  });
  screened.sort((a, b) => a.cost - b.cost);
  const members = context.members.slice(0, FINALIST_MEMBERS);
  const finalists = screened
    .slice(0, space.rounds > 0 ? FINALISTS : 1)
    .map(({ draft, choice }) => evaluate(draft, choice, context, members));
  let best = cheapest(finalists);
  for (let round = 0; round < space.rounds; round++) {
    const near = neighbours(best.draft, best.choice, response).map((draft) =>
      evaluate(draft, best.choice, context, members),
    );
    const better = cheapest([best, ...near]);
    if (better === best) break;
    best = better;
  }
  return best;
}

function cheapest(plans: readonly Evaluated[]): Evaluated {
  return plans.reduce((least, each) => (each.cost.total < least.cost.total - IMPROVEMENT ? each : least));
}

/** Drafts with every count of tablets on every evening they may be loaded, and nothing fast yet. */
function tabletStarts(choice: Choice, { tabletEvenings }: Response): Draft[] {
  const none = emptyDraft(choice);
  const most = choice.tablets?.most ?? 0;
  if (most === 0 || choice.visits === 0 || tabletEvenings === 0) return [none];
  const step = Math.max(1, Math.ceil(most / MOST_TABLET_COUNTS));
  const starts = [none];
  for (let tablets = step; tablets <= most; tablets += step)
    for (let tabletEvening = 0; tabletEvening < tabletEvenings; tabletEvening++)
      starts.push({ ...none, tablets, tabletEvening });
  return starts;
}

/** The best few sets of fast doses to go with these tablets, by the linear response. */
function screen(start: Draft, choice: Choice, response: Response): Screened[] {
  const cost = (draft: Draft) => response.cost(draft, choice);
  const found: Screened[] = [{ draft: start, choice, cost: cost(start) }];
  const { fast } = choice;
  if (!fast) return found;
  const rises = response.measureRises(fast);
  const most = mostMeasures(fast, rises);
  const guess = rises.map((rise, evening) =>
    Math.min(most[evening]!, Math.max(1, Math.round(FIRST_GUESS_RISE / rise))),
  );
  for (const evenings of choicesOfEvenings(start, choice)) {
    const measures = start.measures.map((_, evening) => (evenings.includes(evening) ? guess[evening]! : 0));
    found.push({ ...descend({ ...start, measures }, choice, fast, most, cost, evenings), choice });
  }
  found.sort((a, b) => a.cost - b.cost);
  return found
    .slice(0, FINALISTS_OF_ONE_START)
    .map(({ draft }) => ({ ...descend(draft, choice, fast, most, cost, freeEvenings(start)), choice }));
}

/** Every choice of up to so many evenings that the visits allow, the tablets' own left out. */
function choicesOfEvenings(start: Draft, choice: Choice): number[][] {
  const free = freeEvenings(start);
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

/** Evenings on which nothing else goes in. */
function freeEvenings({ measures, tablets, tabletEvening }: Draft): number[] {
  return measures.map((_, evening) => evening).filter((evening) => tablets === 0 || evening !== tabletEvening);
}

/** Changes the amount of one evening at a time (0 takes it out) until no change helps. */
function descend(
  start: Draft,
  choice: Choice,
  fast: FastOption,
  most: readonly number[],
  cost: (draft: Draft) => number,
  evenings: readonly number[],
): { draft: Draft; cost: number } {
  let best = start;
  let least = cost(best);
  for (let improved = true; improved;) {
    improved = false;
    for (const evening of evenings) {
      for (const measures of amountsToTry(best.measures[evening]!, most[evening]!)) {
        const draft = withMeasures(best, evening, measures);
        if (visitsOf(draft) > choice.visits || overStock(draft, fast)) continue;
        const total = cost(draft);
        if (total >= least - IMPROVEMENT) continue;
        [best, least, improved] = [draft, total, true];
      }
    }
  }
  return { draft: best, cost: least };
}

function amountsToTry(now: number, most: number): number[] {
  const far = Math.max(2, Math.ceil(most / 6));
  const near = [0, now - far, now - 1, now + 1, now + far, ...(now === 0 ? [2, 3, Math.ceil(most / 3)] : [])];
  return near.filter((count) => count !== now && count >= 0 && count <= most);
}

/** Most measures on each evening under the evening's cap. */
function mostMeasures(fast: FastOption, rises: readonly number[]): number[] {
  return rises.map((rise) => Math.floor(fast.capRise / rise + 1e-9));
}

function overStock({ measures }: Draft, { stock, measure }: FastOption): boolean {
  return measures.reduce((sum, each) => sum + each, 0) * measure > stock;
}

function withMeasures(draft: Draft, evening: number, measures: number): Draft {
  return { ...draft, measures: draft.measures.map((each, index) => (index === evening ? measures : each)) };
}

/** One tablet or one measure more or less, and each dose an evening earlier or later. */
function neighbours(draft: Draft, choice: Choice, response: Response): Draft[] {
  const near: Draft[] = [];
  for (const tablets of [draft.tablets - 1, draft.tablets + 1])
    if (tablets >= 0 && tablets <= (choice.tablets?.most ?? 0) && draft.measures[draft.tabletEvening] === 0)
      near.push({ ...draft, tablets });
  const { fast } = choice;
  if (fast) {
    const most = mostMeasures(fast, response.measureRises(fast));
    draft.measures.forEach((measures, evening) => {
      if (measures === 0) return;
      for (const count of [measures - 1, measures + 1])
        if (count <= most[evening]!) near.push(withMeasures(draft, evening, count));
      for (const other of [evening - 1, evening + 1]) {
        const free = draft.measures[other] === 0 && !(draft.tablets > 0 && other === draft.tabletEvening);
        if (free && measures <= most[other]!) near.push(withMeasures(withMeasures(draft, evening, 0), other, measures));
      }
    });
    return near.filter((each) => visitsOf(each) <= choice.visits && !overStock(each, fast));
  }
  return near.filter((each) => visitsOf(each) <= choice.visits);
}
