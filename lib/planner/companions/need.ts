import type { WaterAnalysis } from '@/lib/chemistry';
import type { MeasuredQuantity } from '@/lib/schemas/measured-range';
import type { Pool } from '@/lib/schemas/pool';
import {
  alkalinityAim,
  alkalinityDeadBand,
  companionAim,
  hardnessAct,
  sodaAshLimits,
} from '@/lib/standards/companions';
import { limits } from '@/lib/standards/limits';
import { surfaceRanges } from '@/lib/standards/surface-ranges';
import type { CompanionReason } from '../codes';

export type CompanionSubstance =
  | 'hydrochloric-acid'
  | 'sodium-bisulfate'
  | 'sodium-bicarbonate'
  | 'sodium-carbonate'
  | 'calcium-chloride'
  | 'cyanuric-acid';

/** What the water needs beside chlorine, and the value it is to be brought to. */
export type CompanionNeed = {
  reason: CompanionReason;
  /** Any of these does it; the first is the usual one. */
  substances: readonly CompanionSubstance[];
  quantity: 'pH' | 'totalAlkalinity' | 'calciumHardness' | 'cyanuricAcid';
  target: number;
  /** First hour of the week in which it is needed. */
  fromHour: number;
};

type Week = {
  pool: Pool;
  water: WaterAnalysis;
  /** Median pH at each hour. */
  pH: ArrayLike<number>;
  measured: (quantity: MeasuredQuantity) => boolean;
  /** Whether the newest test read pH: beside much chlorine it does not, and what is carried on is no ground for soda. */
  pHRead: boolean;
  /** Whether this week is carried by slow tablets, and whether they may be used at all. */
  tabletsLead: boolean;
  tabletsPossible: boolean;
};

/**
 * What a week needs beside chlorine, the most urgent first: alkalinity, then pH, hardness, stabilizer (care rules, part 4).
 * Only what was measured counts. Nothing is added for a quantity that the tablets of the plan raise by themselves.
 */
export function companionNeeds({
  pool,
  water,
  pH,
  measured,
  pHRead,
  tabletsLead,
  tabletsPossible,
}: Week): CompanionNeed[] {
  const needs: CompanionNeed[] = [];
  const [aimed] = (tabletsLead ? alkalinityAim.tablets : alkalinityAim.fast).value;
  if (measured('totalAlkalinity') && water.totalAlkalinity < aimed - alkalinityDeadBand.value)
    needs.push({
      reason: 'raises-alkalinity',
      substances: ['sodium-bicarbonate'],
      quantity: 'totalAlkalinity',
      target: aimed,
      fromHour: 0,
    });

  const high = firstOfADay(pH, (value) => value > limits.pHRangeHigh.value);
  const low = firstOfADay(pH, (value) => value < limits.pHRangeLow.value);
  const sodaAsh = pHRead && water.calciumHardness <= sodaAshLimits.hardness && water.pH <= sodaAshLimits.pH;
  if (high !== null)
    needs.push({
      reason: 'lowers-pH',
      substances: ['hydrochloric-acid', 'sodium-bisulfate'],
      quantity: 'pH',
      target: companionAim.pH,
      fromHour: high,
    });
  else if (low !== null && sodaAsh)
    needs.push({
      reason: 'raises-pH',
      substances: ['sodium-carbonate'],
      quantity: 'pH',
      target: companionAim.pH,
      fromHour: low,
    });

  if (measured('calciumHardness') && water.calciumHardness < hardnessAct[pool.surface][0])
    needs.push({
      reason: 'raises-hardness',
      substances: ['calcium-chloride'],
      quantity: 'calciumHardness',
      target: surfaceRanges[pool.surface].calciumHardness[0],
      fromHour: 0,
    });
  const [bandLow] = pool.stabilizerBand;
  if (measured('cyanuricAcid') && water.cyanuricAcid < bandLow && !tabletsPossible)
    needs.push({
      reason: 'raises-stabilizer',
      substances: ['cyanuric-acid'],
      quantity: 'cyanuricAcid',
      target: bandLow + companionAim.stabilizerAboveLow,
      fromHour: 0,
    });
  return needs;
}

/** The first of the hours to which something applies, when there is a day of them: less is left to the next test. */
function firstOfADay(values: ArrayLike<number>, applies: (value: number) => boolean): number | null {
  const hours = Array.from(values).flatMap((value, hour) => (applies(value) ? [hour] : []));
  return hours.length >= 24 ? hours[0]! : null;
}
