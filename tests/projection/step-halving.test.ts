import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { WaterAnalysis } from '@/lib/chemistry';
import { type ProjectedDose, projectWeek, type TabletLoad } from '@/lib/projection';
import type { ParameterOverrides } from '@/lib/schemas/scenario';
import type { WeekAhead } from '@/lib/schemas/week-ahead';
import { aPool, everyDay, someWater, takenAt } from './pools';

type Case = {
  pool?: Record<string, unknown>;
  water?: Partial<WaterAnalysis>;
  week?: Partial<WeekAhead>;
  doses?: ProjectedDose[];
  loads?: TabletLoad[];
  parameters?: ParameterOverrides;
};

const three: TabletLoad = { tabletMass: 227, count: 3, strength: 90, erodedShare: 0 };
const evening = (day: number, time: string) => `2026-07-0${day}T${time}-04:00`;

const cases: Record<string, Case> = {
  'stabilizer 50': {},
  'stabilizer 30, tablets in the feeder': { water: { cyanuricAcid: 30 }, loads: [three] },
  'stabilizer 90, much chlorine': { water: { cyanuricAcid: 90, freeChlorine: 9 } },
  'no stabilizer, gone in hours': { water: { cyanuricAcid: 0, freeChlorine: 4 } },
  'no stabilizer, dosed at odd minutes': {
    water: { cyanuricAcid: 0 },
    doses: [
      { at: evening(6, '13:17:00'), substance: 'sodium-hypochlorite', amount: 2000, strength: 12.5 },
      { at: evening(8, '06:41:30'), substance: 'calcium-hypochlorite', amount: 400, strength: 65 },
    ],
  },
  'a little stabilizer, tablets on the way': {
    water: { cyanuricAcid: 8 },
    doses: [{ at: evening(6, '10:07:00'), tablets: 4, tabletMass: 227, strength: 90 }],
  },
  'acid in the morning, chlorine in the evening': {
    doses: [
      { at: evening(7, '08:13:00'), substance: 'hydrochloric-acid', amount: 1000 },
      { at: evening(7, '20:02:00'), substance: 'calcium-hypochlorite', amount: 300, strength: 65 },
    ],
  },
  'a shallow pool with features and many children': {
    pool: { volume: 20, meanDepth: 0.8, waterFeatures: true },
    week: { swimmerHours: everyDay(12) },
  },
  'soft water far from its balance with air': {
    water: { pH: 7.0, totalAlkalinity: 60 },
    pool: { meanDepth: 1, waterFeatures: true },
  },
  'a dose of 20 mg/L on a sunny morning, without stabilizer': {
    water: { cyanuricAcid: 0, freeChlorine: 0.5 },
    doses: [{ at: evening(7, '09:20:00'), substance: 'calcium-hypochlorite', amount: 2300, strength: 65 }],
  },
  'rain, backwash, evaporation': {
    week: { rain: [0, 60, 0, 0, 20, 0, 0], backwash: [0, 0, 3, 0, 0, 0, 0], evaporation: everyDay(9) },
  },
  'a floater under a cover': {
    pool: { cover: 'floating', feeder: { kind: 'floating', ingredient: 'trichlor', capacity: 3 } },
    loads: [three],
  },
};

function difference({ pool, water, week, doses, loads, parameters }: Case) {
  const run = (stepsPerHour: number) =>
    projectWeek(
      aPool(pool),
      { takenAt, water: someWater(water), ...(loads ? { loads } : {}) },
      week,
      doses,
      parameters,
      { stepsPerHour },
    ).water;
  const [one, two] = [run(1), run(2)];
  const most = (of: (water: WaterAnalysis) => number) =>
    Math.max(...one.map((each, hour) => Math.abs(of(each) - of(two[hour]!))));
  return { freeChlorine: most((each) => each.freeChlorine), pH: most((each) => each.pH) };
}

describe('halving the step of an hour', () => {
  it.each(Object.entries(cases))('changes little: %s', (_, theCase) => {
    const { freeChlorine, pH } = difference(theCase);
    expect(freeChlorine).toBeLessThan(0.02);
    expect(pH).toBeLessThan(0.005);
  });

  it('changes little in any pool', () => {
    const water = fc.record({
      freeChlorine: fc.double({ min: 0, max: 8, noNaN: true }),
      pH: fc.double({ min: 7, max: 8, noNaN: true }),
      totalAlkalinity: fc.double({ min: 60, max: 160, noNaN: true }),
      cyanuricAcid: fc.constantFrom(0, 5, 15, 30, 60, 100),
      temperature: fc.integer({ min: 12, max: 33 }),
    });
    const anyCase = fc.record({
      water,
      pool: fc.record({
        meanDepth: fc.double({ min: 0.8, max: 2.5, noNaN: true }),
        waterFeatures: fc.boolean(),
        cover: fc.constantFrom('none', 'floating', 'opaque'),
        feeder: fc.record({ kind: fc.constantFrom('inline', 'floating'), ingredient: fc.constant('trichlor') }),
      }),
      week: fc.record({ swimmerHours: fc.constantFrom(everyDay(0), everyDay(10), [0, 0, 0, 0, 0, 40, 40]) }),
      doses: fc.array(
        fc.record({
          at: fc
            .integer({ min: 0, max: 167 * 60 })
            .map((minute) => new Date(Date.parse(takenAt) + minute * 60_000).toISOString()),
          substance: fc.constantFrom('sodium-hypochlorite', 'calcium-hypochlorite', 'sodium-bicarbonate'),
          // Up to +20 mg/L of chlorine from granules.
          amount: fc.integer({ min: 50, max: 2400 }),
        }),
        { maxLength: 3 },
      ),
      loads: fc.constantFrom<TabletLoad[]>([], [three]),
    });
    fc.assert(
      fc.property(anyCase, (theCase) => {
        const { freeChlorine, pH } = difference(theCase);
        expect(freeChlorine).toBeLessThan(0.02);
        expect(pH).toBeLessThan(0.005);
      }),
      { numRuns: process.env.LONG === '1' ? 600 : 80 },
    );
  });
});
