import { describe, expect, it } from 'vitest';
import { dayOf } from '@/lib/calendar/household-day';
import { planWeek, projectScenario } from '@/lib/planner';
import { fullTest, products, scenarioOf, tabletsIn } from './scenarios';

const evening = (day: number, time = '20:15') => `2026-07-${String(day).padStart(2, '0')}T${time}:00-04:00`;
const granules = (day: number, amount = 200) => ({ at: evening(day), product: 'gran', amount, unit: 'g' });
const tablets = (day: number, amount: number) => ({ at: evening(day), product: 'tabs', amount, unit: 'tablet' });
const daysOf = (doses: readonly { at: string }[]) => doses.map(({ at }) => dayOf(Date.parse(at), 'America/New_York'));

describe('doses that were given', () => {
  it('are part of the curve', () => {
    const chlorine = (given: Record<string, unknown>[]) =>
      projectScenario(scenarioOf({ given })).projection!.median.freeChlorine;
    const [without, dosed] = [chlorine([]), chlorine([granules(6)])];
    const at = 26;
    expect(dosed[at]! - without[at]!).toBeCloseTo((200 * 0.65) / 75.7, 1);
    expect(dosed.slice(0, at)).toEqual(without.slice(0, at));
  });

  it('at the very instant of the newest reading count as after it', () => {
    const given = [{ ...granules(5), at: fullTest.takenAt }];
    const { freeChlorine } = projectScenario(scenarioOf({ given })).projection!.median;
    expect(freeChlorine[0]).toBeCloseTo(3 + (200 * 0.65) / 75.7, 6);
  });

  it('between two readings are neither lost nor counted twice', () => {
    const first = { ...fullTest, takenAt: '2026-07-04T19:00:00-04:00', cyanuricAcid: 40 };
    const last = { takenAt: fullTest.takenAt, freeChlorine: 3, pH: 7.5 };
    const cyanuricAcid = (at: string) => {
      const shelf = [products.gran, { id: 'stab', form: 'other', substance: 'cyanuric-acid', stock: 5000 }];
      const given = [{ at, product: 'stab', amount: 757, unit: 'g' }];
      return projectScenario(scenarioOf({ reading: [first, last], shelf, given })).projection!.median.cyanuricAcid[0]!;
    };
    for (const at of [first.takenAt, '2026-07-04T21:07:00-04:00', last.takenAt])
      expect(cyanuricAcid(at)).toBeCloseTo(50, 1);
    expect(cyanuricAcid('2026-07-04T18:59:00-04:00')).toBeCloseTo(40, 1);
  });

  it('use up evenings', () => {
    const given = [granules(5, 100), granules(6, 100), granules(7, 100)];
    const now = evening(8, '08:00');
    expect(planWeek(scenarioOf({ given, now })).doses).toEqual([]);
    const left = planWeek(scenarioOf({ given: given.slice(0, 2), now }));
    expect(left.doses).toHaveLength(1);
  });

  it('leave their evening alone', () => {
    const now = evening(5, '19:30');
    const low = { freeChlorine: 1 };
    expect(daysOf(planWeek(scenarioOf({ reading: low, now })).doses)).toContain('2026-07-05');
    const given = [{ ...granules(5), at: '2026-07-05T19:10:00-04:00' }];
    expect(daysOf(planWeek(scenarioOf({ reading: low, now, given })).doses)).not.toContain('2026-07-05');
  });

  it('keep chlorine four hours from acid', () => {
    const acid = { id: 'acid', form: 'liquid', substance: 'hydrochloric-acid', stock: 5000 };
    const shelf = [products.gran, acid];
    const plan = (time: string) =>
      planWeek(
        scenarioOf({
          ...{ shelf, reading: { freeChlorine: 1 }, now: evening(5, '19:30') },
          given: [{ at: evening(5, time), product: 'acid', amount: 500, unit: 'mL' }],
        }),
      );
    expect(daysOf(plan('19:20').doses)).not.toContain('2026-07-05');
    const morning = scenarioOf({
      ...{ shelf, reading: { takenAt: evening(5, '07:00'), freeChlorine: 1 } },
      given: [{ at: evening(5, '07:30'), product: 'acid', amount: 500, unit: 'mL' }],
    });
    expect(daysOf(planWeek(morning).doses)).toContain('2026-07-05');
  });

  it('of tablets count to what a week may have, and to what the feeder holds', () => {
    const longing = { reading: { freeChlorine: 2, cyanuricAcid: 20 }, preferences: { visits: 2 } };
    const now = evening(6, '08:00');
    expect(tabletsIn(planWeek(scenarioOf(longing)))).toBe(3);
    // Three is the most for 75.7 m3: 6 mg/L of stabilizer in a week.
    expect(tabletsIn(planWeek(scenarioOf({ ...longing, now, given: [tablets(5, 3)] })))).toBe(0);
    expect(tabletsIn(planWeek(scenarioOf({ ...longing, now, given: [tablets(5, 2)] })))).toBeLessThanOrEqual(1);
    const before = { ...longing, given: [{ ...tablets(3, 3), at: '2026-07-03T20:00:00-04:00' }] };
    expect(tabletsIn(planWeek(scenarioOf(before)))).toBe(0);
    const weekAgo = { ...longing, given: [{ ...tablets(1, 3), at: '2026-06-28T20:00:00-04:00' }] };
    expect(tabletsIn(planWeek(scenarioOf(weekAgo)))).toBeGreaterThan(0);
    const small = { kind: 'inline', ingredient: 'trichlor', capacity: 2 };
    expect(tabletsIn(planWeek(scenarioOf({ ...longing, pool: { feeder: small }, now, given: [tablets(5, 2)] })))).toBe(
      0,
    );
  });

  it('of dichlor make the water count as stabilized', () => {
    const dichlor = { id: 'di', form: 'granular', substance: 'dichlor', strength: 55, stock: 1000 };
    const lowest = (product: Record<string, unknown>, id: string) =>
      projectScenario(
        scenarioOf({
          ...{ reading: { cyanuricAcid: 0 }, shelf: [product], pool: { feeder: { kind: 'none' } } },
          given: [{ at: evening(6), product: id, amount: 50, unit: 'g' }],
        }),
      ).projection!.freeChlorine.lowestLevel[0];
    expect(lowest(products.gran, 'gran')).toBe(1);
    expect(lowest(dichlor, 'di')).toBe(2);
  });

  it('that nobody can reckon with are refused with their path', () => {
    const given = [granules(6), { ...granules(7), product: 'gone' }];
    expect(() => planWeek(scenarioOf({ given }))).toThrow(
      expect.objectContaining({
        code: 'invalid-input',
        problems: [expect.objectContaining({ path: 'given[1].product' })],
      }),
    );
    const blend = { id: 'blend', form: 'other', substance: 'other', stock: 100 };
    expect(() => planWeek(scenarioOf({ shelf: [blend], given: [{ ...granules(6), product: 'blend' }] }))).toThrow(
      /blend/,
    );
  });
});

describe('projecting doses of a plan', () => {
  it('gives the promised curve again, bought products included', () => {
    for (const changes of [{}, { shelf: [] }]) {
      const plan = planWeek(scenarioOf(changes));
      const projected = projectScenario(scenarioOf({ ...changes, doses: plan.doses }));
      expect(projected.doses).toEqual([]);
      expect(projected.projection).toEqual(plan.projection);
      expect(projected.broken).toEqual(plan.broken);
      expect(projected.openSwimShare).toBe(plan.openSwimShare);
      expect(projected.endOfWeek).toEqual(plan.endOfWeek);
    }
  });

  it('refuses a dose of nothing that is known', () => {
    const doses = [{ at: evening(6), product: null, amount: 100, unit: 'g' }];
    expect(() => projectScenario(scenarioOf({ doses }))).toThrow(
      expect.objectContaining({ problems: [expect.objectContaining({ path: 'doses[0].product' })] }),
    );
  });
});
