import { describe, expect, it } from 'vitest';
import { addDose } from '@/lib/chemistry';
import { planWeek } from '@/lib/planner';
import { projectScenario } from '@/lib/planner/project-scenario';
import { fullTest, products, scenarioOf } from './scenarios';

/** Dry acid and calcium chloride whose label was not copied: shops sell 93 % and 77 %. */
const dryAcid = { id: 'dry', form: 'other', substance: 'sodium-bisulfate', stock: 9000 } as const;
const calcium = { id: 'calcium', form: 'other', substance: 'calcium-chloride', stock: 9000 } as const;

describe('a product whose strength nobody copied', () => {
  it('is planned as shops sell it: dry acid lowers pH by 0.4 at most', () => {
    const plan = planWeek(scenarioOf({ shelf: [products.gran, dryAcid], reading: { pH: 8.1 } }));
    const dose = plan.doses.find(({ substance }) => substance === 'sodium-bisulfate')!;
    expect(dose.effect!.change).toBeLessThan(-0.2);
    expect(dose.effect!.change).toBeGreaterThanOrEqual(-0.4);
  });

  it('is reckoned alike when it went in: 1 kg of calcium chloride is 770 g', () => {
    const given = [{ at: '2026-07-05T20:30:00-04:00', product: 'calcium', amount: 1000, unit: 'g' }];
    const scenario = scenarioOf({ shelf: [calcium], given });
    const [from, to] = [scenarioOf({ shelf: [calcium] }), scenario].map(
      (each) => projectScenario(each).projection!.median.calciumHardness[4]!,
    ) as [number, number];
    const own = addDose(fullTest, scenario.pool.volume, { substance: 'calcium-chloride', amount: 1000, strength: 77 });
    expect(to - from).toBeCloseTo(own.calciumHardness - fullTest.calciumHardness, 1);
  });
});
