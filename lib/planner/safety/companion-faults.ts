import { parseInstant } from '@/lib/calendar/wall-time';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { WeekPlan } from '@/lib/schemas/plan';
import type { Scenario } from '@/lib/schemas/scenario';

const HOUR = 3_600_000;
const ROUNDING = 1e-6;
/** How far the edge of 64 members may lie from the edge that the dose was reckoned by. */
const LOW_EDGE_MAY_MISS = 0.1;
const acids: readonly string[] = ['hydrochloric-acid', 'sodium-bisulfate'];
const carbonates: readonly string[] = ['sodium-bicarbonate', 'sodium-carbonate'];
const chlorines: readonly string[] = ['trichlor', 'dichlor', 'calcium-hypochlorite', 'sodium-hypochlorite'];

/**
 * What is wrong with the doses beside chlorine: more than one before the next test, calcium within a day of a carbonate,
 * acid that takes pH down by more than 0.4 or under 7.2, soda in water that is hard or not acid.
 */
export function companionFaults({ doses, projection, hours }: WeekPlan, scenario: Scenario): string[] {
  const { given, shelf } = scenario;
  const companions = doses.filter(({ substance }) => !chlorines.includes(substance));
  const faults = companions.length > 1 ? ['two doses beside chlorine without a test between'] : [];
  const before = given.map(({ at, product: id }) => ({
    at,
    substance: shelf.find(({ id: each }) => each === id)?.substance,
  }));
  for (const dose of companions) {
    const at = parseInstant(dose.at)!;
    const others = [...before, ...companions.filter((each) => each !== dose)];
    if (others.some((other) => clouds(dose, other.substance) && Math.abs(Date.parse(other.at) - at) < 24 * HOUR))
      faults.push('calcium within a day of a carbonate');
    if (acids.includes(dose.substance)) {
      const change = dose.effect?.quantity === 'pH' ? dose.effect.change : NaN;
      if (!(change <= 0 && change >= -0.4 - ROUNDING)) faults.push('acid lowers pH by more than 0.4');
      const after = hours.findIndex((hour) => Date.parse(hour) >= at);
      if (after >= 0 && projection && projection.median.pH[after]! < 7.2) faults.push('acid takes pH under 7.2');
      if (after >= 0 && projection && projection.pH.p10[after]! < 7.2 - LOW_EDGE_MAY_MISS)
        faults.push('acid may take pH under 7.2');
    }
    if (dose.substance === 'sodium-carbonate' && hardOrNotAcid(scenario))
      faults.push('soda in hard water or over pH 7.5');
  }
  return faults;
}

function clouds({ substance }: PlannedDose, other: string | undefined): boolean {
  const pair = [substance, other ?? ''];
  return pair.includes('calcium-chloride') && pair.some((each) => carbonates.includes(each));
}

function hardOrNotAcid({ reading }: Scenario): boolean {
  const newestFirst = [reading].flat().toSorted((a, b) => Date.parse(b.takenAt) - Date.parse(a.takenAt));
  const newest = (quantity: 'pH' | 'calciumHardness') => {
    const value = newestFirst.find((each) => each[quantity] !== undefined)?.[quantity];
    return typeof value === 'object' ? (value.low + value.high) / 2 : value;
  };
  // A later reading may have moved the reckoned value a little from the one that was read.
  return (newest('pH') ?? 7.5) > 7.5 + 0.1 || (newest('calciumHardness') ?? 0) > 300 + 20;
}
