import { describe, expect, it } from 'vitest';
import { planWeek } from '@/lib/planner';
import { codesIn, products, scenarioOf, tabletsIn } from './scenarios';

const { tabs, gran, liq } = products;
const idsIn = ({ doses }: { doses: readonly { product: string | null }[] }) =>
  new Set(doses.map(({ product }) => product));

describe('the shelf', () => {
  it('that is empty leaves a plan of what has to be bought', () => {
    const plan = planWeek(scenarioOf({ shelf: [] }));
    expect(plan.doses.length).toBeGreaterThan(0);
    for (const dose of plan.doses) expect(dose).toMatchObject({ product: null, toBuy: true });
    expect(codesIn(plan.reasons)).toContain('no-tablets-on-shelf');
  });

  it('that runs short is used up first; the rest is marked to buy', () => {
    const plan = planWeek(scenarioOf({ shelf: [{ ...gran, stock: 450 }], reading: { freeChlorine: 1 } }));
    const [first, ...rest] = plan.doses.filter(({ form }) => form === 'granular');
    expect(first).toMatchObject({ product: 'gran', toBuy: false });
    expect(rest.length).toBeGreaterThan(0);
    for (const dose of rest) expect(dose).toMatchObject({ product: 'gran', toBuy: true });
    expect(plan.cautions).toContainEqual({ code: 'stock-short', product: 'gran' });
  });

  it('is preferred to a walk to the shop, though the shop were cheaper', () => {
    const shelf = [
      { ...gran, stock: 50 },
      { ...liq, stock: 20000, pricePerLitre: 1.4 },
    ];
    expect(idsIn(planWeek(scenarioOf({ shelf, pool: { feeder: { kind: 'none' } } })))).toEqual(new Set(['liq']));
  });

  it('plans no granules whose label says nothing of pouring or dissolving', () => {
    const plan = planWeek(scenarioOf({ shelf: [{ ...gran, labelWay: 'unknown' }, liq] }));
    expect(idsIn(plan)).not.toContain('gran');
    expect(plan.cautions).toContainEqual({ code: 'label-way-unknown', product: 'gran' });
    expect(idsIn(planWeek(scenarioOf({ shelf: [{ ...gran, labelWay: 'feeder-only' }, liq] })))).not.toContain('gran');
  });

  it('plans poured granules on plaster and not on fibreglass', () => {
    const shelf = [{ ...gran, labelWay: 'broadcast' }];
    expect(idsIn(planWeek(scenarioOf({ shelf })))).toEqual(new Set(['gran']));
    const plan = planWeek(scenarioOf({ shelf, pool: { surface: 'fibreglass' } }));
    expect(idsIn(plan)).not.toContain('gran');
    expect(plan.cautions).toContainEqual(
      expect.objectContaining({ code: 'granules-not-for-surface', product: 'gran' }),
    );
    const dissolved = [{ ...gran, labelWay: 'dissolve' }];
    expect(idsIn(planWeek(scenarioOf({ shelf: dissolved, pool: { surface: 'fibreglass' } })))).toContain('gran');
  });

  it('plans no liquid past half its strength, and says when its age is a guess', () => {
    const old = planWeek(scenarioOf({ shelf: [{ ...liq, boughtOn: '2024-10-01' }] }));
    expect(idsIn(old)).toEqual(new Set([null]));
    expect(old.cautions).toContainEqual(expect.objectContaining({ code: 'liquid-past-half-strength', product: 'liq' }));
    const unknown = planWeek(scenarioOf({ shelf: [{ ...liq, boughtOn: undefined }] }));
    expect(idsIn(unknown)).toEqual(new Set(['liq']));
    expect(unknown.cautions).toContainEqual({ code: 'liquid-age-unknown', product: 'liq' });
  });

  it('gives liquid its strength of today: more of an old bottle, for the same rise', () => {
    const dose = (boughtOn: string) =>
      planWeek(scenarioOf({ shelf: [{ ...liq, boughtOn }], reading: { freeChlorine: 1 } })).doses[0]!;
    const [fresh, old] = [dose('2026-07-04'), dose('2026-03-20')];
    expect(old.rise / old.amount).toBeLessThan(0.85 * (fresh.rise / fresh.amount));
    expect(fresh.rise / fresh.amount).toBeCloseTo(0.125 / 75.7, 4);
  });

  it('keeps tablets out of another feeder, and out of none', () => {
    for (const feeder of [
      { kind: 'none' },
      { kind: 'inline', ingredient: 'calcium-hypochlorite', capacity: 8 },
      { kind: 'inline', capacity: 8 },
    ]) {
      const plan = planWeek(scenarioOf({ pool: { feeder } }));
      expect(tabletsIn(plan)).toBe(0);
      expect(codesIn(plan.reasons)).toContain('no-tablets-feeder');
    }
  });

  it('plans no tablets in acid water, and none over the band, not even where the household wants nothing else', () => {
    const acid = planWeek(scenarioOf({ reading: { pH: 7.1 } }));
    expect(tabletsIn(acid)).toBe(0);
    expect(codesIn(acid.reasons)).toContain('no-tablets-pH-low');
    const above = { reading: { cyanuricAcid: 64 } };
    expect(tabletsIn(planWeek(scenarioOf(above)))).toBe(0);
    const nothingElse = { ...above, shelf: [tabs], preferences: { avoid: ['granular', 'liquid'] } };
    expect(tabletsIn(planWeek(scenarioOf(nothingElse)))).toBe(0);
  });

  it.each([
    ['by id', ['gran']],
    ['by form', ['granular']],
    ['by substance', ['calcium-hypochlorite']],
  ])('leaves out what is avoided %s', (_, avoid) => {
    const cheap = { ...gran, pricePerKg: 0.5 };
    expect(idsIn(planWeek(scenarioOf({ shelf: [cheap, liq] })))).toContain('gran');
    expect(idsIn(planWeek(scenarioOf({ shelf: [cheap, liq], preferences: { avoid } })))).not.toContain('gran');
  });

  it('takes the first tub of tablets that is not empty', () => {
    const shelf = [{ ...tabs, stock: 100 }, { ...tabs, id: 'full' }, gran];
    expect(idsIn(planWeek(scenarioOf({ shelf })))).toContain('full');
  });

  it('takes the cheaper of two fast products where nothing else differs', () => {
    const feeder = { kind: 'none' };
    const at = (granules: number, litre: number) =>
      idsIn(
        planWeek(
          scenarioOf({
            pool: { feeder },
            shelf: [
              { ...gran, pricePerKg: granules },
              { ...liq, pricePerLitre: litre },
            ],
          }),
        ),
      );
    expect(at(2, 3)).toEqual(new Set(['gran']));
    expect(at(30, 0.5)).toEqual(new Set(['liq']));
  });
});
