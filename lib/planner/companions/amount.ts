import { amountToReach, type WaterAnalysis } from '@/lib/chemistry';
import { UnreachableTargetError } from '@/lib/errors';
import type { ShelfProduct } from '@/lib/schemas/shelf-product';
import { companionCap } from '@/lib/standards/caps';
import { companionAim } from '@/lib/standards/companions';
import { limits } from '@/lib/standards/limits';
import type { CompanionNeed, CompanionSubstance } from './need';

/** Standard deviations from the middle of a normal distribution to its 10th percentile. */
const TO_TENTH_PERCENTILE = 1.2816;

type Dosing = {
  volume: number;
  /** One sigma of the water's pH. */
  pHError: number;
  /** Half of everything: the volume is an estimate, or acid has never gone into this water. */
  halved: boolean;
};

/**
 * Whole measures of a companion [g or mL]: what brings the quantity to its target, at most the cap of one evening; acid so
 * that pH falls by 0.4 at most and the likely range does not fall under 7.2. Zero when not even one measure may go in.
 */
export function companionAmount(
  need: CompanionNeed,
  product: ShelfProduct & { substance: CompanionSubstance },
  water: WaterAnalysis,
  dosing: Dosing,
): number {
  const { wanted, most } = companionWanted(need, product, water, dosing);
  const measure = product.measure ?? (product.form === 'liquid' ? 100 : 50);
  const measures = need.reason === 'lowers-pH' ? Math.floor(wanted / measure) : Math.ceil(wanted / measure - 0.5);
  return Math.max(0, Math.min(measures, Math.floor(most / measure + 1e-9))) * measure;
}

/** The same without whole measures: what the target wants within the cap, and the cap of the evening [g or mL]. */
export function companionWanted(
  need: Pick<CompanionNeed, 'reason' | 'quantity' | 'target'>,
  product: ShelfProduct & { substance: CompanionSubstance },
  water: WaterAnalysis,
  { volume, pHError, halved }: Dosing,
): { wanted: number; most: number } {
  const { substance } = product;
  const cap = companionCap[substance];
  const strength = product.strength ?? cap.strength;
  const most = (cap.perCubicMetre * volume * cap.strength) / strength / (halved ? 2 : 1);
  const lowest = Math.max(
    water.pH - companionAim.largestFallOfPH,
    limits.pHRangeLow.value + TO_TENTH_PERCENTILE * pHError,
  );
  const lowers = need.reason === 'lowers-pH';
  const target = lowers ? Math.max(need.target, lowest) : need.target;
  // Water may be past its target in the hour of the dose: what it was read for comes with a later day.
  const there = lowers ? water.pH <= target : water[need.quantity] >= target;
  if (there) return { wanted: 0, most };
  const wanted = wantedAmount(water, volume, { substance, strength }, { quantity: need.quantity, value: target }, most);
  return { wanted, most };
}

function wantedAmount(
  water: WaterAnalysis,
  volume: number,
  product: { substance: CompanionSubstance; strength: number },
  target: Parameters<typeof amountToReach>[3],
  most: number,
): number {
  try {
    return Math.min(most, amountToReach(water, volume, product, target));
  } catch (error) {
    if (error instanceof UnreachableTargetError) return most;
    throw error;
  }
}
