import { AppError } from '@/lib/errors';
import type { PlannedDose } from '@/lib/schemas/dose';
import { fastChlorineCap } from '@/lib/standards/caps';
import type { PlanContext } from './context';
import { isGeneric } from './generic-products';
import { type Options, optionsOf } from './products';
import { noWishes } from './wishes';

/**
 * Holds wishes to what a plan may use by itself: only products that it may plan, no more tablets than the week, the feeder
 * and the shelf allow, and in a pool whose volume was only estimated no more at first than half of what one evening may add.
 *
 * @param first the first dose of the whole plan
 * @throws AppError plan-refused, naming each fault
 */
export function refuseWishes(wished: readonly PlannedDose[], first: PlannedDose | undefined, context: PlanContext) {
  if (wished.length === 0) return;
  const options = optionsOf({ ...context, wishes: noWishes });
  const most = options.tablets?.most ?? 0;
  const tablets = wished.filter(({ form }) => form === 'tablet').reduce((sum, { amount }) => sum + amount, 0);
  const faults = [
    ...wished.flatMap((dose) => (mayBePlanned(dose, options) ? [] : [`${dose.substance} that may not be planned`])),
    ...(tablets > most ? [`${tablets} tablets where ${most} may go in`] : []),
    ...(first && wished.includes(first) && isFirstEver(context) && tooMuchAtFirst(first, most)
      ? ['more than half of what one evening may add, in a pool whose volume is an estimate']
      : []),
  ];
  if (faults.length > 0) throw new AppError('plan-refused', `The plan was refused: ${faults.join('; ')}.`);
}

/** Whether nothing has gone in yet and the volume is an estimate: the first dose is a half one. */
export function isFirstEver({ scenario: { pool, given } }: Pick<PlanContext, 'scenario'>): boolean {
  return pool.volumeEstimated && given.length === 0;
}

function mayBePlanned({ product, substance, form }: PlannedDose, { fast, tablets }: Options): boolean {
  if (form === 'tablet') return substance === 'trichlor' && (tablets === null || tablets.product.id === product);
  return fast.some((option) => (isGeneric(option.product) ? null : option.product.id) === product);
}

function tooMuchAtFirst({ form, amount, rise, substance }: PlannedDose, mostTablets: number): boolean {
  if (form === 'tablet') return amount > Math.max(1, Math.floor(mostTablets / 2));
  const cap = Object.entries(fastChlorineCap).find(([each]) => each === substance)?.[1].value ?? 0;
  return rise > cap / 2 + 1e-6;
}
