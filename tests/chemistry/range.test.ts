import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  addDose,
  aerateToEquilibrium,
  amountToReach,
  analysisOf,
  chlorineSpecies,
  type Dose,
  langelierIndex,
  ledgerOf,
  PERMITTED,
  saturationIndex,
  storedHypochloriteStrength,
  SUBSTANCES,
  type Substance,
  type Target,
  UnreachableTargetError,
  useUpChlorine,
  type WaterAnalysis,
  WaterRangeError,
} from '@/lib/chemistry';
import { doseOf, permittedWater, within } from './any-water';

const good: WaterAnalysis = {
  freeChlorine: 3,
  combinedChlorine: 0.2,
  pH: 7.5,
  totalAlkalinity: 80,
  calciumHardness: 220,
  cyanuricAcid: 50,
  temperature: 29,
  dissolvedSolids: 1000,
  borate: 5,
};
const acid: Dose = { substance: 'hydrochloric-acid', amount: 100 };
const fields = Object.keys(PERMITTED) as (keyof WaterAnalysis)[];

const asksForWater: Record<string, (water: WaterAnalysis) => unknown> = {
  chlorineSpecies: (water) => chlorineSpecies(water),
  saturationIndex: (water) => saturationIndex(water),
  langelierIndex: (water) => langelierIndex(water),
  ledgerOf: (water) => ledgerOf(water),
  addDose: (water) => addDose(water, 50, acid),
  useUpChlorine: (water) => useUpChlorine(water, 0),
  aerateToEquilibrium: (water) => aerateToEquilibrium(water),
  amountToReach: (water) =>
    amountToReach(water, 50, { substance: 'hydrochloric-acid' }, { quantity: 'pH', value: 7.2 }),
};

function refusal(run: () => unknown): unknown {
  try {
    return run();
  } catch (error) {
    return error;
  }
}

describe.each(Object.keys(asksForWater))('%s', (name) => {
  const ask = asksForWater[name]!;

  it.each(fields)('names %s, its value and its range when it is outside', (field) => {
    const [low, high] = name === 'chlorineSpecies' && field === 'pH' ? [0, 14] : PERMITTED[field];
    for (const value of [low - 0.01, high + 0.01, NaN, Infinity, -Infinity]) {
      const error = refusal(() => ask({ ...good, [field]: value }));
      expect(error, String(value)).toBeInstanceOf(WaterRangeError);
      expect(error).toMatchObject({ field, value, low, high });
    }
  });

  it('gives a finite answer or a WaterRangeError over the whole permitted range', () => {
    fc.assert(
      fc.property(permittedWater, (water) => {
        const answer = refusal(() => ask(water));
        if (answer instanceof WaterRangeError || answer instanceof UnreachableTargetError) return;
        expect(answer).not.toBeInstanceOf(Error);
        const values = typeof answer === 'number' ? [answer] : Object.values(answer as Record<string, number>);
        for (const value of values) expect(Number.isFinite(value)).toBe(true);
      }),
      { numRuns: name === 'amountToReach' ? 300 : 2000 },
    );
  });
});

describe('the edges', () => {
  it('chlorine by form from pH 0 to 14, no stabilizer to 500, no chlorine to 200', () => {
    fc.assert(
      fc.property(permittedWater, within([0, 14]), (water, pH) => {
        const species = chlorineSpecies({ ...water, pH });
        const { hypochlorousAcid, hypochlorite, cyanurateBound } = species;
        for (const value of Object.values(species)) expect(value).toBeGreaterThanOrEqual(0);
        const sum = hypochlorousAcid + hypochlorite + cyanurateBound;
        expect(Math.abs(sum - water.freeChlorine)).toBeLessThanOrEqual(1e-9 * (1 + water.freeChlorine));
        if (water.cyanuricAcid === 0) expect(cyanurateBound).toBeLessThanOrEqual(1e-12 * (1 + water.freeChlorine));
      }),
      { numRuns: 5000 },
    );
  });

  it('alkalinity too small for its pH names the alkalinity and what it would need', () => {
    const error = refusal(() => ledgerOf({ ...good, totalAlkalinity: 10 }));
    expect(error).toBeInstanceOf(WaterRangeError);
    const { field, low } = error as WaterRangeError;
    expect(field).toBe('totalAlkalinity');
    expect(() => ledgerOf({ ...good, totalAlkalinity: low + 0.001 })).not.toThrow();
    expect(() => saturationIndex({ ...good, totalAlkalinity: 10 })).toThrow(WaterRangeError);
    expect(chlorineSpecies({ ...good, totalAlkalinity: 10 }).hypochlorousAcid).toBeGreaterThan(0);
  });

  it('water without calcium or alkalinity has a finite index, far below any real one', () => {
    expect(saturationIndex({ ...good, calciumHardness: 0 })).toBe(-20);
    expect(langelierIndex({ ...good, calciumHardness: 0 })).toBe(-20);
    expect(langelierIndex({ ...good, totalAlkalinity: 0, dissolvedSolids: 0 })).toBe(-20);
  });

  it('a wild dose leaves a finite water or is refused', () => {
    const wild = fc.tuple(doseOf(), within([1, 1e6])).map(([dose, times]) => ({
      ...dose,
      amount: dose.amount * times,
    }));
    fc.assert(
      fc.property(permittedWater, wild, (water, dose) => {
        const answer = refusal(() => addDose(water, 1, dose));
        if (answer instanceof WaterRangeError) return;
        for (const value of Object.values(answer as WaterAnalysis)) expect(Number.isFinite(value)).toBe(true);
      }),
      { numRuns: 2000 },
    );
  });

  it('a ledger that no water can have is refused', () => {
    const ledger = ledgerOf(good);
    for (const field of Object.keys(ledger) as (keyof typeof ledger)[]) {
      expect(() => analysisOf({ ...ledger, [field]: NaN }), field).toThrow(WaterRangeError);
    }
    expect(() => analysisOf({ ...ledger, inorganicCarbon: -1e-3 })).toThrow(WaterRangeError);
    expect(() => analysisOf({ ...ledger, alkalinity: -5 })).toThrow(WaterRangeError);
  });
});

describe('doses', () => {
  it.each([-1, NaN, Infinity])('amount %s is refused', (amount) => {
    expect(refusal(() => addDose(good, 50, { ...acid, amount }))).toMatchObject({ field: 'amount', value: amount });
  });

  it.each([0, -5, NaN, Infinity])('volume %s is refused', (volume) => {
    expect(refusal(() => addDose(good, volume, acid))).toMatchObject({ field: 'volume' });
    const target: Target = { quantity: 'pH', value: 7.2 };
    expect(refusal(() => amountToReach(good, volume, acid, target))).toMatchObject({ field: 'volume' });
  });

  it.each(Object.keys(SUBSTANCES) as Substance[])('%s: strength up to pure, above 0', (substance) => {
    const { pureStrength, defaultStrength } = SUBSTANCES[substance];
    for (const strength of [0, -1, pureStrength + 0.01, NaN, Infinity]) {
      expect(refusal(() => addDose(good, 50, { substance, amount: 1, strength }))).toMatchObject({ field: 'strength' });
    }
    expect(addDose(good, 50, { substance, amount: 1 })).toEqual(
      addDose(good, 50, { substance, amount: 1, strength: defaultStrength }),
    );
    expect(() => addDose(good, 50, { substance, amount: 1, strength: pureStrength })).not.toThrow();
  });

  it('alkali only where a product has some', () => {
    expect(refusal(() => addDose(good, 50, { substance: 'trichlor', amount: 1, alkali: 1 }))).toMatchObject({
      field: 'alkali',
      high: 0,
    });
    expect(refusal(() => addDose(good, 50, { substance: 'sodium-hypochlorite', amount: 1, alkali: -1 }))).toMatchObject(
      {
        field: 'alkali',
      },
    );
  });

  it('a dose of nothing changes nothing', () => {
    const after = addDose(good, 50, { ...acid, amount: 0 });
    for (const field of fields) expect(after[field]).toBeCloseTo(good[field]!, 8);
  });

  it('no more chlorine is used up than there is', () => {
    expect(refusal(() => useUpChlorine(good, 3.1))).toMatchObject({ field: 'amount', value: 3.1, high: 3 });
    expect(refusal(() => useUpChlorine(good, -0.1))).toMatchObject({ field: 'amount' });
    expect(refusal(() => useUpChlorine(good, NaN))).toMatchObject({ field: 'amount' });
    expect(useUpChlorine(good, 3).freeChlorine).toBe(0);
  });
});

describe('targets', () => {
  const reach = (substance: Substance, quantity: Target['quantity'], value: number) => () =>
    amountToReach(good, 50, { substance }, { quantity, value });

  it('already there is 0', () => {
    expect(reach('hydrochloric-acid', 'pH', 7.5)()).toBe(0);
    expect(reach('trichlor', 'cyanuricAcid', 50)()).toBe(0);
    expect(reach('cyanuric-acid', 'freeChlorine', 3)()).toBe(0);
  });

  it.each<[Substance, Target['quantity'], number]>([
    ['hydrochloric-acid', 'pH', 7.8],
    ['sodium-carbonate', 'pH', 7.2],
    // Bicarbonate pushes towards about pH 8.2 and no further.
    ['sodium-bicarbonate', 'pH', 9.5],
    ['hydrochloric-acid', 'totalAlkalinity', 100],
    ['calcium-chloride', 'calciumHardness', 200],
    ['calcium-chloride', 'cyanuricAcid', 60],
    ['trichlor', 'freeChlorine', 2],
    ['sodium-thiosulfate', 'freeChlorine', 4],
    // Only as much acid as there is chlorine to remove.
    ['sodium-thiosulfate', 'totalAlkalinity', 70],
  ])('%s cannot bring %s to %d', (substance, quantity, value) => {
    expect(reach(substance, quantity, value)).toThrow(UnreachableTargetError);
  });

  it.each([4.9, 10.6, NaN])('pH %s is no target', (value) => {
    expect(refusal(reach('hydrochloric-acid', 'pH', value))).toMatchObject({ field: 'pH', low: 5, high: 10.5 });
  });

  it('thiosulfate takes all chlorine out with its last gram', () => {
    const amount = reach('sodium-thiosulfate', 'freeChlorine', 0)();
    expect(amount).toBeCloseTo(1.9 * 3 * 50, 9);
  });
});

describe('stored liquid', () => {
  it.each([
    ['strength', { strength: 0, temperature: 25, days: 10 }],
    ['strength', { strength: 96, temperature: 25, days: 10 }],
    ['temperature', { strength: 12.5, temperature: 61, days: 10 }],
    ['days', { strength: 12.5, temperature: 25, days: -1 }],
    ['days', { strength: 12.5, temperature: 25, days: NaN }],
  ])('refuses a wrong %s', (field, stored) => {
    expect(refusal(() => storedHypochloriteStrength(stored))).toMatchObject({ field });
  });

  it('only ever weakens, faster when strong or warm', () => {
    fc.assert(
      fc.property(within([1, 20]), within([-2, 55]), within([1, 700]), (strength, temperature, days) => {
        const left = (change: object) => storedHypochloriteStrength({ strength, temperature, days, ...change });
        expect(left({})).toBeLessThan(strength);
        expect(left({})).toBeGreaterThan(0);
        expect(left({ temperature: temperature + 5 })).toBeLessThan(left({}));
        expect(left({ days: days + 1 })).toBeLessThan(left({}));
        expect(left({ strength: strength + 1 }) / (strength + 1)).toBeLessThan(left({}) / strength);
        expect(left({ days: 0 })).toBe(strength);
      }),
    );
  });
});
