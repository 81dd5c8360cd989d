import type { WaterAnalysis } from '@/lib/chemistry';
import type { ParameterOverrides } from '@/lib/schemas/scenario';
import { type Pool, poolSchema } from '@/lib/schemas/pool';
import { type WeekAhead, weekAheadSchema } from '@/lib/schemas/week-ahead';

/** A pool in Florida, 75.7 m3; what is not named has its default. */
export function aPool(changes: Record<string, unknown> = {}): Pool {
  return poolSchema.parse({
    volume: 75.7,
    latitude: 28,
    longitude: -81.5,
    timeZone: 'America/New_York',
    ...changes,
  });
}

export const takenAt = '2026-07-05T19:00:00-04:00';

export function someWater(changes: Partial<WaterAnalysis> = {}): WaterAnalysis {
  return {
    freeChlorine: 3,
    combinedChlorine: 0.2,
    pH: 7.5,
    totalAlkalinity: 80,
    calciumHardness: 220,
    cyanuricAcid: 50,
    temperature: 29,
    ...changes,
  };
}

export function aWeek(changes: Partial<WeekAhead> = {}): WeekAhead {
  return weekAheadSchema.parse(changes);
}

/** Seven days alike. */
export function everyDay(value: number): number[] {
  return Array<number>(7).fill(value);
}

/** A week in which nothing acts on the water: no sun, no demand, no gas, no water in or out, no pump. */
export const still = {
  pool: { sunExposure: 0, pump: [] },
  week: { evaporation: everyDay(0) },
  parameters: { darkDemand: 0, carbonDioxideTransfer: 0 },
} satisfies { pool: Record<string, unknown>; week: Partial<WeekAhead>; parameters: ParameterOverrides };
