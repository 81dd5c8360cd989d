import { planWeek } from '@/lib/planner';
import { projectWeek, projectWeekBand } from '@/lib/projection';
import { scenarioSchema } from '@/lib/schemas/scenario';
import type { Bench } from './chemistry';

const scenario = scenarioSchema.parse({
  pool: {
    volume: 75.7,
    latitude: 28,
    longitude: -81.5,
    timeZone: 'America/New_York',
    feeder: { kind: 'inline', ingredient: 'trichlor', capacity: 8 },
  },
  reading: {
    takenAt: '2026-07-05T19:00:00-04:00',
    freeChlorine: 3,
    pH: 7.5,
    totalAlkalinity: 80,
    calciumHardness: 220,
    cyanuricAcid: 50,
    temperature: 29,
  },
  shelf: [
    { id: 'tabs', form: 'tablet', substance: 'trichlor', strength: 90, tabletMass: 227, stock: 5000 },
    {
      id: 'gran',
      form: 'granular',
      substance: 'calcium-hypochlorite',
      strength: 65,
      labelWay: 'dissolve',
      stock: 4000,
    },
    { id: 'liq', form: 'liquid', substance: 'sodium-hypochlorite', strength: 12.5, measure: 250, stock: 20000 },
  ],
});
const { pool } = scenario;
const takenAt = '2026-07-05T19:00:00-04:00';
const water = (cyanuricAcid: number) => ({
  freeChlorine: 3,
  pH: 7.5,
  totalAlkalinity: 80,
  calciumHardness: 220,
  cyanuricAcid,
  temperature: 29,
});
const errors = { freeChlorine: 0.3, pH: 0.1, totalAlkalinity: 10, calciumHardness: 10, cyanuricAcid: 15 };

function repeat(n: number, work: () => number): number {
  let sum = 0;
  for (let index = 0; index < n; index++) sum += work();
  return sum;
}

/** Targets: a week 0.4 ms (1.5 without stabilizer), its band 25 ms, a plan 120 ms. */
export const weekBenches: readonly Bench[] = [
  {
    name: 'projectWeek, stabilizer 50',
    run: (n) => repeat(n, () => projectWeek(pool, { takenAt, water: water(50) }).water[168]!.pH),
  },
  {
    name: 'projectWeek, no stabilizer',
    run: (n) => repeat(n, () => projectWeek(pool, { takenAt, water: water(0) }).water[168]!.pH),
  },
  {
    name: 'projectWeekBand, 64 pools',
    run: (n) => repeat(n, () => projectWeekBand(pool, { takenAt, water: water(50), errors }).pH.p50[168]!),
  },
  { name: 'planWeek, band and alternatives', run: (n) => repeat(n, () => planWeek(scenario).doses.length) },
];
