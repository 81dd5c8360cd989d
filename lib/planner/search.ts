import { belowMaximum, lowered } from './below-maximum';
import type { PlanContext } from './context';
import { evaluate, type Evaluated } from './cost';
import { type Choice, type Draft, keyOf, sumOf } from './draft';
import { allowed, descend, fastMoves, mostMeasures, type Move, tabletMoves } from './moves';
import type { FastOption } from './products';
import { remember } from './remember';
import type { Correction, Response } from './response';
import { screen, type Screened } from './screen';

/** How many drafts of the screening are brought to where no single change helps, for each product. */
const SKETCHES = 8;
const QUICK_SKETCHES = 3;
/** How many are projected in full: the best few, and the best with each count of tablets among the next. */
const FINALISTS = 3;
const MOST_FINALISTS = 5;
/** How many changes of the best plan are projected in full in each round, and how many rounds there are at most. */
const CHANGES = 2;
const ROUNDS = 5;
const IMPROVEMENT = 1e-6;
/** Plans this near to the best are compared over the whole ensemble. */
const NEAR = 1.02;
const RIVALS = 2;

/** The fast products that a search may use, cheapest first; null where there is none. */
export type SearchSpace = { choice: Choice; fast: readonly (FastOption | null)[] };

/**
 * The best plan found, projected over the whole ensemble and kept below the maximum. Screening by the quick model with the cheapest fast product gives
 * drafts for every count of tablets; each is brought to where no single change helps, for every product; the best few are
 * projected in full. The quick model is then corrected to agree with the best of them and asked for changes that help, as
 * long as one does in full. Deterministic; ties go to the draft found first, which has fewer tablets and earlier evenings.
 */
export function searchPlan(context: PlanContext, response: Response, { choice, fast }: SearchSpace): Evaluated {
  const members = context.searchMembers.map(({ member }) => member);
  const tried = new Map<string, Evaluated>();
  const inFull = remember((draft: Draft) => {
    const evaluated = evaluate(draft, choice, context, members);
    tried.set(keyOf(draft), evaluated);
    return evaluated;
  }, keyOf);

  let best = cheapest(
    finalistsOf(draftsOf(response, { choice, fast }, SKETCHES), MOST_FINALISTS).map(({ draft }) => inFull(draft)),
  );
  for (let round = 0; round < ROUNDS; round++) {
    const changes = changesOf(best.draft, choice, response, response.correctionAt(best));
    const next = cheapest([best, ...changes.map(inFull)]);
    if (next === best) break;
    best = next;
  }
  const rivals = [...tried.values()]
    .filter(({ cost }) => cost.total <= NEAR * best.cost.total)
    .sort((a, b) => a.cost.total - b.cost.total)
    .slice(0, RIVALS)
    .map(({ draft }) => evaluate(draft, choice, context, context.members));
  const safe = rivals.filter((rival) => belowMaximum(rival, choice, context));
  return safe.length > 0 ? cheapest(safe) : lowered(cheapest(rivals), choice, context);
}

/** The best plan by the quick model alone, projected over the search's members. */
export function quickPlan(context: PlanContext, response: Response, space: SearchSpace): Evaluated {
  const members = context.searchMembers.map(({ member }) => member);
  return evaluate(draftsOf(response, space, QUICK_SKETCHES)[0]!.draft, space.choice, context, members);
}

/** Drafts at which no single change helps, cheapest first by the quick model. */
function draftsOf(response: Response, { choice, fast }: SearchSpace, most: number): Screened[] {
  const sketches = inOrder(screen(fast[0] ?? null, choice, response)).slice(0, most);
  const drafts = fast.flatMap((product) =>
    sketches.map(({ draft }) => improve(withProduct(draft, product, response), choice, response, response.roughCost)),
  );
  return inOrder(drafts.map(({ draft }) => ({ draft, cost: response.cost(draft) })));
}

function inOrder(drafts: readonly Screened[]): Screened[] {
  const distinct = new Map(drafts.map((screened) => [keyOf(screened.draft), screened]));
  return [...distinct.values()].sort((a, b) => a.cost - b.cost);
}

function finalistsOf(drafts: readonly Screened[], most: number): Screened[] {
  const counts = new Set<number>();
  const firstOfCount = drafts.filter(
    ({ draft }) => !counts.has(sumOf(draft.tablets)) && counts.add(sumOf(draft.tablets)),
  );
  return [...new Set([...drafts.slice(0, FINALISTS), ...firstOfCount])].slice(0, most);
}

function cheapest(plans: readonly Evaluated[]): Evaluated {
  return plans.reduce((least, each) => (each.cost.total < least.cost.total - IMPROVEMENT ? each : least));
}

/** Every move that a draft allows, and what it has to keep to. */
function movesOf(draft: Draft, choice: Choice, response: Response) {
  const most = mostMeasures(draft.fast, draft.fast ? response.measureRises(draft.fast) : draft.measures);
  const moves: Move[] = [...(draft.fast ? fastMoves(choice, most) : []), ...tabletMoves(choice)];
  return { moves, fits: (each: Draft) => allowed(each, choice, most) };
}

/** Brings a draft to where no single change helps. */
function improve(draft: Draft, choice: Choice, response: Response, cost: (draft: Draft) => number): Screened {
  const { moves, fits } = movesOf(draft, choice, response);
  return descend(draft, moves, fits, cost);
}

/** The likeliest single changes of a draft, and where the quick model would bring it. */
function changesOf(draft: Draft, choice: Choice, response: Response, correction: Correction): Draft[] {
  const { moves, fits } = movesOf(draft, choice, response);
  const cost = (each: Draft) => response.cost(each, correction);
  const single = moves
    .map((move) => move(draft))
    .filter((each) => each !== draft && fits(each))
    .map((each) => ({ draft: each, cost: cost(each) }));
  const likeliest = inOrder(single).slice(0, CHANGES);
  return [...likeliest, improve(draft, choice, response, cost)].map((each) => each.draft);
}

/** The same rises with another product, in its measures. */
function withProduct(draft: Draft, fast: FastOption | null, response: Response): Draft {
  if (draft.fast === fast || !draft.fast || !fast) return draft;
  const [from, to] = [response.measureRises(draft.fast), response.measureRises(fast)];
  const most = mostMeasures(fast, to);
  const measures = draft.measures.map((count, evening) =>
    Math.min(most[evening]!, Math.round((count * from[evening]!) / to[evening]!)),
  );
  return { ...draft, fast, measures };
}
