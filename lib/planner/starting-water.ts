import { parseInstant } from '@/lib/calendar/wall-time';
import { ledgerOf, type WaterAnalysis } from '@/lib/chemistry';
import { WaterRangeError } from '@/lib/errors';
import { analysisAt, settingOf, type TabletLoad } from '@/lib/projection';
import type { WeekDose } from '@/lib/projection/events';
import { MILLISECONDS_PER_HOUR, prepareForcing } from '@/lib/projection/forcing';
import { integrateWeek } from '@/lib/projection/integrate';
import {
  carriedError,
  middleOf,
  type ReadingErrors,
  readingError,
  uncertainQuantities,
} from '@/lib/projection/reading-error';
import { loadOfMass } from '@/lib/projection/tablets';
import { type MeasuredQuantity, measuredQuantities } from '@/lib/schemas/measured-range';
import type { Reading } from '@/lib/schemas/reading';
import type { Scenario } from '@/lib/schemas/scenario';
import { weekAheadSchema } from '@/lib/schemas/week-ahead';
import { limits } from '@/lib/standards/limits';
import { isTabletSubstance, tabletOf } from './product-facts';

const MILLISECONDS_PER_DAY = 24 * MILLISECONDS_PER_HOUR;

/** Taken where a quantity was never measured, with how far it may be off; the plan says so. */
export const assumed: Record<MeasuredQuantity, { value: number; sigma: number }> = {
  freeChlorine: { value: 1, sigma: 1 },
  combinedChlorine: { value: 0.1, sigma: 0.1 },
  pH: { value: 7.5, sigma: 0.3 },
  totalAlkalinity: { value: 90, sigma: 30 },
  calciumHardness: { value: 250, sigma: 80 },
  cyanuricAcid: { value: 30, sigma: 15 },
  temperature: { value: 26, sigma: 3 },
};

/** The water a plan starts from, how sure it is, and what of it was measured when [ms]. */
export type StartingWater = {
  takenAt: number;
  water: WaterAnalysis;
  errors: ReadingErrors;
  loads: readonly TabletLoad[];
  measuredAt: Partial<Record<MeasuredQuantity, number>>;
};

/**
 * Brings all readings to the instant of the newest one: each quantity's newest value counts, carried forward through the
 * model with what was given in between, its error growing by the day. A quick check after a full test thus moves chlorine
 * and pH and keeps the rest.
 *
 * Errors: WaterRangeError when alkalinity cannot carry the measured pH.
 */
export function startingWater(scenario: Scenario, given: readonly WeekDose[]): StartingWater {
  const readings = [scenario.reading].flat().sort((a, b) => instant(a) - instant(b));
  const first = readings[0]!;
  const measuredAt: StartingWater['measuredAt'] = {};
  const errors = {} as ReadingErrors;
  const loaded = loadedTablets(scenario);

  const blank: WaterAnalysis = {
    freeChlorine: 0,
    pH: 7.5,
    totalAlkalinity: 0,
    calciumHardness: 0,
    cyanuricAcid: 0,
    temperature: 0,
  };
  for (const quantity of measuredQuantities) blank[quantity] = assumed[quantity].value;
  for (const quantity of uncertainQuantities) errors[quantity] = assumed[quantity].sigma;
  let water = readInto(blank, first, errors, measuredAt);
  let at = instant(first);
  let loads: readonly TabletLoad[] = loadsBefore(given, at, scenario, loaded ? [loaded] : []);
  for (const reading of readings.slice(1)) {
    const to = instant(reading);
    ({ water, loads } = carryForward(scenario, { water, loads }, at, to, given));
    for (const quantity of uncertainQuantities)
      errors[quantity] = carriedError(quantity, errors[quantity], (to - at) / MILLISECONDS_PER_DAY);
    water = readInto(water, reading, errors, measuredAt);
    at = to;
  }
  requireConsistent(water);
  return { takenAt: at, water, errors, loads, measuredAt };
}

/** What was in the feeder at the first reading; the label of the shelf's tablets of that kind tells their mass. */
function loadedTablets({ pool, shelf }: Scenario): TabletLoad | undefined {
  const { ingredient = 'trichlor', loaded } = pool.feeder;
  // Of a blend nobody knows what it brings: care rules, part 4.
  if (!isTabletSubstance(ingredient)) return undefined;
  const same = shelf.find(({ form, substance }) => form === 'tablet' && substance === ingredient);
  return loadOfMass(loaded, tabletOf(ingredient, same ?? {}));
}

function instant(reading: Reading): number {
  return parseInstant(reading.takenAt)!;
}

function readInto(
  water: WaterAnalysis,
  reading: Reading,
  errors: ReadingErrors,
  measuredAt: StartingWater['measuredAt'],
): WaterAnalysis {
  const read = { ...water };
  for (const quantity of measuredQuantities) {
    const value = reading[quantity];
    if (value === undefined || (quantity === 'pH' && bleachesPH(reading))) continue;
    read[quantity] = middleOf(value);
    measuredAt[quantity] = instant(reading);
  }
  for (const quantity of uncertainQuantities) {
    const value = reading[quantity];
    if (value !== undefined && !(quantity === 'pH' && bleachesPH(reading)))
      errors[quantity] = readingError(quantity, value, reading.method);
  }
  return read;
}

/** Chlorine over 10 mg/L bleaches the colour of the pH test: a pH that was read beside it is ignored (care rules, part 2). */
function bleachesPH({ freeChlorine }: Reading): boolean {
  const low = typeof freeChlorine === 'object' ? freeChlorine.low : (freeChlorine ?? 0);
  return low > limits.freeChlorineMaximum.value;
}

type Carried = { water: WaterAnalysis; loads: readonly TabletLoad[] };

function carryForward(scenario: Scenario, from: Carried, at: number, to: number, given: readonly WeekDose[]): Carried {
  const hours = (to - at) / MILLISECONDS_PER_HOUR;
  if (hours <= 0) return from;
  const { pool, parameters } = scenario;
  const usual = weekAheadSchema.parse({});
  const forcing = prepareForcing(pool, at, usual, from.water.temperature, { hours });
  // What went in at the instant of a reading counts as after it, here as in the week ahead.
  const between = given.filter((dose) => dose.at >= at && dose.at < to);
  const setting = settingOf(pool, from.water.temperature, parameters);
  const course = integrateWeek(forcing, { ledger: ledgerOf(from.water), loads: from.loads }, between, setting);
  return { water: analysisAt(course.end, course.endPH), loads: course.loads };
}

/** What tablets given before the first reading have left, their running hours counted by the pump's timer. */
function loadsBefore(
  given: readonly WeekDose[],
  at: number,
  scenario: Scenario,
  loaded: readonly TabletLoad[],
): readonly TabletLoad[] {
  const oldest = Math.min(at, ...given.filter(({ kind }) => kind === 'tablets').map((dose) => dose.at));
  // Erosion asks only for the pump's hours: any water does.
  const water: WaterAnalysis = {
    freeChlorine: 2,
    pH: 7.5,
    totalAlkalinity: 90,
    calciumHardness: 250,
    cyanuricAcid: 30,
    temperature: 26,
  };
  return [...loaded, ...carryForward(scenario, { water, loads: [] }, oldest, at, given).loads];
}

function requireConsistent(water: WaterAnalysis): void {
  try {
    ledgerOf(water);
  } catch (error) {
    if (error instanceof WaterRangeError && error.field === 'totalAlkalinity')
      throw new WaterRangeError('reading.totalAlkalinity', error.value, error.low, error.high);
    throw error;
  }
}
