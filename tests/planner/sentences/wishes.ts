import { AppError } from '@/lib/errors';
import { planWeek } from '@/lib/planner';
import { dayAt, productOf, takenAt, type Told } from './told';

const HOUR = 3_600_000;
const WEEK = 168 * HOUR;

type Wish = NonNullable<Told['scenario']['wishes']>['doses'][number];

function wishesOf({ scenario }: Told) {
  return scenario.wishes ?? { doses: [], notOn: [], noFurtherTablets: false };
}

/** From when on [ms] something may still go in. */
function from(told: Told): number {
  const { now } = told.scenario;
  return Math.max(takenAt(told), now === undefined ? 0 : Date.parse(now));
}

/** Whether a wished dose is still to go in: of the plan's days, of a product that is there, not given that day already. */
function isAhead(wish: Wish, told: Told): boolean {
  const at = Date.parse(wish.at);
  const given = told.scenario.given.some(
    ({ at: when, product }) => product === wish.product && dayAt(when, told) === dayAt(wish.at, told),
  );
  const stock = productOf(told, wish.product)?.stock ?? 1;
  return at >= from(told) && at < takenAt(told) + WEEK && stock > 0 && !given;
}

/** Whether anything that the household wished is still to come. */
export function wishIsAhead(told: Told): boolean {
  const { doses, notOn, noFurtherTablets } = wishesOf(told);
  const today = dayAt(new Date(from(told)).toISOString(), told);
  return noFurtherTablets || doses.some((wish) => isAhead(wish, told)) || notOn.some((day) => day >= today);
}

/** Whether a plan holds every dose as it was wished, keeps the other evenings free, and adds no tablets where none are wanted. */
export function keepsWishes(told: Told): boolean {
  const { doses, notOn, noFurtherTablets } = wishesOf(told);
  const { plan } = told;
  const isWished = (dose: (typeof plan.doses)[number]) =>
    doses.some(
      ({ at, amount, unit }) => Date.parse(at) === Date.parse(dose.at) && same(amount, dose.amount, unit === dose.unit),
    );
  const stands = (wish: Wish) =>
    plan.doses.some(
      ({ at, product, amount }) =>
        Date.parse(at) === Date.parse(wish.at) && product === wish.product && same(amount, wish.amount, true),
    );
  return (
    doses.filter((wish) => isAhead(wish, told)).every(stands) &&
    plan.doses.every((dose) => dose.effect || isWished(dose) || !notOn.includes(dayAt(dose.at, told))) &&
    plan.doses.every((dose) => !noFurtherTablets || dose.unit !== 'tablet' || isWished(dose))
  );
}

function same(one: number, other: number, alikeOtherwise: boolean): boolean {
  return alikeOtherwise && Math.abs(one - other) < 1e-6;
}

/** Whether a plan made as it was wished is refused. */
export function breaksLimits({ scenario }: Told): boolean {
  if (!scenario.wishes) return false;
  try {
    planWeek(scenario);
    return false;
  } catch (error) {
    if (error instanceof AppError && error.code === 'plan-refused') return true;
    throw error;
  }
}
