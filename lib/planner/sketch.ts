import { type Choice, type Draft, emptyDraft, keyOf } from './draft';
import { allowed, descend, fastMoves, mostMeasures, type Move, tabletMoves } from './moves';
import type { FastOption } from './products';
import type { QuickCost, Response } from './response';

/** A draft and what it costs by the quick model. */
export type Sketch = { draft: Draft; cost: number };

/** The fast products that a search may use, cheapest first; null where there is none. */
export type SearchSpace = { choice: Choice; fast: readonly (FastOption | null)[] };

export type Sketches = {
  /** Drafts at which no single change helps, cheapest first. */
  best: readonly Sketch[];
  /** Where fast products alone may start from, cheapest first. */
  fastAlone: readonly Draft[];
};

/** Drafts to start from: of all kinds, and of fast products alone. */
type Starts = { all: readonly Draft[]; fastAlone: readonly Draft[] };

const MOST_TABLET_COUNTS = 9;
const LOADING_EVENINGS = 2;
/** Up to so many fast evenings every choice of evenings is tried; more are added one by one. */
const EVENINGS_TRIED_IN_FULL = 3;
/** Rises that every choice of evenings is tried with [mg/L]. */
const FIRST_RISES = [1.2, 2.8];
/** How many choices of evenings are kept for each loading of tablets, and for fast products alone. */
const KEPT_OF_ONE_LOADING = 2;
const KEPT_OF_FAST_ALONE = 3;
const KEPT_LOADED_TWICE = 3;
const MOST_COUNTS_LOADED_TWICE = 4;
const KEPT = Math.max(KEPT_OF_ONE_LOADING, KEPT_OF_FAST_ALONE);
/** How many drafts are brought to where no single change helps: with the cheapest fast product, and with each other one. */
const IMPROVED = 8;
const IMPROVED_WITH_OTHERS = 4;
/** How many of those again by the whole quick model. */
const IMPROVED_AGAIN = 2;
/** From how many a visit is taken to see whether it is worth its while. */
const VISITS_TAKEN_FROM = 4;

/**
 * Sketches of a week by the quick model: every count of tablets with every choice of evenings for the cheapest fast product
 * at two rises; the best of them are brought to where no single change helps, and the best of those with every other
 * product.
 *
 * @param earlier drafts to start from beside those, where a week much like this one has been sketched
 */
export function sketchesOf(response: Response, space: SearchSpace, earlier?: readonly Draft[]): Sketches {
  const { choice, fast } = space;
  const first = fast[0] ?? null;
  const screened = screen(first, choice, response);
  const tried = earlier ? { ...screened, all: costed([...screened.all, ...earlier], response) } : screened;
  const { rough, whole } = response.costsNear(tried.all[0]!);
  const improved = (draft: Draft) => improve(draft, choice, response, rough);
  const best = inOrder(tried.all.slice(0, IMPROVED).map(improved));
  const others = fast.flatMap((product) =>
    best
      .slice(0, IMPROVED_WITH_OTHERS)
      .filter(({ draft }) => draft.fast && draft.fast !== product)
      .map(({ draft }) => improved(withProduct(draft, product, response))),
  );
  const found = [...best, ...others].map(({ draft }) => draft);
  // The rough cost may have led away from a draft that was better before, or to a visit that is not worth its while.
  const fits = (draft: Draft) => allowed(draft, choice, capsOf(draft, response));
  const costs = (drafts: readonly Draft[]) => drafts.map((draft) => ({ draft, cost: whole.of(draft) }));
  const looked = inOrder(costs([...found, ...tried.all.slice(0, IMPROVED)]));
  const exact = inOrder([
    ...looked,
    ...costs(looked.slice(0, VISITS_TAKEN_FROM).flatMap(({ draft }) => withOneVisitLess(draft).filter(fits))),
  ]);
  const again = exact.slice(0, IMPROVED_AGAIN).map(({ draft }) => improve(draft, choice, response, whole));
  return { best: inOrder([...exact, ...again]), fastAlone: tried.fastAlone };
}

/** The cheapest week with one kind of product alone, by the quick model. */
export function sketchAlone(response: Response, { choice, fast }: SearchSpace, { fastAlone }: Sketches): Draft {
  const starts = fast.flatMap((product) =>
    product
      ? fastAlone.map((draft) => withProduct(draft, product, response))
      : [...tabletStarts(choice), ...loadedTwice(choice)],
  );
  return improve(costed(starts, response)[0]!, choice, response, response.roughCost).draft;
}

/** Distinct drafts, the cheapest by the rough cost first. */
function costed(drafts: readonly Draft[], { roughCost }: Response): Draft[] {
  return inOrder(drafts.map((draft) => ({ draft, cost: roughCost.of(draft) }))).map(({ draft }) => draft);
}

/** Distinct drafts, the cheapest first; of equals the one found first. */
export function inOrder(sketches: readonly Sketch[]): Sketch[] {
  const distinct = new Map(sketches.map((sketch) => [keyOf(sketch.draft), sketch]));
  return [...distinct.values()].sort((a, b) => a.cost - b.cost);
}

/** Brings a draft to where no single change helps. */
export function improve(draft: Draft, choice: Choice, response: Response, cost: QuickCost): Sketch {
  const most = capsOf(draft, response);
  const moves: Move[] = [...(draft.fast ? fastMoves(choice, most) : []), ...tabletMoves(choice)];
  return descend(draft, moves, (each) => allowed(each, choice, most), cost);
}

/** Most measures of a draft's fast product on each evening. */
function capsOf({ fast, measures }: Draft, response: Response): number[] {
  return mostMeasures(fast, fast ? response.measureRises(fast) : measures);
}

/**
 * For every count of tablets and every evening on which they may be loaded: the best choices of evenings for fast doses to
 * go with them, cheapest first. Without a fast product, the tablets alone.
 */
function screen(fast: FastOption | null, choice: Choice, response: Response): Starts {
  const { roughCost } = response;
  const starts = tabletStarts(choice);
  if (!fast) return { all: costed([...starts, ...loadedTwice(choice)], response), fastAlone: [] };
  const rises = response.measureRises(fast);
  const most = mostMeasures(fast, rises);
  const withRise = (start: Draft, set: readonly number[], rise: number): Draft => {
    const measures = start.measures.slice();
    for (const evening of set)
      measures[evening] = Math.min(most[evening]!, Math.max(1, Math.round(rise / rises[evening]!)));
    return { ...start, fast, measures };
  };
  const found = starts.map((start) => {
    const alone = { ...start, fast };
    const sketches: Sketch[] = [{ draft: alone, cost: roughCost.of(alone) }];
    roughCost.settle();
    for (const set of choicesOfEvenings(start, choice))
      for (const rise of FIRST_RISES) {
        const draft = withRise(start, set, rise);
        const cost = roughCost.of(draft, sketches.at(KEPT - 1)?.cost);
        if (cost === Infinity) continue;
        sketches.push({ draft, cost });
        sketches.sort((a, b) => a.cost - b.cost);
      }
    return inOrder(sketches);
  });
  const kept = found.flatMap((sketches) => sketches.slice(0, KEPT_OF_ONE_LOADING));
  const twice = inOrder(
    loadedTwice(choice).map((draft) => ({ draft: { ...draft, fast }, cost: roughCost.of({ ...draft, fast }) })),
  );
  return {
    all: inOrder([...kept, ...twice.slice(0, KEPT_LOADED_TWICE)]).map(({ draft }) => draft),
    fastAlone: found[0]!.slice(0, KEPT_OF_FAST_ALONE).map(({ draft }) => draft),
  };
}

/** Drafts with every count of tablets, none first, loaded on the first or the second evening, and nothing fast yet. */
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

/** Drafts with tablets loaded twice, first on the first or the second evening, and nothing fast. */
function loadedTwice(choice: Choice): Draft[] {
  const none = emptyDraft(choice);
  const most = choice.tablets?.most ?? 0;
  if (choice.visits < 2) return [];
  const step = Math.max(1, Math.ceil(most / MOST_COUNTS_LOADED_TWICE));
  const drafts: Draft[] = [];
  for (let first = 0; first < Math.min(LOADING_EVENINGS, choice.evenings.length); first++)
    for (let second = first + 1; second < choice.evenings.length; second++)
      for (let count = step; count < most; count += step)
        for (let more = step; count + more <= most; more += step)
          drafts.push({ ...none, tablets: none.tablets.with(first, count).with(second, more) });
  return drafts;
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

/** A draft without each of its visits: what goes in then is left out, or goes in with the dose before or after it. */
function withOneVisitLess(draft: Draft): Draft[] {
  const { tablets, measures } = draft;
  const doses = measures.flatMap((count, evening) => (count > 0 ? [evening] : []));
  return measures.flatMap((count, evening) => {
    if (count === 0 && tablets[evening] === 0) return [];
    const without = { ...draft, tablets: tablets.with(evening, 0), measures: measures.with(evening, 0) };
    const place = doses.indexOf(evening);
    const beside = place < 0 ? [] : [doses[place - 1], doses[place + 1]].filter((each) => each !== undefined);
    return [
      without,
      ...beside.map((each) => ({ ...without, measures: without.measures.with(each, measures[each]! + count) })),
    ];
  });
}

/** The same rises with another product, in its measures. */
function withProduct(draft: Draft, fast: FastOption | null, response: Response): Draft {
  if (draft.fast === fast || !draft.fast || !fast) return draft;
  const from = response.measureRises(draft.fast);
  const to = response.measureRises(fast);
  const most = mostMeasures(fast, to);
  const measures = draft.measures.map((count, evening) =>
    Math.min(most[evening]!, Math.round((count * from[evening]!) / to[evening]!)),
  );
  return { ...draft, fast, measures };
}
