import 'server-only';
import type { PoolRow } from '@/db/queries/pools';
import { intervalsOfDay } from '@/lib/calendar/wall-time';
import { dayOf } from '@/lib/calendar/household-day';
import { lifeOf, loadOfMass, massLeft } from '@/lib/projection/tablets';
import { parametersOf } from '@/lib/projection/parameters';
import { type Pool, poolSchema } from '@/lib/schemas/pool';

const HOUR = 3_600_000;
const usualTabletMass = 227;
const usualTabletStrength = 90;

/** The profile as the engine takes it; null while it is not complete, or when no such pool can be planned. */
export function enginePool(row: PoolRow, timeZone: string): Pool | null {
  if (row.completedAt === null) return null;
  const parsed = poolSchema.safeParse({
    ...given({
      volume: row.volume,
      volumeEstimated: row.volumeEstimated,
      meanDepth: row.meanDepth,
      // Not known counts as plaster, the careful way.
      surface: row.surface === 'unsure' ? 'plaster' : row.surface,
      latitude: row.latitude,
      longitude: row.longitude,
      sunExposure: row.sunExposure,
      cover: row.cover,
      waterFeatures: row.waterFeatures,
      pump: row.pump,
      swimLimit: row.swimLimit,
    }),
    timeZone,
    fillWater: given({
      calciumHardness: row.fillCalciumHardness,
      totalAlkalinity: row.fillTotalAlkalinity,
      pH: row.fillPH,
      dissolvedSolids: row.fillDissolvedSolids,
    }),
    feeder: given({
      kind: row.feederKind,
      ingredient: row.feederIngredient,
      capacity: row.feederCapacity,
      loaded: row.feederLoaded,
    }),
    ...(row.swimFrom !== null && row.swimTo !== null ? { swimHours: { from: row.swimFrom, to: row.swimTo } } : {}),
  });
  return parsed.success ? parsed.data : null;
}

/** What is not answered is left out, and the usual value holds. */
export function given<Values extends Record<string, unknown>>(
  values: Values,
): { [Key in keyof Values]?: NonNullable<Values[Key]> } {
  const entries = Object.entries(values).filter(([, value]) => value !== null && value !== undefined);
  return Object.fromEntries(entries) as { [Key in keyof Values]?: NonNullable<Values[Key]> };
}

/**
 * What is left at an instant [ms] of the tablets that the profile found in the feeder [g]. The profile tells of the day on
 * which it was finished; since then they eroded while the pump ran, in a floater by the clock. What was put in later is
 * known dose by dose.
 */
export function feederMassAt(pool: Pool, profiledAt: number, instant: number): number {
  const { loaded, kind } = pool.feeder;
  const hours = (instant - profiledAt) / HOUR;
  const load = loadOfMass(loaded, { tabletMass: usualTabletMass, strength: usualTabletStrength });
  if (!load || hours <= 0) return loaded;
  const running = kind === 'floating' ? hours : (hours / 24) * pumpHoursADay(pool, profiledAt);
  const share = load.erodedShare + running / lifeOf(load.tabletMass, parametersOf(pool).tabletLife);
  return load.count * load.tabletMass * massLeft(share);
}

/** Hours that the pump runs by its timer on the day of an instant [ms]. */
export function pumpHoursADay(pool: Pool, instant: number): number {
  const running = intervalsOfDay(pool.pump, dayOf(instant, pool.timeZone), pool.timeZone);
  return running.reduce((sum, { from, to }) => sum + (to - from) / HOUR, 0);
}
