import { describe, expect, it } from 'vitest';
import { planWeek, projectScenario } from '@/lib/planner';
import { codesIn, fullTest, scenarioOf, tabletsIn } from './scenarios';

describe('what a plan needs', () => {
  it('is chlorine and pH at most 14 days old, else there is no plan but the question', () => {
    const plan = planWeek(scenarioOf({ now: '2026-07-19T19:00:01-04:00' }));
    expect(plan).toMatchObject({ doses: [], hours: [], projection: null, cost: null, alternatives: [] });
    expect(plan.needs).toEqual([
      { code: 'reading-too-old', quantity: 'freeChlorine', since: fullTest.takenAt },
      { code: 'reading-too-old', quantity: 'pH', since: fullTest.takenAt },
    ]);
    expect(planWeek(scenarioOf({ now: '2026-07-19T19:00:00-04:00' })).projection).not.toBeNull();
  });

  it('is the newest of each: a quick check makes an old pH no younger', () => {
    const quick = { takenAt: '2026-07-18T19:00:00-04:00', freeChlorine: 2 };
    const plan = planWeek(scenarioOf({ reading: [fullTest, quick], now: '2026-07-20T08:00:00-04:00' }));
    expect(plan.needs).toEqual([{ code: 'reading-too-old', quantity: 'pH', since: fullTest.takenAt }]);
  });

  it.each(['freeChlorine', 'pH'] as const)('is %s, ever', (quantity) => {
    const scenario = scenarioOf({ reading: { [quantity]: undefined } });
    for (const plan of [planWeek(scenario), projectScenario(scenario)])
      expect(plan).toMatchObject({
        doses: [],
        projection: null,
        needs: [{ code: 'never-measured', quantity, since: null }],
      });
  });

  it('is stabilizer, before tablets: without it there are none, and the plan asks', () => {
    const plan = planWeek(scenarioOf({ reading: { cyanuricAcid: undefined } }));
    expect(tabletsIn(plan)).toBe(0);
    expect(plan.needs).toEqual([{ code: 'never-measured', quantity: 'cyanuricAcid', since: null }]);
    expect(codesIn(plan.reasons)).toContain('no-tablets-stabilizer-unknown');
    expect(plan.reasons).toContainEqual(
      expect.objectContaining({ code: 'water-values-assumed', quantity: 'cyanuricAcid' }),
    );
    expect(plan.doses.length).toBeGreaterThan(0);
  });

  it('is a new test when the week of the last one is over: nothing is planned, and nothing is said to be needless', () => {
    const plan = planWeek(scenarioOf({ now: '2026-07-14T08:00:00-04:00' }));
    expect(plan.doses).toEqual([]);
    expect(plan.needs).toEqual([{ code: 'reading-too-old', quantity: 'freeChlorine', since: fullTest.takenAt }]);
    expect(codesIn(plan.reasons)).not.toContain('nothing-fast-needed');
    expect(plan.checks.every(({ at }) => Date.parse(at) >= Date.parse('2026-07-14T08:00:00-04:00'))).toBe(true);
  });
});

describe('several readings', () => {
  const earlier = { ...fullTest, takenAt: '2026-07-02T19:00:00-04:00', freeChlorine: 4, pH: 7.4, cyanuricAcid: 42 };
  const quick = { takenAt: fullTest.takenAt, method: 'strip', freeChlorine: 2.2, pH: 7.6 };

  it('begin at the newest, move what it measured and keep the rest', () => {
    const { projection, takenAt } = projectScenario(scenarioOf({ reading: [earlier, quick] }));
    expect(Date.parse(takenAt)).toBe(Date.parse(quick.takenAt));
    const { median } = projection!;
    expect(median.freeChlorine[0]).toBeCloseTo(2.2, 9);
    expect(median.pH[0]).toBeCloseTo(7.6, 6);
    expect(median.cyanuricAcid[0]).toBeCloseTo(42, 1);
    expect(median.calciumHardness[0]).toBeGreaterThan(220);
    expect(median.calciumHardness[0]).toBeLessThan(222);
  });

  it('carry what was not measured again through the model', () => {
    const { projection } = projectScenario(scenarioOf({ reading: [earlier, { ...quick, freeChlorine: undefined }] }));
    expect(projection!.median.freeChlorine[0]).toBeLessThan(3.5);
    expect(projection!.median.freeChlorine[0]).toBeGreaterThan(1);
  });

  it('may come in any order', () => {
    expect(projectScenario(scenarioOf({ reading: [quick, earlier] }))).toEqual(
      projectScenario(scenarioOf({ reading: [earlier, quick] })),
    );
  });

  it('leave an old value less sure than a new one', () => {
    const width = (reading: Record<string, unknown>[]) => {
      const { p10, p90 } = projectScenario(scenarioOf({ reading })).projection!.cyanuricAcid;
      return p90[0]! - p10[0]!;
    };
    const old = { ...earlier, takenAt: '2026-06-05T19:00:00-04:00' };
    expect(width([old, quick])).toBeGreaterThan(width([earlier, quick]) + 5);
  });

  it('of water that cannot be are refused by the name of the field', () => {
    expect(() => planWeek(scenarioOf({ reading: { pH: 10, totalAlkalinity: 5 } }))).toThrow(
      expect.objectContaining({ code: 'water-out-of-range', field: 'reading.totalAlkalinity' }),
    );
    expect(() => planWeek(scenarioOf({ pool: { fillWater: { pH: 10, totalAlkalinity: 1 } } }))).toThrow(
      expect.objectContaining({ problems: [expect.objectContaining({ path: 'pool.fillWater.totalAlkalinity' })] }),
    );
  });
});
