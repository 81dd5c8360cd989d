import { ledgerOf, type WaterAnalysis } from '@/lib/chemistry';
import { WaterRangeError } from '@/lib/errors';
import { analysisAt } from '@/lib/projection';
import type { WeekDose } from '@/lib/projection/events';
import { type Forcing, MILLISECONDS_PER_HOUR } from '@/lib/projection/forcing';
import { type Course, type CourseSetting, integrateWeek } from '@/lib/projection/integrate';
import { measuredRange } from '@/lib/schemas/measured-range';
import { type FilterState, uncertainQuantities } from '@/lib/schemas/posterior';
import { drift } from './drift';
import { possibleWater } from './possible-water';
import { feederAt, loadsAtLife } from './feeder';
import { held, parametersAt, placeOf, waterAt } from './state';
import { momentsOf, sigmaPoints } from './unscented';

/** What lies between two readings: forces, doses, and the pool with its prior's medians. */
export type Gap = { forcing: Forcing; doses: readonly WeekDose[]; setting: CourseSetting; to: number };

/** What is expected of a reading, and how much chlorine is expected to be used up until then [mg/L]. */
export type Expected = { state: FilterState; chlorineLoss: number };

/**
 * Carries what is known from one reading to the next: every sigma point is a pool of its own whose water the projection
 * takes through the gap; their mean and covariance are what is expected of the next reading.
 *
 * Errors: WaterRangeError where what was recorded brings a pool's water out of the model's range.
 */
export function propagate(state: FilterState, { forcing, doses, setting, to }: Gap): Expected {
  const inside = doses.filter(({ at }) => at >= state.at && at < to);
  const points = sigmaPoints(state.mean, state.covariance);
  const courses = points.map(({ at }) => {
    const parameters = parametersAt(at, setting.parameters);
    const ledger = ledgerOf(possibleWater(waterAt(at, state)));
    const loads = loadsAtLife(state.loads, parameters.tabletLife);
    const course = integrateWeek(forcing, { ledger, loads }, inside, { ...setting, parameters });
    const water = endOf(course);
    for (const quantity of uncertainQuantities) at[placeOf[quantity]] = water[quantity];
    return course;
  });
  const { mean, covariance } = momentsOf(points);
  for (const quantity of uncertainQuantities) {
    const [low, high] = measuredRange[quantity];
    mean[placeOf[quantity]] = held(mean[placeOf[quantity]]!, low, high);
  }
  const middle = endOf(courses[0]!);
  const next: FilterState = {
    ...state,
    at: to,
    mean,
    covariance,
    combinedChlorine: held(middle.combinedChlorine ?? 0, 0, measuredRange.combinedChlorine[1]),
    dissolvedSolids: held(middle.dissolvedSolids ?? 0, 0, 30000),
    loads: feederAt(state.loads, inside, forcing.pumpIntervals, setting.floater, state.at, to),
  };
  drift(next, (to - state.at) / (24 * MILLISECONDS_PER_HOUR));
  const { usedUp, combined } = courses[0]!.account;
  return { state: next, chlorineLoss: usedUp + combined };
}

function endOf({ end, endPH }: Course): WaterAnalysis {
  const water = analysisAt(end, endPH);
  for (const quantity of uncertainQuantities)
    if (!Number.isFinite(water[quantity]))
      throw new WaterRangeError(quantity, water[quantity], measuredRange[quantity][0], measuredRange[quantity][1]);
  return water;
}
