import 'server-only';
import type { DatabaseOrTransaction } from '@/db/client';
import { listPlanSnapshots } from '@/db/queries/plan-history';
import type { StoredDose } from '@/db/queries/plan-doses';
import type { StoredReading } from '@/db/queries/readings';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import type { GivenDose } from '@/lib/schemas/dose';
import { measuredQuantities } from '@/lib/schemas/measured-range';
import type { Reading } from '@/lib/schemas/reading';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';
import type { ShelfProduct } from '@/lib/schemas/shelf-product';
import { limits } from '@/lib/standards/limits';
import { goneProducts, productIdOf } from './engine-shelf';

/**
 * A reading as the engine takes it. Chlorine over 10 mg/L bleaches the colour of the pH test: such a pH is ignored, and
 * where the colour flashed nothing that was read beside it counts (care rules, part 2).
 */
export function engineReading({ takenAt, method, values, zeroAnswer }: StoredReading, timeZone: string): Reading {
  const { freeChlorine, combinedChlorine, pH, ...rest } = values;
  const bleached = zeroAnswer === 'flashed';
  const low = typeof freeChlorine === 'number' ? freeChlorine : (freeChlorine?.low ?? 0);
  const trusted = {
    ...(freeChlorine !== undefined && !bleached ? { freeChlorine } : {}),
    ...(combinedChlorine !== undefined && !bleached ? { combinedChlorine } : {}),
    ...(pH !== undefined && !bleached && low <= limits.freeChlorineMaximum.value ? { pH } : {}),
  };
  return { ...rest, ...trusted, method, takenAt: toOffsetIso(takenAt.getTime(), timeZone) };
}

export function engineDose(dose: StoredDose, timeZone: string): GivenDose {
  const { givenAt, givenAmount, at, amount, unit } = dose;
  return {
    at: toOffsetIso((givenAt ?? at).getTime(), timeZone),
    product: productIdOf(dose),
    amount: givenAmount ?? amount,
    unit,
  };
}

/** Products of given doses that have left the shelf since, as the plans of their time knew them. */
export async function productsGone(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  given: readonly StoredDose[],
  shelf: readonly ShelfProduct[],
): Promise<ShelfProduct[]> {
  const strangers = given.filter((dose) => !shelf.some(({ id }) => id === productIdOf(dose)));
  if (strangers.length === 0) return [];
  const planIds = [...new Set(strangers.map(({ planId }) => planId))];
  const formerly = await listPlanSnapshots(db, householdId, planIds);
  return goneProducts(
    strangers,
    shelf,
    formerly.flatMap((snapshot) => snapshot.shelf),
  );
}

/**
 * Readings of which no two say something of one quantity at one instant: two people may test at once, and the plan goes by
 * the one that comes first in the list.
 */
export function withoutRepeats(readings: readonly Reading[]): Reading[] {
  const seen = new Set<string>();
  return readings.map((reading) => {
    const kept = { ...reading };
    for (const quantity of measuredQuantities) {
      if (kept[quantity] === undefined) continue;
      const name = `${quantity} ${Date.parse(kept.takenAt)}`;
      if (seen.has(name)) delete kept[quantity];
      seen.add(name);
    }
    return kept;
  });
}
