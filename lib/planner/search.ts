import { belowMaximum, lowered } from './below-maximum';
import type { PlanContext } from './context';
import { evaluate, type Evaluated } from './cost';
import { type Choice, type Draft, keyOf } from './draft';
import type { Response } from './response';
import { improve, inOrder, type Sketch, type Sketches } from './sketch';

/** How many drafts are projected in full at most. */
const MOST_IN_FULL = 4;
/** A sketch is projected in full when by the corrected quick model it costs no more than so many times the best plan. */
const WORTH_A_LOOK = 1.005;
const IMPROVEMENT = 1e-6;

/**
 * The best plan found, kept below the maximum. The best sketch is projected in full over the ensemble, and the quick model
 * corrected to agree with it; what then promises to be cheaper, or hardly dearer, is projected in full in turn, until
 * nothing is left that does. Deterministic; ties go to the draft found first, which has fewer tablets and earlier evenings.
 */
export function searchPlan(context: PlanContext, response: Response, choice: Choice, sketches: Sketches): Evaluated {
  const tried = new Map<string, Evaluated>();
  const inFull = (draft: Draft): Evaluated => {
    const evaluated = evaluate(draft, choice, context);
    tried.set(keyOf(draft), evaluated);
    return evaluated;
  };

  let best = inFull(sketches.best[0]!.draft);
  let promising = promisingAround(best, response, choice, sketches);
  while (tried.size < MOST_IN_FULL) {
    const next = promising.find(({ draft }) => !tried.has(keyOf(draft)));
    if (!next) break;
    const evaluated = inFull(next.draft);
    if (evaluated.cost.total >= best.cost.total - IMPROVEMENT) continue;
    best = evaluated;
    promising = promisingAround(best, response, choice, sketches);
  }
  const plans = [...tried.values()].sort((a, b) => a.cost.total - b.cost.total);
  return plans.find((plan) => belowMaximum(plan, choice, context)) ?? lowered(best, choice, context);
}

/** What promises to cost less than a plan or hardly more, by the quick model corrected to agree with it; cheapest first. */
function promisingAround(plan: Evaluated, response: Response, choice: Choice, { best }: Sketches): Sketch[] {
  const cost = response.costAround(plan);
  const most = WORTH_A_LOOK * plan.cost.total;
  const sketches = best
    .map(({ draft }) => ({ draft, cost: cost.of(draft, most) }))
    .filter((sketch) => sketch.cost < Infinity);
  return inOrder([...sketches, improve(plan.draft, choice, response, cost)]);
}
