import { z } from 'zod';

/** A plan of 168 hours touches eight household days. */
export const DAYS_OF_A_PLAN = 8;

const daily = (low: number, high: number) => z.array(z.number().min(low).max(high)).min(7).max(8);

/**
 * What the week ahead brings, one entry for each household day from the day of the reading; a missing eighth repeats the
 * seventh for sky, water temperature and evaporation, and is 0 for the rest.
 */
export const weekAheadSchema = z.strictObject({
  /** Share of clear-sky UV. */
  sky: daily(0, 1).default(Array(7).fill(0.85)),
  /** Rain [mm]. */
  rain: daily(0, 1000).default(Array(7).fill(0)),
  /** Heads times hours. */
  swimmerHours: daily(0, 1000).default(Array(7).fill(0)),
  /** Water temperature [degrees C]; the reading's when left out. */
  waterTemperature: daily(-2, 60).optional(),
  /** Evaporation [mm/day]. */
  evaporation: daily(0, 50).default(Array(7).fill(5)),
  /** Backwash [m3], at noon. */
  backwash: daily(0, 100).default(Array(7).fill(0)),
});
export type WeekAhead = z.output<typeof weekAheadSchema>;
