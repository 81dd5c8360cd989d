import { describe, expect, it } from 'vitest';
import { assertSafePlan, planWeek } from '@/lib/planner';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { WeekPlan } from '@/lib/schemas/plan';
import { type Scenario, scenarioSchema } from '@/lib/schemas/scenario';

const scenario = scenarioSchema.parse({
  pool: {
    volume: 75.7,
    latitude: 28,
    longitude: -81.5,
    timeZone: 'America/New_York',
    feeder: { kind: 'inline', ingredient: 'trichlor', capacity: 3 },
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
      measure: 50,
      stock: 1000,
    },
    { id: 'acid', form: 'liquid', substance: 'hydrochloric-acid', strength: 31.45, stock: 5000 },
  ],
});
const plan = planWeek(scenario);

const granules: PlannedDose = {
  at: '2026-07-07T20:30:00-04:00',
  product: 'gran',
  toBuy: false,
  substance: 'calcium-hypochlorite',
  form: 'granular',
  amount: 100,
  unit: 'g',
  rise: 0.86,
  reason: 'closes-gap',
};
const tablets: PlannedDose = {
  ...granules,
  product: 'tabs',
  substance: 'trichlor',
  form: 'tablet',
  amount: 2,
  unit: 'tablet',
  rise: 5.4,
  reason: 'slow-supply',
};
const acid: PlannedDose = {
  ...granules,
  product: 'acid',
  substance: 'hydrochloric-acid',
  form: 'liquid',
  amount: 200,
  unit: 'mL',
  rise: 0,
  effect: { quantity: 'pH', change: -0.2 },
};
const bicarbonate: PlannedDose = {
  ...granules,
  product: null,
  toBuy: true,
  substance: 'sodium-bicarbonate',
  form: 'other',
  amount: 500,
  rise: 0,
  effect: { quantity: 'totalAlkalinity', change: 4 },
};
const of = (...doses: PlannedDose[]): WeekPlan => ({ ...plan, doses });
const pool = (change: Partial<Scenario['pool']>): Scenario => ({ ...scenario, pool: { ...scenario.pool, ...change } });
const shelf = (id: string, change: object): Scenario => ({
  ...scenario,
  shelf: scenario.shelf.map((product) => (product.id === id ? { ...product, ...change } : product)),
});
const p90Of = (value: number): WeekPlan['projection'] => ({
  ...plan.projection!,
  freeChlorine: { ...plan.projection!.freeChlorine, p90: plan.hours.map(() => value) },
});

const planted: [fault: string, scenario: Scenario, plan: WeekPlan][] = [
  ['chlorine that may pass 10 mg/L', scenario, { ...of(granules), projection: p90Of(10.5) }],
  ['a figure that is not finite', scenario, { ...of(granules), projection: p90Of(Number.NaN) }],
  ['an amount that is not finite', scenario, of({ ...granules, amount: Number.POSITIVE_INFINITY })],
  ['more than an evening may add', scenario, of({ ...granules, amount: 600, rise: 5.1 })],
  ['more than an evening may add, with a rise that hides it', scenario, of({ ...granules, amount: 600, rise: 1 })],
  ['a dose in swim hours', scenario, of({ ...granules, at: '2026-07-07T15:00:00-04:00' })],
  ['a dose before now', { ...scenario, now: '2026-07-08T12:00:00-04:00' }, of(granules)],
  ['two products in one visit', scenario, of(granules, { ...tablets, at: '2026-07-07T20:45:00-04:00' })],
  ['acid beside chlorine', scenario, of(granules, { ...acid, at: '2026-07-07T23:30:00-04:00' })],
  ['acid that lowers pH by 0.6', scenario, of({ ...acid, effect: { quantity: 'pH', change: -0.6 } })],
  ['acid whose effect nobody reckoned', scenario, of({ ...acid, effect: undefined })],
  [
    'two doses beside chlorine',
    scenario,
    of({ ...acid, at: '2026-07-07T06:45:00-04:00' }, { ...bicarbonate, at: '2026-07-08T20:15:00-04:00' }),
  ],
  [
    'calcium the day after bicarbonate',
    {
      ...scenario,
      shelf: [...scenario.shelf, { ...scenario.shelf[2]!, id: 'bicarbonate', substance: 'sodium-bicarbonate' }],
      given: [{ at: '2026-07-06T21:00:00-04:00', product: 'bicarbonate', amount: 500, unit: 'g' }],
    },
    of({ ...bicarbonate, substance: 'calcium-chloride', at: '2026-07-07T20:15:00-04:00' }),
  ],
  [
    'soda in hard water',
    { ...scenario, reading: { ...scenario.reading, calciumHardness: 400 } as Scenario['reading'] },
    of({ ...bicarbonate, substance: 'sodium-carbonate' }),
  ],
  ['tablets without a feeder', pool({ feeder: { ...scenario.pool.feeder, kind: 'none' } }), of(tablets)],
  ['tablets of another ingredient', pool({ feeder: { ...scenario.pool.feeder, ingredient: 'other' } }), of(tablets)],
  ['more tablets than the feeder holds', scenario, of({ ...tablets, amount: 4 })],
  ['more tablets than the water takes', pool({ volume: 30 }), of({ ...tablets, amount: 3 })],
  ['a broken tablet', scenario, of({ ...tablets, amount: 1.5 })],
  ['granules whose label way is not known', shelf('gran', { labelWay: 'unknown' }), of(granules)],
  [
    'granules poured onto vinyl',
    { ...shelf('gran', { labelWay: 'broadcast' }), pool: { ...scenario.pool, surface: 'vinyl' } },
    of(granules),
  ],
  ['more than the shelf holds', shelf('gran', { stock: 50 }), of(granules)],
  ['a product that is not on the shelf', scenario, of({ ...granules, product: 'else' })],
  ['a pool of 1200 m3', pool({ volume: 1200 }), of(granules)],
];

describe('the safety net', () => {
  it('lets a sound plan pass', () => {
    expect(() => assertSafePlan(scenario, of(granules))).not.toThrow();
    expect(() => assertSafePlan(scenario, of(tablets))).not.toThrow();
    expect(() => assertSafePlan(scenario, plan)).not.toThrow();
  });

  it.each(planted)('refuses %s', (_, planted, bad) => {
    expect(() => assertSafePlan(planted, bad)).toThrow(expect.objectContaining({ code: 'plan-refused' }));
  });
});
