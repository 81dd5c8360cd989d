import { belowMaximum, lowered } from './below-maximum';
import type { PlanContext } from './context';
import { differenceOnTrial, evaluate, type Evaluated } from './cost';
import { type Choice, type Draft, keyOf } from './draft';
import type { Response } from './response';
import { improve, inOrder, type Sketch, type Sketches } from './sketch';

/** How many drafts are projected over the whole ensemble at most, and how many over the first few members of it. */
const MOST_IN_FULL = 4;
const MOST_ON_TRIAL = 7;
const TRIAL_MEMBERS = 8;
/**
 * A draft is put on trial when by the corrected quick model it costs no more than so many times the best plan; and projected
 * over the whole ensemble when the trial, corrected likewise, says no more than this.
 */
const WORTH_A_TRIAL = 1.04;
const WORTH_IT_IN_FULL = 0.998;
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
  const trials = new Map<string, number>();
  /** The cost of a draft by a few members, as far as it differs from that of the best plan by them. */
  const onTrial = (draft: Draft): number => {
    const key = keyOf(draft);
    const known = trials.get(key);
    if (known !== undefined) return known;
    const total = best.cost.total + differenceOnTrial(draft, best, context, TRIAL_MEMBERS);
    trials.set(key, total);
    return total;
  };
  while (tried.size < MOST_IN_FULL) {
    const next = promising.find(
      ({ draft }) =>
        !tried.has(keyOf(draft)) &&
        (trials.has(keyOf(draft)) || trials.size < MOST_ON_TRIAL) &&
        onTrial(draft) <= WORTH_IT_IN_FULL * best.cost.total,
    );
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
  const most = WORTH_A_TRIAL * plan.cost.total;
  const sketches = best
    .map(({ draft }) => ({ draft, cost: cost.of(draft, most) }))
    .filter((sketch) => sketch.cost < Infinity);
  return inOrder([...sketches, improve(plan.draft, choice, response, cost)]);
}
