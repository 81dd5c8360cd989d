import { describe, expect, it } from 'vitest';
import { planWeek } from '@/lib/planner';
import { type PurchaseSubstance, purchasesOf } from '@/lib/planner/purchases';
import { type Changes, products, scenarioOf, tabletsIn } from './scenarios';

const { tabs, gran, liq } = products;

function asked(changes: Changes) {
  const scenario = scenarioOf(changes);
  const plan = planWeek(scenario);
  const purchases = purchasesOf({ doses: plan.doses, shelf: scenario.shelf, needs: plan.needs });
  const of = (substance: PurchaseSubstance) => purchases.find((each) => each.substance === substance)!;
  return { plan, purchases, of };
}
const noTablets = { pool: { feeder: { kind: 'none' } } };

describe('what the shop says to buy', { timeout: 60_000 }, () => {
  it('is nothing where the shelf carries the week', () => {
    const { plan, purchases, of } = asked({});
    expect(purchases.filter(({ answer }) => answer === 'needed')).toEqual([]);
    // 227 g a tablet, by its label.
    expect(of('trichlor')).toMatchObject({
      answer: 'have-enough',
      tablets: tabletsIn(plan),
      needed: tabletsIn(plan) * 227,
      inStock: 5000,
      unit: 'g',
    });
    expect(of('sodium-bicarbonate')).toMatchObject({ answer: 'not-this-week', needed: 0, inStock: 0 });
  });

  it('is needed as soon as the granules on the shelf do not last the week', () => {
    const weak = { reading: { freeChlorine: 1 }, ...noTablets };
    const enough = asked({ ...weak, shelf: [gran] }).of('calcium-hypochlorite');
    expect(enough.answer).toBe('have-enough');
    const short = asked({ ...weak, shelf: [{ ...gran, stock: 450 }] }).of('calcium-hypochlorite');
    expect(short).toMatchObject({ answer: 'needed', inStock: 450 });
    expect(short.needed).toBeGreaterThan(450);
  });

  it('is needed where the shelf is empty, and liquid is counted in millilitres', () => {
    const { of } = asked({ shelf: [] });
    expect(of('sodium-hypochlorite')).toMatchObject({ answer: 'needed', inStock: 0, unit: 'mL' });
    expect(of('calcium-hypochlorite').answer).toBe('not-this-week');
  });

  it('draws nothing from granules that may not be planned', () => {
    const { plan, of } = asked({ shelf: [{ ...gran, labelWay: 'unknown' }] });
    expect(plan.doses.every(({ product }) => product === null)).toBe(true);
    expect(of('sodium-hypochlorite').answer).toBe('needed');
    expect(of('calcium-hypochlorite')).toMatchObject({ answer: 'not-this-week', inStock: 4000 });
  });

  it('turns from not this week to needed when alkalinity falls', () => {
    const shelf = [tabs, gran, liq];
    expect(asked({ shelf }).of('sodium-bicarbonate').answer).toBe('not-this-week');
    const low = asked({ shelf, reading: { totalAlkalinity: 40 } }).of('sodium-bicarbonate');
    expect(low).toMatchObject({ answer: 'needed', inStock: 0 });
    const held = { id: 'bicarb', form: 'granular', substance: 'sodium-bicarbonate', stock: low.needed };
    expect(asked({ shelf: [...shelf, held], reading: { totalAlkalinity: 40 } }).of('sodium-bicarbonate')).toMatchObject(
      {
        answer: 'have-enough',
        needed: low.needed,
      },
    );
  });

  it('asks for a test before stabilizer is bought where it was never measured', () => {
    const { of } = asked({ reading: { cyanuricAcid: undefined } });
    expect(of('cyanuric-acid')).toMatchObject({ answer: 'not-this-week', testFirst: true });
    expect(of('calcium-chloride').testFirst).toBe(false);
    expect(asked({}).of('cyanuric-acid').testFirst).toBe(false);
  });

  it('counts each product against its own doses', () => {
    const dose = planWeek(scenarioOf({ shelf: [gran], ...noTablets })).doses[0]!;
    const doses = [
      { ...dose, product: 'gran', amount: 300, toBuy: false },
      { ...dose, product: 'other-tub', amount: 300, toBuy: false },
    ];
    const shelf = [
      { ...gran, form: 'granular' as const, substance: 'calcium-hypochlorite' as const, stock: 1000 },
      { id: 'other-tub', form: 'granular' as const, substance: 'calcium-hypochlorite' as const, stock: 200 },
    ];
    const [found] = purchasesOf({ doses, shelf, needs: [] }).filter(({ answer }) => answer !== 'not-this-week');
    // 1200 g stand there for 600 g, but not in the tubs that they come from.
    expect(found).toMatchObject({ answer: 'needed', needed: 600, inStock: 1200 });
  });
});
