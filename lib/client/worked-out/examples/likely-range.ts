import { type CourseBand, projectWeekBand, type ReadingErrors } from '@/lib/projection';
import { readingError, uncertainQuantities } from '@/lib/projection/reading-error';
import { poolSchema } from '@/lib/schemas/pool';
import type { ReadingMethod } from '@/lib/schemas/reading-kinds';
import { type Point, ticksOf } from './curve';
import type { Example } from './example';
import { ordinaryWater } from './water';

/** A pool on the zero meridian, so that nobody's clock matters; the test is taken in the morning. */
const pool = poolSchema.parse({ volume: 60, latitude: 38, longitude: 0, timeZone: 'UTC' });
const takenAt = '2026-06-21T07:00:00Z';
const DAYS = 4;

function bandOf(freeChlorine: number, cyanuricAcid: number, method: ReadingMethod): CourseBand['freeChlorine'] {
  const water = { ...ordinaryWater, freeChlorine, cyanuricAcid };
  const errors = Object.fromEntries(
    uncertainQuantities.map((quantity) => [quantity, readingError(quantity, water[quantity], method)]),
  ) as ReadingErrors;
  return projectWeekBand(pool, { takenAt, water, errors }).freeChlorine;
}

const points = (hourly: readonly number[]): Point[] =>
  hourly.slice(0, DAYS * 24 + 1).map((value, hour): Point => [hour / 24, value]);

export const likelyRangeExample: Example<'freeChlorine' | 'stabilizer'> = {
  inputs: [
    { name: 'freeChlorine', low: 1, high: 6, step: 0.5, start: 3.5, unit: 'mg/L', decimals: 1 },
    { name: 'stabilizer', low: 20, high: 90, step: 5, start: 40, unit: 'mg/L', decimals: 0 },
  ],
  work({ freeChlorine, stabilizer }) {
    const kit = bandOf(freeChlorine, stabilizer, 'drop-kit');
    const strip = bandOf(freeChlorine, stabilizer, 'strip');
    const rowAt = (hour: number, { p10, p50, p90 }: CourseBand['freeChlorine']) =>
      [p10, p50, p90].map((hourly) => hourly[hour] ?? 0);
    return {
      figures: [],
      comparison: {
        columns: ['low', 'middle', 'high'],
        unit: 'mg/L',
        decimals: 1,
        rows: [
          { name: 'kitRange', values: rowAt(24, kit) },
          { name: 'stripRange', values: rowAt(24, strip) },
        ],
      },
      curve: {
        across: { low: 0, high: DAYS, unit: 'days', decimals: 0, ticks: ticksOf(0, DAYS, 1) },
        up: { low: 0, high: 9, unit: 'mg/L', decimals: 0, ticks: ticksOf(0, 8, 2) },
        lines: [
          { name: 'freeChlorine', mark: 'chlorine', points: points(kit.p50) },
          { name: 'stripRange', mark: 'before', points: points(strip.p10) },
          { name: 'stripRange', mark: 'before', points: points(strip.p90) },
        ],
        ranges: [{ name: 'kitRange', low: points(kit.p10), high: points(kit.p90) }],
      },
    };
  },
};
