import type { FilterState, UncertainQuantity } from '@/lib/schemas/posterior';
import { uncertainQuantities } from '@/lib/schemas/posterior';
import { parameterPlaces, placeOf, waterPlaces } from './state';

/**
 * How long a pool takes to forget: trees grow, filters age, habits change. What was learnt returns to the prior with this
 * time constant [days]; an Ornstein-Uhlenbeck process about the prior, so that no gap makes a pool less known than one
 * that nobody ever measured. Assumption: a thirtieth of what was learnt in a season of 100 days. A pool that changes faster
 * is noticed by its surprises, see `assimilate`.
 */
export const FORGETTING_DAYS = 3000;

/**
 * Sigma that water gains in one day through what nobody writes down [its unit]; assumptions. Small on purpose: on simulated
 * pools, in which everything is written down, more would make ranges wider than they promise to be. Handfuls that nobody
 * wrote down show as surprises.
 */
export const unrecordedPerDay: Record<UncertainQuantity, number> = {
  freeChlorine: 0.03,
  pH: 0.01,
  totalAlkalinity: 0.3,
  calciumHardness: 0.4,
  cyanuricAcid: 0.3,
};

/** Chlorine of unrecorded doses is used up like any other: it adds up over no more than so many days. */
export const CHLORINE_REMEMBERS_DAYS = 2;

/** What time alone does to what is known: parameters drift back to their priors, water becomes less sure. */
export function drift({ mean, covariance }: Pick<FilterState, 'mean' | 'covariance'>, days: number): void {
  const kept = Math.exp(-days / FORGETTING_DAYS);
  for (const place of parameterPlaces) {
    mean[place]! *= kept;
    for (const other of parameterPlaces) covariance[place]![other]! *= kept * kept;
    covariance[place]![place]! += 1 - kept * kept;
    for (const other of waterPlaces) {
      covariance[place]![other]! *= kept;
      covariance[other]![place]! *= kept;
    }
  }
  for (const quantity of uncertainQuantities) {
    const place = placeOf[quantity];
    const adding = quantity === 'freeChlorine' ? Math.min(days, CHLORINE_REMEMBERS_DAYS) : days;
    covariance[place]![place]! += unrecordedPerDay[quantity] ** 2 * adding;
  }
}
