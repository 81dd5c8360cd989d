import { planWeek } from '@/lib/planner';
import { projectWeek, projectWeekBand } from '@/lib/projection';
import { poolSchema } from '@/lib/schemas/pool';
import { scenarioSchema } from '@/lib/schemas/scenario';
import { inTurn, type Piece } from './piece';

const places = [
  { latitude: 28, longitude: -81.5, timeZone: 'America/New_York' },
  { latitude: 40.4, longitude: -3.7, timeZone: 'Europe/Madrid' },
  { latitude: -33.9, longitude: 151.2, timeZone: 'Australia/Sydney' },
];
const feeder = { kind: 'inline', ingredient: 'trichlor', capacity: 8 };
const errors = { freeChlorine: 0.3, pH: 0.1, totalAlkalinity: 10, calciumHardness: 10, cyanuricAcid: 8 };
const FIRST_EVENING = Date.UTC(2026, 3, 1, 23);
const DAY = 86_400_000;

/** Sixty pools, each in a week of its own: nothing remembered from one helps with the next. */
function weeks(stabilizer: (index: number) => number) {
  return Array.from({ length: 60 }, (_, index) => ({
    pool: poolSchema.parse({ ...places[index % 3], volume: 40 + index, meanDepth: 1.2 + index / 100, feeder }),
    start: {
      takenAt: new Date(FIRST_EVENING + 3 * index * DAY).toISOString(),
      water: {
        freeChlorine: 3,
        pH: 7.5,
        totalAlkalinity: 80,
        calciumHardness: 220,
        cyanuricAcid: stabilizer(index),
        temperature: 24 + (index % 8),
      },
    },
    doses: [
      {
        at: new Date(FIRST_EVENING + (3 * index + 2) * DAY).toISOString(),
        substance: 'calcium-hypochlorite' as const,
        amount: 200,
        strength: 65,
      },
    ],
  }));
}
const stabilized = weeks((index) => 30 + index);
const unstabilized = weeks(() => 0);

/** The scenario of the engine's paper, in pools of different size. */
const scenarios = [75.7, 41, 114].map((volume) =>
  scenarioSchema.parse({
    pool: { ...places[0], volume, feeder },
    reading: {
      takenAt: '2026-07-05T19:00:00-04:00',
      freeChlorine: 3,
      combinedChlorine: 0.2,
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
  }),
);

export const weekPieces: readonly Piece[] = [
  {
    name: 'projectWeek, stabilizer 30 to 90',
    target: 0.4,
    run: inTurn(stabilized, ({ pool, start, doses }) => projectWeek(pool, start, {}, doses).water[168]!.pH),
  },
  {
    name: 'projectWeek, no stabilizer',
    target: 1.5,
    run: inTurn(unstabilized, ({ pool, start, doses }) => projectWeek(pool, start, {}, doses).water[168]!.pH),
  },
  {
    name: 'projectWeekBand, 64 pools',
    target: 25,
    run: inTurn(
      stabilized,
      ({ pool, start, doses }) => projectWeekBand(pool, { ...start, errors }, {}, doses).pH.p50[168]!,
    ),
  },
  {
    name: 'planWeek with band, alternatives, reasons',
    target: 120,
    run: inTurn(scenarios, (scenario) => planWeek(scenario).doses.length),
  },
];
