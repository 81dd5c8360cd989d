import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  addDose,
  amountToReach,
  analysisOf,
  chlorineSpecies,
  ledgerOf,
  PERMITTED,
  saturationIndex,
  type Target,
  useUpChlorine,
  type WaterAnalysis,
  WaterRangeError,
} from '@/lib/chemistry';
import { doseOf, permittedWater, poolWater, within } from './any-water';

// Source of the laws: design/engine.md, section 1; each follows from conservation of mass and charge.

const acidOf = (water: WaterAnalysis) => chlorineSpecies(water).hypochlorousAcid;

/** Skips what the model refuses: alkalinity too small for its pH. */
function accepted(water: WaterAnalysis): boolean {
  try {
    ledgerOf(water);
    return true;
  } catch (error) {
    if (error instanceof WaterRangeError && error.field === 'totalAlkalinity') return false;
    throw error;
  }
}

describe('laws of the ledger', () => {
  it('analysis of a ledger gives the water back', () => {
    fc.assert(
      fc.property(permittedWater.filter(accepted), (water) => {
        const back = analysisOf(ledgerOf(water));
        expect(Math.abs(back.pH - water.pH)).toBeLessThanOrEqual(1e-6);
        for (const field of Object.keys(PERMITTED) as (keyof WaterAnalysis)[]) {
          if (field === 'pH') continue;
          expect(Math.abs(back[field]! - water[field]!), field).toBeLessThanOrEqual(
            1e-300 + 1e-9 * Math.abs(water[field]!),
          );
        }
      }),
      { numRuns: 3000 },
    );
  });

  it('fills in the defaults: combined chlorine 0, dissolved solids 1000, borate 0', () => {
    const { freeChlorine, pH, totalAlkalinity, calciumHardness, cyanuricAcid, temperature } = {
      freeChlorine: 3,
      pH: 7.5,
      totalAlkalinity: 80,
      calciumHardness: 220,
      cyanuricAcid: 50,
      temperature: 29,
    };
    const short = { freeChlorine, pH, totalAlkalinity, calciumHardness, cyanuricAcid, temperature };
    const full = { ...short, combinedChlorine: 0, dissolvedSolids: 1000, borate: 0 };
    expect(ledgerOf(short)).toEqual(ledgerOf(full));
    expect(analysisOf(ledgerOf(short))).toMatchObject({ combinedChlorine: 0, dissolvedSolids: 1000, borate: 0 });
  });

  it('adds the same whatever the order of two doses', () => {
    const dose = doseOf().filter(({ substance }) => substance !== 'sodium-thiosulfate');
    fc.assert(
      fc.property(poolWater.filter(accepted), dose, dose, within([1, 100]), (water, a, b, volume) => {
        const first = addDose(addDose(water, volume, a), volume, b);
        const second = addDose(addDose(water, volume, b), volume, a);
        expect(Math.abs(first.pH - second.pH)).toBeLessThanOrEqual(1e-6);
        for (const field of ['freeChlorine', 'totalAlkalinity', 'calciumHardness', 'cyanuricAcid'] as const) {
          expect(first[field]).toBeCloseTo(second[field], 8);
        }
        expect(first.dissolvedSolids).toBeCloseTo(second.dissolvedSolids!, 7);
      }),
      { numRuns: 1500 },
    );
  });

  it('thiosulfate is the exception: it removes only what is there', () => {
    const water = { ...anyPool, freeChlorine: 1 };
    const remove = { substance: 'sodium-thiosulfate', amount: 10 } as const; // 10 g take 5.26 mg/L out of 1 m3
    const chlorinate = { substance: 'sodium-hypochlorite', amount: 32 } as const; // + 4 mg/L
    const removedFirst = addDose(addDose(water, 1, remove), 1, chlorinate);
    const removedLast = addDose(addDose(water, 1, chlorinate), 1, remove);
    expect(removedFirst.freeChlorine).toBeCloseTo(4, 9);
    expect(removedLast.freeChlorine).toBe(0);
    expect(addDose(water, 1, remove).totalAlkalinity).toBeCloseTo(water.totalAlkalinity - 50.0435 / 70.906, 6);
  });
});

const anyPool: WaterAnalysis = {
  freeChlorine: 3,
  pH: 7.5,
  totalAlkalinity: 100,
  calciumHardness: 200,
  cyanuricAcid: 40,
  temperature: 27,
};

describe('laws of hypochlorous acid', () => {
  it('more stabilizer never raises it at a fixed pH', () => {
    fc.assert(
      fc.property(permittedWater, within([0, 500]), (water, other) => {
        const low = { ...water, cyanuricAcid: Math.min(water.cyanuricAcid, other) };
        const high = { ...water, cyanuricAcid: Math.max(water.cyanuricAcid, other) };
        expect(acidOf(high)).toBeLessThanOrEqual(acidOf(low) * (1 + 1e-10));
      }),
      { numRuns: 3000 },
    );
  });

  it('adding chlorine without alkali never lowers it', () => {
    const chlorine = doseOf('trichlor', 'dichlor', 'calcium-hypochlorite', 'sodium-hypochlorite');
    fc.assert(
      fc.property(poolWater.filter(accepted), chlorine, within([0.5, 50]), (water, dose, volume) => {
        const after = addDose(water, volume, dose);
        expect(acidOf(after)).toBeGreaterThanOrEqual(acidOf(water) * (1 - 1e-9));
      }),
      { numRuns: 3000 },
    );
  });

  it('rises with free chlorine and falls with pH', () => {
    fc.assert(
      fc.property(permittedWater, within([0.01, 2]), (water, step) => {
        const more = { ...water, freeChlorine: Math.min(200, water.freeChlorine + step) };
        expect(acidOf(more)).toBeGreaterThanOrEqual(acidOf(water));
        const higher = { ...water, pH: Math.min(10.5, water.pH + step) };
        // True where OCl- or the cyanurate ions decide; in acid water with stabilizer the protonated forms bind chlorine
        // too, so only water without stabilizer falls everywhere.
        expect(acidOf({ ...higher, cyanuricAcid: 0 })).toBeLessThanOrEqual(acidOf({ ...water, cyanuricAcid: 0 }));
      }),
      { numRuns: 2000 },
    );
  });
});

describe('amountToReach inverts addDose', () => {
  const volume = within([2, 120]);
  const quantities: readonly Target['quantity'][] = [
    'freeChlorine',
    'pH',
    'totalAlkalinity',
    'calciumHardness',
    'cyanuricAcid',
  ];

  it.each(quantities)('%s: the amount found brings the water where the dose brought it', (quantity) => {
    fc.assert(
      fc.property(poolWater.filter(accepted), volume, doseOf(), (water, cubicMetres, perCubicMetre) => {
        const dose = { ...perCubicMetre, amount: perCubicMetre.amount * cubicMetres };
        const value = addDose(water, cubicMetres, dose)[quantity];
        if (value < PERMITTED[quantity][0] || value > PERMITTED[quantity][1]) return;
        const { amount: given, ...product } = dose;
        const amount = amountToReach(water, cubicMetres, product, { quantity, value });
        expect(amount).toBeLessThanOrEqual(given * (1 + 1e-6) + 1e-9);
        const reached = addDose(water, cubicMetres, { ...product, amount })[quantity];
        expect(Math.abs(reached - value)).toBeLessThanOrEqual(quantity === 'pH' ? 1e-7 : 1e-6);
      }),
      { numRuns: quantity === 'pH' ? 300 : 1000 },
    );
  });

  it('finds the very amount where the way is one-way: acid, soda, hypochlorite', () => {
    const oneWay = doseOf('hydrochloric-acid', 'sodium-bisulfate', 'sodium-carbonate', 'sodium-hypochlorite');
    fc.assert(
      fc.property(poolWater.filter(accepted), oneWay, (water, { amount, ...product }) => {
        const value = addDose(water, 1, { ...product, amount }).pH;
        if (value < 5 || value > 10.5) return;
        expect(amountToReach(water, 1, product, { quantity: 'pH', value }) / amount).toBeCloseTo(1, 5);
      }),
      { numRuns: 300 },
    );
  });
});

describe('chlorine used up', () => {
  it('leaves pH where it was for liquid, lowers it for trichlor', () => {
    const liquid = useUpChlorine(addDose(anyPool, 10, { substance: 'sodium-hypochlorite', amount: 80 }), 1);
    expect(liquid.pH).toBeCloseTo(anyPool.pH, 3);
    const tablet = useUpChlorine(addDose(anyPool, 10, { substance: 'trichlor', amount: 10.93 }), 1);
    expect(tablet.pH).toBeLessThan(anyPool.pH - 0.01);
    expect(tablet.totalAlkalinity).toBeCloseTo(anyPool.totalAlkalinity - 50.0435 / 70.906, 6);
  });

  it('makes the water more aggressive to plaster', () => {
    expect(saturationIndex(useUpChlorine(anyPool, 3))).toBeLessThan(saturationIndex(anyPool));
  });
});
