import fc from 'fast-check';
import { ledgerOf, PERMITTED, type WaterAnalysis } from '@/lib/chemistry';
import { WaterRangeError } from '@/lib/errors';
import type { ProjectedDose, TabletLoad } from '@/lib/projection';
import type { ParameterOverrides } from '@/lib/schemas/scenario';
import { type WeekAhead, weekAheadSchema } from '@/lib/schemas/week-ahead';
import { aPool } from './pools';

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
/** Everyday values, and now and then any that the schemas let in. */
const mostly = (everyday: readonly [number, number], permitted: readonly [number, number]) =>
  fc.oneof({ weight: 3, arbitrary: number(...everyday) }, number(...permitted));
const days = (everyday: readonly [number, number], permitted: readonly [number, number]) =>
  fc.array(mostly(everyday, permitted), { minLength: 7, maxLength: 8 });

const places = [
  { latitude: 28, longitude: -81.5, timeZone: 'America/New_York' },
  { latitude: -33.9, longitude: 151.2, timeZone: 'Australia/Sydney' },
  { latitude: -31.5, longitude: 159.1, timeZone: 'Australia/Lord_Howe' },
  { latitude: 69.6, longitude: 18.9, timeZone: 'Europe/Oslo' },
  { latitude: 90, longitude: 0, timeZone: 'UTC' },
  { latitude: 1.9, longitude: -157.4, timeZone: 'Pacific/Kiritimati' },
];

const pool = fc
  .record({
    place: fc.constantFrom(...places),
    volume: mostly([10, 120], [1, 1000]),
    meanDepth: mostly([0.8, 2.5], [0.2, 6]),
    sunExposure: number(0, 1),
    cover: fc.constantFrom('none', 'floating', 'opaque'),
    waterFeatures: fc.boolean(),
    feeder: fc.record({ kind: fc.constantFrom('none', 'inline', 'floating'), ingredient: fc.constant('trichlor') }),
    pump: fc.constantFrom([], [{ from: '08:00', to: '16:00' }], [{ from: '22:00', to: '06:00' }]),
    swimHours: fc.constantFrom(
      { from: '10:00', to: '20:00' },
      { from: '17:00', to: '02:00' },
      { from: '00:00', to: '00:00' },
    ),
  })
  .map(({ place, ...rest }) => aPool({ ...place, ...rest }));

/** Water that can be: its alkalinity carries its pH. */
const water: fc.Arbitrary<WaterAnalysis> = fc
  .record({
    freeChlorine: mostly([0, 10], PERMITTED.freeChlorine),
    combinedChlorine: mostly([0, 1], PERMITTED.combinedChlorine),
    pH: mostly([7, 8], PERMITTED.pH),
    totalAlkalinity: mostly([60, 160], PERMITTED.totalAlkalinity),
    calciumHardness: mostly([50, 500], PERMITTED.calciumHardness),
    cyanuricAcid: fc.oneof(fc.constant(0), mostly([0, 100], PERMITTED.cyanuricAcid)),
    temperature: mostly([12, 33], PERMITTED.temperature),
    dissolvedSolids: mostly([300, 3000], PERMITTED.dissolvedSolids),
  })
  .filter((analysis) => {
    try {
      ledgerOf(analysis);
      return true;
    } catch (error) {
      if (error instanceof WaterRangeError) return false;
      throw error;
    }
  });

const week: fc.Arbitrary<WeekAhead> = fc
  .record(
    {
      sky: days([0.5, 1], [0, 1]),
      rain: days([0, 20], [0, 1000]),
      swimmerHours: days([0, 10], [0, 1000]),
      waterTemperature: days([15, 32], [-2, 60]),
      evaporation: days([0, 8], [0, 50]),
      backwash: days([0, 1], [0, 100]),
    },
    { requiredKeys: [] },
  )
  .map((changes) => weekAheadSchema.parse(changes));

const parameters: fc.Arbitrary<ParameterOverrides> = fc.record(
  {
    boundPhotolysis: mostly([0.002, 0.02], [1e-6, 1]),
    sunStrength: mostly([0.5, 2], [0, 10]),
    darkDemand: mostly([0.001, 0.02], [0, 1]),
    chlorinePerSwimmerHour: mostly([1, 6], [0, 50]),
    tabletLife: mostly([20, 100], [0.1, 2000]),
    waterPerSwimmerHour: mostly([2, 20], [0, 200]),
    leak: mostly([0, 0.5], [0, 100]),
    carbonDioxideTransfer: mostly([0.003, 0.05], [0, 1]),
    volume: mostly([10, 120], [1, 1000]),
  },
  { requiredKeys: [] },
);

const startsAt = fc.integer({ min: Date.UTC(2026, 0, 1) / 60_000, max: Date.UTC(2026, 11, 31) / 60_000 });
const substances = [
  'trichlor',
  'dichlor',
  'calcium-hypochlorite',
  'sodium-hypochlorite',
  'hydrochloric-acid',
  'sodium-bisulfate',
  'sodium-bicarbonate',
  'sodium-carbonate',
  'calcium-chloride',
  'cyanuric-acid',
  'sodium-thiosulfate',
] as const;
const doseAfter = fc.oneof(
  fc.record({
    minutes: fc.integer({ min: -60, max: 169 * 60 }),
    substance: fc.constantFrom(...substances),
    amount: mostly([50, 1000], [0, 50_000]),
  }),
  fc.record({
    minutes: fc.integer({ min: -60, max: 169 * 60 }),
    tablets: fc.integer({ min: 1, max: 12 }),
    tabletMass: fc.constantFrom(20, 200, 227, 460),
    strength: fc.constant(90),
  }),
);
const load: fc.Arbitrary<TabletLoad> = fc.record({
  tabletMass: fc.constantFrom(20, 227),
  count: fc.integer({ min: 1, max: 8 }),
  strength: fc.constant(90),
  erodedShare: number(0, 1),
});

/** Any week of any pool that the schemas let in. */
export const anyWeek = fc
  .record({
    pool,
    water,
    week,
    parameters,
    startsAt,
    doses: fc.array(doseAfter, { maxLength: 4 }),
    loads: fc.array(load, { maxLength: 2 }),
  })
  .map(({ startsAt: minute, doses, water: analysis, loads, ...rest }) => ({
    ...rest,
    start: { takenAt: instant(minute), water: analysis, loads },
    doses: doses.map(({ minutes, ...dose }): ProjectedDose => ({ at: instant(minute + minutes), ...dose })),
  }));

function instant(minutes: number): string {
  return new Date(minutes * 60_000).toISOString();
}
