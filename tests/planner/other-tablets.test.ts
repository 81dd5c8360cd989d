import { describe, expect, it } from 'vitest';
import { planWeek, projectScenario } from '@/lib/planner';
import { scenarioOf, tabletsIn } from './scenarios';

const feederOf = (ingredient: string, loaded = 600) => ({ kind: 'inline', ingredient, capacity: 8, loaded });
const endOf = (ingredient: string, loaded?: number) =>
  projectScenario(scenarioOf({ pool: { feeder: feederOf(ingredient, loaded) }, doses: [] })).endOfWeek!;

describe('a feeder with other tablets in it', () => {
  const none = endOf('trichlor', 0);

  it('of trichlor raises stabilizer', () => {
    expect(endOf('trichlor').cyanuricAcid - none.cyanuricAcid).toBeGreaterThan(3);
  });

  it('of calcium hypochlorite raises hardness, and neither stabilizer nor acid', () => {
    const end = endOf('calcium-hypochlorite');
    expect(end.cyanuricAcid).toBeCloseTo(none.cyanuricAcid, 6);
    expect(end.calciumHardness! - none.calciumHardness!).toBeGreaterThan(2);
    expect(end.pH).toBeGreaterThan(endOf('trichlor').pH + 0.1);
    expect(end.freeChlorine).toBeGreaterThan(none.freeChlorine + 0.5);
  });

  it('of a blend brings nothing that could be reckoned with', () => {
    expect(endOf('other')).toEqual(none);
  });

  it('plans no tablets into it, and goes by what it brings', () => {
    const plan = planWeek(scenarioOf({ pool: { feeder: feederOf('calcium-hypochlorite') } }));
    expect(tabletsIn(plan)).toBe(0);
    expect(plan.endOfWeek!.cyanuricAcid).toBeLessThan(51);
  });

  it('tablets of acid are refused with their path', () => {
    const shelf = [{ id: 'acid', form: 'tablet', substance: 'sodium-bisulfate', stock: 1000 }];
    const given = [{ at: '2026-07-05T18:00:00-04:00', product: 'acid', amount: 1, unit: 'tablet' }];
    expect(() => planWeek(scenarioOf({ shelf, given }))).toThrow(
      expect.objectContaining({ code: 'invalid-input' }) as Error,
    );
  });
});
