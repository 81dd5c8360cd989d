import { planWeek } from '@/lib/planner';
import { projectWeek, projectWeekBand } from '@/lib/projection';
import { scenarioSchema } from '@/lib/schemas/scenario';
import { inTurn, type Piece } from './piece';
import { errors, feeder, places, stabilized, unstabilized } from './weeks';

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
