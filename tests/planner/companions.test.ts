import { describe, expect, it } from 'vitest';
import { dayOf } from '@/lib/calendar/household-day';
import { wallClock } from '@/lib/calendar/wall-time';
import { addDose, type Substance } from '@/lib/chemistry';
import { planWeek, projectScenario } from '@/lib/planner';
import { companionAmount } from '@/lib/planner/companions/amount';
import type { CompanionNeed, CompanionSubstance } from '@/lib/planner/companions/need';
import { contextOf } from '@/lib/planner/context';
import { openSwimShare } from '@/lib/planner/limits-broken';
import { shelfProductSchema } from '@/lib/schemas/shelf-product';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { WeekPlan } from '@/lib/schemas/plan';
import { type Changes, codesIn, fullTest, products, scenarioOf } from './scenarios';
import { untrueOf } from './sentences/untrue';

const HOUR = 3_600_000;
const zone = 'America/New_York';
const chlorines = ['trichlor', 'calcium-hypochlorite', 'sodium-hypochlorite'];
const companionsIn = ({ doses }: WeekPlan) => doses.filter(({ substance }) => !chlorines.includes(substance));
const onlyCompanion = (plan: WeekPlan): PlannedDose => {
  expect(companionsIn(plan)).toHaveLength(1);
  return companionsIn(plan)[0]!;
};
const noFeeder = { pool: { feeder: { kind: 'none' } } } as const satisfies Changes;

describe('beside chlorine', () => {
  it('nothing goes in where the water is in order', () => {
    expect(companionsIn(planWeek(scenarioOf()))).toEqual([]);
  });

  it('alkalinity is raised first, in whole measures up to the evening’s cap, with a full test the day after', () => {
    const plan = planWeek(scenarioOf({ reading: { totalAlkalinity: 50, calciumHardness: 100, pH: 7.3 } }));
    const dose = onlyCompanion(plan);
    expect(dose).toMatchObject({ substance: 'sodium-bicarbonate', reason: 'raises-alkalinity', toBuy: true });
    expect(dose.amount % 50).toBe(0);
    // 34 g/m3: +20 mg/L at most.
    expect(dose.amount).toBeLessThanOrEqual(34 * 75.7);
    expect(dose.effect!.change).toBeGreaterThan(15);
    expect(dose.effect!.change).toBeLessThanOrEqual(20.5);
    const retest = plan.checks.find(({ reason }) => reason === 'after-companion')!;
    expect(retest.kind).toBe('full');
    expect(Date.parse(retest.at) - Date.parse(dose.at)).toBeGreaterThanOrEqual(24 * HOUR);
    expect(codesIn(plan.reasons)).toContain('raises-alkalinity');
  });

  it('never shares an evening with chlorine', () => {
    const plan = planWeek(
      scenarioOf({ reading: { totalAlkalinity: 50, freeChlorine: 1 }, preferences: { visits: 7 } }),
    );
    const days = plan.doses.map(({ at }) => dayOf(Date.parse(at), zone));
    expect(onlyCompanion(plan)).toBeDefined();
    expect(new Set(days).size).toBe(days.length);
    // Chlorine comes first while it is under the code minimum.
    expect(chlorines).toContain(plan.doses[0]!.substance);
  });

  it('acid goes in at first light, 4 h from chlorine, half of its cap the first time, and pH falls by 0.4 at most', () => {
    const plan = planWeek(scenarioOf({ reading: { pH: 8, totalAlkalinity: 100 } }));
    const dose = onlyCompanion(plan);
    expect(dose).toMatchObject({ substance: 'hydrochloric-acid', unit: 'mL', reason: 'lowers-pH' });
    const { hourOfDay } = wallClock(Date.parse(dose.at), zone);
    expect(hourOfDay).toBeGreaterThan(6);
    expect(hourOfDay).toBeLessThan(8);
    expect(dose.amount).toBeLessThanOrEqual((16 * 75.7) / 2);
    expect(dose.effect!.change).toBeLessThan(-0.05);
    expect(dose.effect!.change).toBeGreaterThanOrEqual(-0.4);
    for (const other of plan.doses.filter((each) => each !== dose))
      expect(Math.abs(Date.parse(other.at) - Date.parse(dose.at))).toBeGreaterThanOrEqual(4 * HOUR);
    expect(plan.checks.find(({ reason }) => reason === 'after-companion')!.kind).toBe('quick');
  });

  it('acid that is known may go to its whole cap, and never takes the likely range under 7.2', () => {
    const acid = {
      id: 'acid',
      form: 'liquid',
      substance: 'hydrochloric-acid',
      strength: 31.45,
      measure: 100,
      stock: 9000,
    };
    const changes = (method: 'strip' | 'drop-kit'): Changes => ({
      shelf: [products.gran, acid],
      reading: { pH: 8.1, totalAlkalinity: 120, method },
      given: [{ at: '2026-07-01T07:00:00-04:00', product: 'acid', amount: 300, unit: 'mL' }],
    });
    const known = onlyCompanion(planWeek(scenarioOf(changes('drop-kit'))));
    expect(known).toMatchObject({ product: 'acid', toBuy: false });
    expect(known.amount).toBeGreaterThan((16 * 75.7) / 2);
    expect(known.amount).toBeLessThanOrEqual(16 * 75.7);
  });

  it('acid never takes the likely range under 7.2, however sure or unsure pH is', () => {
    const water = {
      ...{ freeChlorine: 3, pH: 7.9, totalAlkalinity: 120, calciumHardness: 220, cyanuricAcid: 40, temperature: 29 },
    };
    const acid = shelfProductSchema.parse({
      id: 'acid',
      form: 'liquid',
      substance: 'hydrochloric-acid',
      strength: 31.45,
    });
    const need = { reason: 'lowers-pH', substances: [], quantity: 'pH', target: 7.5, fromHour: 0 } as const;
    const product = { ...acid, substance: 'hydrochloric-acid' as const, measure: 1 };
    const pHAfter = (pHError: number) => {
      const amount = companionAmount(need, product, water, { volume: 75.7, pHError, halved: false });
      return addDose(water, 75.7, { substance: 'hydrochloric-acid', strength: 31.45, amount }).pH;
    };
    expect(pHAfter(0.05)).toBeCloseTo(7.5, 1);
    // One in ten lies 1.28 sigma below the middle.
    for (const pHError of [0.25, 0.3, 0.4]) expect(pHAfter(pHError) - 1.28 * pHError).toBeGreaterThanOrEqual(7.199);
    expect(pHAfter(0.3)).toBeLessThan(7.9);
  });

  it('is what chemistry makes of it', () => {
    const dose = onlyCompanion(planWeek(scenarioOf({ reading: { pH: 8, totalAlkalinity: 100 } })));
    const water = { ...fullTest, freeChlorine: 3, combinedChlorine: 0.2, pH: 8, totalAlkalinity: 100 };
    const after = addDose(water, 75.7, {
      substance: dose.substance as Substance,
      amount: dose.amount,
      strength: 31.45,
    });
    expect(dose.effect!.change).toBeCloseTo(after.pH - 8, 1);
  });

  it('soda raises low pH, not in hard water', () => {
    const low: Changes = { ...noFeeder, reading: { pH: 7, totalAlkalinity: 90 } };
    const dose = onlyCompanion(planWeek(scenarioOf(low)));
    expect(dose).toMatchObject({ substance: 'sodium-carbonate', reason: 'raises-pH' });
    expect(dose.amount).toBeLessThanOrEqual(10 * 75.7);
    const hard = planWeek(scenarioOf({ ...low, reading: { ...low.reading, calciumHardness: 350 } }));
    expect(companionsIn(hard)).toEqual([]);
  });

  it('nothing goes in where the water is past its target in the hour of the dose', () => {
    const water = { ...fullTest, combinedChlorine: 0.2 };
    const amountOf = (
      need: Pick<CompanionNeed, 'reason' | 'quantity' | 'target'>,
      substance: CompanionSubstance,
      now: object,
    ) =>
      companionAmount(
        { ...need, substances: [], fromHour: 0 },
        { ...shelfProductSchema.parse({ id: 'it', form: 'other', substance, stock: 5000 }), substance, measure: 1 },
        { ...water, ...now },
        { volume: 75.7, pHError: 0.1, halved: false },
      );
    const lowersPH = { reason: 'lowers-pH', quantity: 'pH', target: 7.5 } as const;
    const raisesAlkalinity = { reason: 'raises-alkalinity', quantity: 'totalAlkalinity', target: 80 } as const;
    expect(amountOf(lowersPH, 'hydrochloric-acid', { pH: 6.9 })).toBe(0);
    // Under 7.2 and 1.28 sigma above it the likely range would fall out.
    expect(amountOf({ ...lowersPH, target: 7.3 }, 'hydrochloric-acid', { pH: 7.32 })).toBe(0);
    expect(amountOf(lowersPH, 'hydrochloric-acid', { pH: 7.9 })).toBeGreaterThan(0);
    expect(amountOf(raisesAlkalinity, 'sodium-bicarbonate', { totalAlkalinity: 95 })).toBe(0);
    expect(amountOf(raisesAlkalinity, 'sodium-bicarbonate', { totalAlkalinity: 60 })).toBeGreaterThan(0);
  });

  it('no soda by a pH that chlorine bleached, and that was carried on from an earlier test', () => {
    const earlier = { ...fullTest, takenAt: '2026-07-03T19:00:00-04:00', pH: 7, totalAlkalinity: 90 };
    const soda = (newest: object) =>
      planWeek(scenarioOf({ ...noFeeder, reading: [earlier, { ...fullTest, totalAlkalinity: 90, ...newest }] }));
    expect(onlyCompanion(soda({ pH: 7 })).substance).toBe('sodium-carbonate');
    expect(companionsIn(soda({ pH: 7.7, freeChlorine: 10.2 }))).toEqual([]);
  });

  describe('is tested for at the end of a plan whose full test is due before it', () => {
    const full = { ...fullTest, takenAt: '2026-06-29T19:00:00-04:00' };
    const shelf = [products.gran];

    it('acid of the last morning by the evening', () => {
      const quick = { takenAt: '2026-07-05T21:30:00-04:00', freeChlorine: 3, pH: 8.1, method: 'drop-kit' };
      const alkaline = { ...full, totalAlkalinity: 110 };
      const plan = planWeek(scenarioOf({ reading: [alkaline, quick], now: '2026-07-11T22:00:00-04:00', shelf }));
      expect(onlyCompanion(plan).at.slice(0, 13)).toBe('2026-07-12T06');
      const last = { kind: 'quick', at: '2026-07-12T21:30:00-04:00', reason: 'after-companion' };
      expect(plan.checks.at(-1)).toMatchObject(last);
    });

    it('bicarbonate, which a plan of less than a further day does not see, by the next week’s test', () => {
      const quick = { takenAt: '2026-07-05T19:00:00-04:00', freeChlorine: 1.9, pH: 7.5, method: 'drop-kit' };
      const weak = { ...full, totalAlkalinity: 50 };
      const now = '2026-07-10T22:00:00-04:00';
      const plan = planWeek(scenarioOf({ reading: [weak, quick], now, preferences: { visits: 2 }, shelf }));
      expect(onlyCompanion(plan).at.slice(0, 10)).toBe('2026-07-11');
      const last = { kind: 'full', at: '2026-07-12T19:00:00-04:00', reason: 'next-week' };
      expect(plan.checks.at(-1)).toMatchObject(last);
    });
  });

  it('that only a week with more chlorine would need is left out of one with less', () => {
    // Granules raise this water's pH out of its range, and half a first dose of them does not.
    const scenario = scenarioOf({
      pool: {
        ...{ volume: 120, volumeEstimated: true, meanDepth: 2.36, surface: 'tile', pump: [] },
        ...{ latitude: 40.4, longitude: -3.7, timeZone: 'Europe/Madrid', sunExposure: 0.93 },
        fillWater: { calciumHardness: 120, totalAlkalinity: 249, pH: 7 },
        feeder: { kind: 'inline', ingredient: 'trichlor', capacity: 4 },
      },
      reading: [
        {
          ...fullTest,
          takenAt: '2026-06-15T06:13:00Z',
          freeChlorine: 2.4,
          pH: 7.3,
          cyanuricAcid: 59.5,
          temperature: 12.6,
        },
        {
          takenAt: '2026-06-21T08:13:00-04:00',
          freeChlorine: 0.22,
          pH: 7.638,
          totalAlkalinity: 92.6,
          temperature: 18.6,
          method: 'drop-kit',
        },
      ],
      shelf: [{ ...products.gran, strength: 48.5, alkali: 1.68, measure: 282, labelWay: 'broadcast', stock: 546 }],
      week: {
        rain: [0, 24, 0, 0, 0, 0, 0],
        swimmerHours: [0, 0, 0, 0, 0, 0, 37.6],
        waterTemperature: [8.4, 8.3, 10, 14.8, 16.3, 15.3, 24.6, 17.6],
      },
      preferences: { visits: 2, evenings: 0.465, steadiness: 0.237 },
    });
    const plan = planWeek(scenario);
    for (const dose of companionsIn(plan)) {
      const without = projectScenario({ ...scenario, doses: plan.doses.filter((each) => each !== dose) });
      expect(Math.max(...without.projection!.pH.p50)).toBeGreaterThan(7.8);
    }
    expect(untrueOf({ scenario, plan })).toEqual([]);
  });

  it('hardness is raised where the surface would give its own, and only when it was measured', () => {
    const dose = onlyCompanion(planWeek(scenarioOf({ reading: { calciumHardness: 110 } })));
    expect(dose).toMatchObject({ substance: 'calcium-chloride', reason: 'raises-hardness' });
    expect(dose.effect!.change).toBeLessThanOrEqual(31);
    expect(
      companionsIn(planWeek(scenarioOf({ pool: { surface: 'vinyl' }, reading: { calciumHardness: 110 } }))),
    ).toEqual([]);
    const base = scenarioOf();
    const { calciumHardness: _, ...unmeasured } = [base.reading].flat()[0]!;
    expect(companionsIn(planWeek({ ...base, reading: unmeasured }))).toEqual([]);
  });

  it('stabilizer is raised only where no tablets can bring it', () => {
    expect(companionsIn(planWeek(scenarioOf({ reading: { cyanuricAcid: 15 } })))).toEqual([]);
    const dose = onlyCompanion(planWeek(scenarioOf({ ...noFeeder, reading: { cyanuricAcid: 15 } })));
    expect(dose).toMatchObject({ substance: 'cyanuric-acid', reason: 'raises-stabilizer' });
    expect(dose.effect!.change).toBeLessThanOrEqual(20.5);
  });

  it.each([
    { cyanuricAcid: 25, pool: {} },
    { cyanuricAcid: 15, pool: {} },
    { cyanuricAcid: 28, pool: { volume: 41 } },
    { cyanuricAcid: 15, pool: { feeder: { kind: 'inline', ingredient: 'trichlor', capacity: 3, loaded: 681 } } },
  ])('no stabilizer on top of the tablets that bring it, before the tick or after: $cyanuricAcid, $pool', (water) => {
    const changes = { pool: water.pool, reading: { cyanuricAcid: water.cyanuricAcid, totalAlkalinity: 110, pH: 7.6 } };
    const before = planWeek(scenarioOf(changes));
    expect(companionsIn(before)).toEqual([]);
    const first = before.doses.find(({ form }) => form === 'tablet');
    if (first === undefined) return;
    const { at, product, amount, unit } = first;
    const now = new Date(Date.parse(at) + HOUR).toISOString();
    const after = planWeek(scenarioOf({ ...changes, given: [{ at, product, amount, unit }], now }));
    expect(companionsIn(after)).toEqual([]);
  });

  it('waits for a test after the last such dose, and for an evening of its own', () => {
    const shelf = [products.gran, { id: 'soda', form: 'other', substance: 'sodium-bicarbonate', stock: 5000 }];
    const given = [{ at: '2026-07-05T18:00:00-04:00', product: 'soda', amount: 1000, unit: 'g' }];
    const waits = planWeek(scenarioOf({ shelf, given, reading: { totalAlkalinity: 50 } }));
    expect(companionsIn(waits)).toEqual([]);
    expect(waits.cautions).toContainEqual({ code: 'companion-waits', reason: 'raises-alkalinity' });
    const one = planWeek(scenarioOf({ reading: { totalAlkalinity: 50 }, preferences: { visits: 1 } }));
    expect(companionsIn(one)).toEqual([]);
    expect(codesIn(one.cautions)).toContain('companion-waits');
  });

  it('waits where its evening, taken from chlorine, would close more than a quarter of the swim hours', () => {
    const week = (visits: number, avoid: string[] = []) =>
      planWeek(scenarioOf({ reading: { totalAlkalinity: 65 }, preferences: { visits, avoid } }));
    expect(companionsIn(week(2))).toEqual([]);
    expect(codesIn(week(2).cautions)).toContain('companion-waits');
    expect(week(2).openSwimShare).toBe(week(2, ['sodium-bicarbonate']).openSwimShare);
    expect(onlyCompanion(week(4)).substance).toBe('sodium-bicarbonate');
    expect(codesIn(week(4).cautions)).not.toContain('companion-waits');
  });

  it('an acid dose closes the swim hours of its wait', () => {
    const scenario = scenarioOf({
      pool: { swimHours: { from: '07:00', to: '20:00' } },
      reading: { pH: 8, totalAlkalinity: 100 },
    });
    const plan = planWeek(scenario);
    const dose = onlyCompanion(plan);
    const context = contextOf(scenario);
    const without = openSwimShare(plan.projection!, [], context);
    const waited = plan.hours.filter((hour, index) => {
      const after = Date.parse(hour) - Date.parse(dose.at);
      return context.swimHour[index] && after >= 0 && after < 4 * HOUR;
    });
    expect(dose.substance).toBe('hydrochloric-acid');
    expect(waited.length).toBeGreaterThan(1);
    expect(plan.openSwimShare).toBeLessThan(without);
    expect(openSwimShare(plan.projection!, [{ ...dose, at: '2027-01-01T00:00:00Z' }], context)).toBe(without);
  });

  it('is halved in a pool whose volume is an estimate', () => {
    const whole = onlyCompanion(planWeek(scenarioOf({ reading: { totalAlkalinity: 50 } })));
    const half = onlyCompanion(
      planWeek(scenarioOf({ pool: { volumeEstimated: true }, reading: { totalAlkalinity: 50 } })),
    );
    expect(half.amount).toBeLessThanOrEqual(whole.amount / 2);
  });

  it('counts in the cost, in visits and among the evenings that the household wants', () => {
    const plan = planWeek(scenarioOf({ reading: { pH: 8, totalAlkalinity: 100 } }));
    const { cost } = plan;
    const parts = Object.entries(cost!).filter(([part]) => part !== 'total');
    expect(parts.reduce((sum, [, value]) => sum + value, 0)).toBeCloseTo(cost!.total, 9);
    expect(cost!.visits).toBeGreaterThanOrEqual(1.5 * new Set(plan.doses.map(({ at }) => at)).size - 1e-9);
    expect(new Set(plan.doses.map(({ at }) => at)).size).toBeLessThanOrEqual(3);
  });
});
