'use client';

import { type Purchase, purchasesOf, type PurchaseSubstance } from '@/lib/planner/purchases';
import type { HouseholdProduct } from '@/lib/schemas/household-product';
import type { PlannedWeek } from './readings';

export type { Purchase, PurchaseSubstance };

/** What of everything that a shop sells the plan of now takes; null while no plan stands. */
export function purchasesIn(
  { sheet, doses }: PlannedWeek,
  shelf: readonly HouseholdProduct[],
): readonly Purchase[] | null {
  const { plan, planProblem } = sheet;
  // A plan that waits for a measurement, or only keeps a record, has no cost: nothing was weighed.
  if (plan === null || plan.stale || plan.cost === null || planProblem !== null) return null;
  return purchasesOf({
    doses: doses.filter(({ planId, status }) => planId === plan.id && status === 'planned'),
    shelf,
    needs: plan.needs,
  });
}
