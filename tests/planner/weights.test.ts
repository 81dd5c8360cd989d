import { afterEach, describe, expect, it } from 'vitest';
import { planWeek } from '@/lib/planner';
import { weights } from '@/lib/planner/weights';
import { products, scenarioOf, tabletsIn } from './scenarios';

const usual = { ...weights };
const table = weights as Record<string, number>;
const names = Object.keys(usual) as (keyof typeof usual)[];

/**
 * Plackett and Burman 1946, Biometrika 33:305: in twelve runs every factor stands high in half of them, and beside every
 * other factor equally often high and low. Our weights take its columns in turn.
 */
const firstRow = [1, 1, -1, 1, 1, 1, -1, -1, -1, 1, -1];
const runs = [
  ...firstRow.map((_, shift) => firstRow.map((_sign, column) => firstRow[(column + shift) % firstRow.length]!)),
  firstRow.map(() => -1),
];

afterEach(() => {
  Object.assign(table, usual);
});

const fillWater = { calciumHardness: 350, totalAlkalinity: 120, pH: 7.8 };
const hard = { pool: { fillWater }, reading: { calciumHardness: 420 } };
const formsOf = (changes: Parameters<typeof scenarioOf>[0]) =>
  planWeek(scenarioOf(changes)).doses.map(({ form }) => form);

/** Outcomes of common practice that must not hang on any weight. */
const outcomes: Record<string, () => void> = {
  'two to four tablets in 75.7 m3 in midsummer': () => {
    const count = tabletsIn(planWeek(scenarioOf()));
    expect(count).toBeGreaterThanOrEqual(2);
    expect(count).toBeLessThanOrEqual(4);
  },
  'one to three in 41 m3': () => {
    const count = tabletsIn(planWeek(scenarioOf({ pool: { volume: 41 } })));
    expect(count).toBeGreaterThanOrEqual(1);
    expect(count).toBeLessThanOrEqual(3);
  },
  'three to seven in 114 m3': () => {
    const count = tabletsIn(planWeek(scenarioOf({ pool: { volume: 114 } })));
    expect(count).toBeGreaterThanOrEqual(3);
    expect(count).toBeLessThanOrEqual(7);
  },
  'none at a stabilizer of 88': () => {
    expect(formsOf({ reading: { cyanuricAcid: 88 } })).not.toContain('tablet');
  },
  'tablets in the lead below the band of stabilizer': () => {
    const { doses } = planWeek(scenarioOf({ reading: { cyanuricAcid: 20 } }));
    const rises = (tablets: boolean) =>
      doses.filter(({ form }) => (form === 'tablet') === tablets).reduce((sum, { rise }) => sum + rise, 0);
    expect(rises(true)).toBeGreaterThan(rises(false));
  },
  'no calcium hypochlorite in hard water from hard fill water': () => {
    expect(formsOf(hard)).not.toContain('granular');
  },
  'granules or liquid for a quick raise': () => {
    const shelf = [products.tabs, products.gran, products.liq];
    expect(formsOf({ shelf, reading: { freeChlorine: 0.5 } })[0]).toMatch(/granular|liquid/);
  },
};

describe.each(runs.map((signs, run) => ({ run, signs })))('with all weights 30 % up or down, run $run', ({ signs }) => {
  it.each(Object.entries(outcomes))('%s', (_, outcome) => {
    names.forEach((name, index) => (table[name] = usual[name] * (1 + 0.3 * signs[index % signs.length]!)));
    outcome();
  });
});
