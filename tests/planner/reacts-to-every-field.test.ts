import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { planWeek, projectScenario } from '@/lib/planner';
import type { WeekPlan } from '@/lib/schemas/plan';
import { type ScenarioInput, scenarioSchema } from '@/lib/schemas/scenario';

/** The engine paper's example: a plaster pool of 75.7 m3 in Florida, in July. */
const base = {
  pool: {
    volume: 75.7,
    meanDepth: 1.5,
    surface: 'plaster',
    latitude: 28,
    longitude: -81.5,
    timeZone: 'America/New_York',
    sunExposure: 1,
    cover: 'none',
    waterFeatures: false,
    fillWater: { calciumHardness: 60, totalAlkalinity: 80, pH: 7.6 },
    pump: [{ from: '08:00', to: '16:00' }],
    feeder: { kind: 'inline', ingredient: 'trichlor', capacity: 8, loaded: 0 },
    swimHours: { from: '10:00', to: '20:00' },
    stabilizerBand: [30, 60],
    swimLimit: 4,
  },
  reading: {
    takenAt: '2026-07-05T19:00:00-04:00',
    method: 'drop-kit',
    freeChlorine: 3,
    combinedChlorine: 0.2,
    pH: 7.5,
    totalAlkalinity: 80,
    calciumHardness: 220,
    cyanuricAcid: 50,
    temperature: 29,
  },
  shelf: [
    { id: 'tabs', form: 'tablet', substance: 'trichlor', strength: 90, tabletMass: 227, pricePerKg: 9, stock: 5000 },
    {
      id: 'gran',
      form: 'granular',
      substance: 'calcium-hypochlorite',
      strength: 65,
      labelWay: 'dissolve',
      measure: 50,
      pricePerKg: 7.5,
      stock: 4000,
    },
    {
      id: 'liq',
      form: 'liquid',
      substance: 'sodium-hypochlorite',
      strength: 12.5,
      boughtOn: '2026-06-20',
      storedAt: 28,
      measure: 250,
      pricePerLitre: 1.6,
      stock: 20000,
    },
  ],
  week: { sky: Array(7).fill(0.85), rain: [0, 0, 12, 0, 0, 0, 0], swimmerHours: [0, 0, 0, 0, 0, 0, 8] },
  preferences: { visits: 3 },
} satisfies ScenarioInput;

type Change = (scenario: ReturnType<typeof editable>) => void;
// A scenario whose every field may be overwritten: the schema checks it again before it is used.
const editable = () =>
  structuredClone(base) as unknown as Record<'pool' | 'reading' | 'week' | 'preferences', Record<string, unknown>> & {
    shelf: Record<string, unknown>[];
    [field: string]: unknown;
  };

function scenarioWith(change: Change) {
  const scenario = editable();
  change(scenario);
  return scenarioSchema.parse(scenario);
}
const projected = (change: Change): WeekPlan => projectScenario(scenarioWith(change));
const planned = (change: Change): WeekPlan => planWeek(scenarioWith(change));

const chlorine = (plan: WeekPlan, hour = 72) => plan.projection!.median.freeChlorine[hour]!;
const pH = (plan: WeekPlan) => plan.projection!.median.pH[168]!;
const end = (plan: WeekPlan) => plan.endOfWeek!;
const width = (plan: WeekPlan) => plan.projection!.freeChlorine.p90[1]! - plan.projection!.freeChlorine.p10[1]!;
const tablets = (plan: WeekPlan) =>
  plan.doses.filter(({ form }) => form === 'tablet').reduce((sum, { amount }) => sum + amount, 0);
const hoursOf = (plan: WeekPlan) => plan.doses.map(({ at }) => at.slice(11, 16));

const threeTablets: Change = (s) =>
  (s.doses = [{ at: '2026-07-05T20:15:00-04:00', product: 'tabs', amount: 3, unit: 'tablet' }]);
const granules: Change = (s) =>
  (s.doses = [{ at: '2026-07-05T20:15:00-04:00', product: 'gran', amount: 300, unit: 'g' }]);
const liquid: Change = (s) =>
  (s.doses = [{ at: '2026-07-05T20:15:00-04:00', product: 'liq', amount: 2000, unit: 'mL' }]);
const with_ =
  (...changes: Change[]): Change =>
  (s) =>
    changes.forEach((change) => change(s));
const pool =
  (field: string, value: unknown): Change =>
  (s) =>
    (s.pool[field] = value);
const reading =
  (field: string, value: unknown): Change =>
  (s) =>
    (s.reading[field] = value);
const week =
  (field: string, value: unknown): Change =>
  (s) =>
    (s.week[field] = value);
const product =
  (index: number, field: string, value: unknown): Change =>
  (s) =>
    (s.shelf[index]![field] = value);
const preference =
  (field: string, value: unknown): Change =>
  (s) =>
    (s.preferences[field] = value);
const parameter =
  (field: string, value: number): Change =>
  (s) =>
    (s.parameters = { [field]: value });
const driftPrice =
  (field: string, value: number): Change =>
  (s) =>
    (s.driftPrices = { [field]: value });

const wishes =
  (dose: Record<string, unknown>): Change =>
  (s) =>
    (s.wishes = {
      doses: [{ at: '2026-07-09T20:15:00-04:00', product: 'gran', amount: 350, unit: 'g', ...dose }],
    });
const wishedIn = ({ doses }: WeekPlan) => doses.find(({ reason }) => reason === 'wished');

const same: Change = () => {};
const plain = projected(same);
const plainPlan = planned(same);

/** For each field: what is changed, and the direction in which projection or plan has to answer. */
const answers: Record<string, () => void> = {
  'pool.volume': () =>
    expect(chlorine(projected(with_(granules, pool('volume', 60))))).toBeGreaterThan(chlorine(projected(granules))),
  'pool.volumeEstimated': () =>
    expect(planned(pool('volumeEstimated', true)).doses[0]!.reason).toBe('first-dose-halved'),
  'pool.meanDepth': () => expect(chlorine(projected(pool('meanDepth', 3)))).toBeGreaterThan(chlorine(plain)),
  'pool.surface': () => {
    const hard = reading('calciumHardness', 300);
    const codes = (plan: WeekPlan) => plan.cautions.map(({ code }) => code);
    expect(codes(planned(with_(hard, pool('surface', 'vinyl'))))).toContain('hardness-outside-surface-range');
    expect(codes(planned(hard))).not.toContain('hardness-outside-surface-range');
  },
  'pool.latitude': () => expect(chlorine(projected(pool('latitude', -45)))).toBeGreaterThan(chlorine(plain)),
  'pool.longitude': () => expect(chlorine(projected(pool('longitude', -70)), 13)).toBeLessThan(chlorine(plain, 13)),
  'pool.timeZone': () => expect(planned(pool('timeZone', 'America/Chicago')).doses[0]!.at).toMatch(/-05:00$/),
  'pool.sunExposure': () => expect(chlorine(projected(pool('sunExposure', 0.4)))).toBeGreaterThan(chlorine(plain)),
  'pool.cover': () =>
    expect(end(projected(pool('cover', 'opaque'))).calciumHardness).toBeLessThan(end(plain).calciumHardness),
  'pool.waterFeatures': () => expect(pH(projected(pool('waterFeatures', true)))).toBeGreaterThan(pH(plain)),
  'pool.fillWater.calciumHardness': () =>
    expect(
      end(projected(pool('fillWater', { ...base.pool.fillWater, calciumHardness: 500 }))).calciumHardness,
    ).toBeGreaterThan(end(plain).calciumHardness),
  'pool.fillWater.totalAlkalinity': () =>
    expect(
      end(projected(pool('fillWater', { ...base.pool.fillWater, totalAlkalinity: 300 }))).totalAlkalinity,
    ).toBeGreaterThan(end(plain).totalAlkalinity),
  'pool.fillWater.pH': () =>
    expect(pH(projected(pool('fillWater', { ...base.pool.fillWater, pH: 6.5 })))).toBeLessThan(pH(plain)),
  'pool.fillWater.dissolvedSolids': () =>
    expect(
      end(projected(pool('fillWater', { ...base.pool.fillWater, dissolvedSolids: 3000 }))).dissolvedSolids!,
    ).toBeGreaterThan(end(plain).dissolvedSolids!),
  'pool.pump.from': () =>
    expect(chlorine(projected(with_(threeTablets, pool('pump', [{ from: '12:00', to: '16:00' }]))))).toBeLessThan(
      chlorine(projected(threeTablets)),
    ),
  'pool.pump.to': () =>
    expect(
      chlorine(projected(with_(threeTablets, pool('pump', [{ from: '08:00', to: '20:00' }]))), 40),
    ).toBeGreaterThan(chlorine(projected(threeTablets), 40)),
  'pool.feeder.kind': () => expect(tablets(planned(pool('feeder', { kind: 'none' })))).toBe(0),
  'pool.feeder.ingredient': () =>
    expect(tablets(planned(pool('feeder', { ...base.pool.feeder, ingredient: 'calcium-hypochlorite' })))).toBe(0),
  'pool.feeder.capacity': () =>
    expect(tablets(planned(pool('feeder', { ...base.pool.feeder, capacity: 1 })))).toBeLessThan(tablets(plainPlan)),
  'pool.feeder.loaded': () =>
    expect(chlorine(projected(pool('feeder', { ...base.pool.feeder, loaded: 600 })))).toBeGreaterThan(chlorine(plain)),
  'pool.swimHours.from': () =>
    expect(
      Math.min(
        ...planned(pool('swimHours', { from: '06:00', to: '20:00' }))
          .checks.filter(({ kind }) => kind === 'quick')
          .map(({ at }) => Number(at.slice(11, 13))),
      ),
    ).toBe(6),
  'pool.swimHours.to': () =>
    expect(hoursOf(planned(pool('swimHours', { from: '10:00', to: '18:00' })))[0]! < hoursOf(plainPlan)[0]!).toBe(true),
  'pool.stabilizerBand': () => expect(tablets(planned(pool('stabilizerBand', [20, 45])))).toBe(0),
  'pool.swimLimit': () =>
    expect(planned(pool('swimLimit', 10)).openSwimShare!).toBeGreaterThanOrEqual(
      planned(pool('swimLimit', 3)).openSwimShare!,
    ),
  'reading.takenAt': () =>
    expect(projected(reading('takenAt', '2026-07-05T09:00:00-04:00')).hours[0]).toBe('2026-07-05T13:00:00.000Z'),
  'reading.method': () => expect(width(projected(reading('method', 'strip')))).toBeGreaterThan(width(plain)),
  'reading.freeChlorine': () =>
    expect(chlorine(projected(reading('freeChlorine', 4)))).toBeGreaterThan(chlorine(plain)),
  'reading.combinedChlorine': () =>
    expect(planned(reading('combinedChlorine', 0.8)).cautions.map(({ code }) => code)).toContain(
      'combined-chlorine-high',
    ),
  'reading.pH': () => expect(pH(projected(reading('pH', 7.8)))).toBeGreaterThan(pH(plain)),
  'reading.totalAlkalinity': () =>
    expect(end(projected(reading('totalAlkalinity', 120))).totalAlkalinity).toBeGreaterThan(end(plain).totalAlkalinity),
  'reading.calciumHardness': () =>
    expect(end(projected(reading('calciumHardness', 400))).calciumHardness).toBeGreaterThan(end(plain).calciumHardness),
  'reading.cyanuricAcid': () => expect(chlorine(projected(reading('cyanuricAcid', 5)))).toBeLessThan(chlorine(plain)),
  'reading.temperature': () => expect(chlorine(projected(reading('temperature', 20)))).toBeGreaterThan(chlorine(plain)),
  'shelf.id': () => expect(planned(product(0, 'id', 'slow')).doses.map((dose) => dose.product)).toContain('slow'),
  'shelf.form': () => expect(tablets(planned(product(0, 'form', 'other')))).toBe(0),
  'shelf.substance': () =>
    expect(planned(product(1, 'substance', 'other')).doses.map((dose) => dose.product)).not.toContain('gran'),
  'shelf.strength': () =>
    expect(chlorine(projected(with_(granules, product(1, 'strength', 73))))).toBeGreaterThan(
      chlorine(projected(granules)),
    ),
  'shelf.alkali': () =>
    expect(end(projected(with_(granules, product(1, 'alkali', 4)))).totalAlkalinity).toBeGreaterThan(
      end(projected(granules)).totalAlkalinity,
    ),
  'shelf.tabletMass': () =>
    expect(end(projected(with_(threeTablets, product(0, 'tabletMass', 20)))).cyanuricAcid).toBeLessThan(
      end(projected(threeTablets)).cyanuricAcid,
    ),
  'shelf.labelWay': () =>
    expect(
      planned(with_(product(1, 'labelWay', 'unknown'), preference('avoid', ['liquid']))).doses.map(
        (dose) => dose.product,
      ),
    ).not.toContain('gran'),
  'shelf.measure': () =>
    planned(with_(product(1, 'measure', 70), product(2, 'stock', 0)))
      .doses.filter((dose) => dose.product === 'gran')
      .forEach(({ amount }) => expect(amount % 70).toBe(0)),
  'shelf.pricePerKg': () =>
    expect(
      planned(with_(product(0, 'pricePerKg', 90), product(1, 'pricePerKg', 75), product(2, 'pricePerLitre', 16))).cost!
        .money,
    ).toBeGreaterThan(plainPlan.cost!.money),
  'shelf.pricePerLitre': () =>
    expect(planned(product(2, 'pricePerLitre', 0.01)).doses.map((dose) => dose.product)).toContain('liq'),
  'shelf.stock': () => expect(tablets(planned(product(0, 'stock', 230)))).toBeLessThanOrEqual(1),
  'shelf.boughtOn': () =>
    expect(chlorine(projected(with_(liquid, product(2, 'boughtOn', '2025-09-01'))))).toBeLessThan(
      chlorine(projected(liquid)),
    ),
  'shelf.storedAt': () =>
    expect(chlorine(projected(with_(liquid, product(2, 'storedAt', 45))))).toBeLessThan(chlorine(projected(liquid))),
  'week.sky': () => expect(chlorine(projected(week('sky', Array(7).fill(0.3))))).toBeGreaterThan(chlorine(plain)),
  'week.rain': () =>
    expect(end(projected(week('rain', [0, 80, 80, 0, 0, 0, 0]))).cyanuricAcid).toBeLessThan(end(plain).cyanuricAcid),
  'week.swimmerHours': () =>
    expect(chlorine(projected(week('swimmerHours', [0, 10, 10, 0, 0, 0, 8])))).toBeLessThan(chlorine(plain)),
  'week.waterTemperature': () =>
    expect(chlorine(projected(week('waterTemperature', Array(7).fill(20))))).toBeGreaterThan(chlorine(plain)),
  'week.evaporation': () =>
    expect(end(projected(week('evaporation', Array(7).fill(12)))).calciumHardness).toBeGreaterThan(
      end(plain).calciumHardness,
    ),
  'week.backwash': () =>
    expect(end(projected(week('backwash', [0, 5, 0, 0, 0, 0, 0]))).cyanuricAcid).toBeLessThan(end(plain).cyanuricAcid),
  'preferences.visits': () => expect(planned(preference('visits', 1)).doses.length).toBeLessThanOrEqual(1),
  'preferences.money': () => expect(planned(preference('money', 0)).cost!.money).toBe(0),
  'preferences.evenings': () => expect(planned(preference('evenings', 0)).cost!.visits).toBe(0),
  'preferences.steadiness': () => expect(planned(preference('steadiness', 0)).cost!.shortfall).toBe(0),
  'preferences.avoid': () => expect(tablets(planned(preference('avoid', ['tablet'])))).toBe(0),
  now: () =>
    planned((s) => (s.now = '2026-07-08T12:00:00-04:00')).doses.forEach(({ at }) =>
      expect(Date.parse(at)).toBeGreaterThan(Date.parse('2026-07-08T12:00:00-04:00')),
    ),
  'given.at': () =>
    expect(
      chlorine(
        projected((s) => (s.given = [{ at: '2026-07-07T20:15:00-04:00', product: 'gran', amount: 300, unit: 'g' }])),
      ),
    ).toBeGreaterThan(
      chlorine(
        projected((s) => (s.given = [{ at: '2026-07-05T20:15:00-04:00', product: 'gran', amount: 300, unit: 'g' }])),
      ),
    ),
  'given.product': () =>
    expect(() =>
      projected((s) => (s.given = [{ at: '2026-07-06T20:15:00-04:00', product: 'nothing', amount: 300, unit: 'g' }])),
    ).toThrow(/nothing/),
  'given.amount': () =>
    expect(
      chlorine(
        projected((s) => (s.given = [{ at: '2026-07-06T20:15:00-04:00', product: 'gran', amount: 300, unit: 'g' }])),
      ),
    ).toBeGreaterThan(
      chlorine(
        projected((s) => (s.given = [{ at: '2026-07-06T20:15:00-04:00', product: 'gran', amount: 150, unit: 'g' }])),
      ),
    ),
  'given.unit': () =>
    expect(() =>
      projected((s) => (s.given = [{ at: '2026-07-06T20:15:00-04:00', product: 'gran', amount: 300, unit: 'mL' }])),
    ).toThrow(/counted/),
  'parameters.boundPhotolysis': () =>
    expect(chlorine(projected(parameter('boundPhotolysis', 0.02)))).toBeLessThan(chlorine(plain)),
  'parameters.sunStrength': () =>
    expect(chlorine(projected(parameter('sunStrength', 2)))).toBeLessThan(chlorine(plain)),
  'parameters.darkDemand': () =>
    expect(chlorine(projected(parameter('darkDemand', 0.02)))).toBeLessThan(chlorine(plain)),
  'parameters.chlorinePerSwimmerHour': () =>
    expect(chlorine(projected(parameter('chlorinePerSwimmerHour', 10)), 168)).toBeLessThan(chlorine(plain, 168)),
  'parameters.tabletLife': () =>
    expect(chlorine(projected(with_(threeTablets, parameter('tabletLife', 90))), 40)).toBeLessThan(
      chlorine(projected(threeTablets), 40),
    ),
  'parameters.waterPerSwimmerHour': () =>
    expect(end(projected(parameter('waterPerSwimmerHour', 150))).cyanuricAcid).toBeLessThan(end(plain).cyanuricAcid),
  'parameters.leak': () =>
    expect(end(projected(parameter('leak', 2))).cyanuricAcid).toBeLessThan(end(plain).cyanuricAcid),
  'parameters.carbonDioxideTransfer': () =>
    expect(pH(projected(parameter('carbonDioxideTransfer', 0.05)))).toBeGreaterThan(pH(plain)),
  'parameters.volume': () =>
    expect(chlorine(projected(with_(granules, parameter('volume', 60))))).toBeGreaterThan(
      chlorine(projected(granules)),
    ),
  'driftPrices.stabilizer': () =>
    expect(tablets(planned(driftPrice('stabilizer', 50)))).toBeLessThan(tablets(plainPlan)),
  'driftPrices.hardness': () =>
    expect(
      planned(with_(reading('calciumHardness', 390), driftPrice('hardness', 50))).doses.map((dose) => dose.product),
    ).not.toContain('gran'),
  'wishes.doses.at': () => expect(wishedIn(planned(wishes({})))?.at).toBe('2026-07-09T20:15:00-04:00'),
  'wishes.doses.product': () =>
    expect(wishedIn(planned(wishes({ product: 'liq', unit: 'mL', amount: 1000 })))?.form).toBe('liquid'),
  'wishes.doses.amount': () =>
    expect(wishedIn(planned(wishes({ amount: 200 })))!.rise).toBeLessThan(wishedIn(planned(wishes({})))!.rise),
  'wishes.doses.unit': () => expect(() => planned(wishes({ unit: 'mL' }))).toThrow(/counted/),
  'wishes.notOn': () => {
    const day = plainPlan.doses[0]!.at.slice(0, 10);
    expect(planned((s) => (s.wishes = { notOn: [day] })).doses.map(({ at }) => at.slice(0, 10))).not.toContain(day);
  },
  'wishes.noFurtherTablets': () => expect(tablets(planned((s) => (s.wishes = { noFurtherTablets: true })))).toBe(0),
  'driftPrices.pH': () => expect(tablets(planned(driftPrice('pH', 50)))).toBeLessThan(tablets(plainPlan)),
};

/** Every leaf of the scenario's JSON Schema, list items and union branches by the path of their field. */
function leavesOf(schema: z.core.JSONSchema.JSONSchema, path: string[] = []): string[] {
  if (schema.properties)
    return Object.entries(schema.properties).flatMap(([name, child]) =>
      typeof child === 'object' ? leavesOf(child, [...path, name]) : [],
    );
  const items = schema.items;
  if (typeof items === 'object' && !Array.isArray(items) && items.properties) return leavesOf(items, path);
  const branches = schema.anyOf?.filter((branch) => typeof branch === 'object' && branch.properties) ?? [];
  if (path.at(-1) === 'reading') return branches.flatMap((branch) => leavesOf(branch, path));
  return [path.join('.')];
}

describe('every field of a scenario', () => {
  // What a pool has taught is one thing, not a field each: learnt-start.test.ts.
  const fields = leavesOf(z.toJSONSchema(scenarioSchema, { io: 'input' })).filter(
    (path) => !/^(doses|posterior)/.test(path),
  );

  it('has an answer here', () => {
    expect(new Set(Object.keys(answers))).toEqual(new Set(fields));
  });

  it.each(Object.entries(answers))('%s moves plan or projection in its direction', (_, answer) => {
    answer();
  });
});

describe('common practice', () => {
  const of = (volume: number) => tablets(planned(pool('volume', volume)));

  it('is two to four tablets in a pool of 75.7 m3, fewer in a smaller and more in a larger', () => {
    expect(tablets(plainPlan)).toBeGreaterThanOrEqual(2);
    expect(tablets(plainPlan)).toBeLessThanOrEqual(4);
    expect(of(41)).toBeGreaterThanOrEqual(1);
    expect(of(41)).toBeLessThanOrEqual(3);
    expect(of(114)).toBeGreaterThanOrEqual(3);
    expect(of(114)).toBeLessThanOrEqual(7);
  });

  it('is no tablet at all at a stabilizer of 88, and says why', () => {
    const plan = planned(reading('cyanuricAcid', 88));
    expect(tablets(plan)).toBe(0);
    expect(plan.reasons.map(({ code }) => code)).toContain('no-tablets-stabilizer-high');
  });

  it('is a fast product where the curve needs it', () => {
    const plan = planned(reading('freeChlorine', 0.8));
    expect(plan.doses[0]!.form).not.toBe('tablet');
    expect(plan.reasons.map(({ code }) => code)).toContain('fast-closes-gap');
  });
});
