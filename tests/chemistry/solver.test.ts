import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  addContents,
  addDoseToLedger,
  carbonDioxideExcess,
  chlorineSpecies,
  constantsOfLedger,
  contentsPerUnit,
  ledgerOf,
  newLedgerState,
  pHOfLedger,
  PERMITTED,
  solveLedger,
  speciesOfLedger,
  useUpInLedger as takeOut,
  type WaterAnalysis,
  WaterRangeError,
} from '@/lib/chemistry';
import { permittedWater, within } from './any-water';

function ledgerOrNone(water: WaterAnalysis) {
  try {
    return ledgerOf(water);
  } catch (error) {
    if (error instanceof WaterRangeError) return null;
    throw error;
  }
}

const water: WaterAnalysis = {
  freeChlorine: 3,
  pH: 7.5,
  totalAlkalinity: 80,
  calciumHardness: 220,
  cyanuricAcid: 50,
  temperature: 29,
  dissolvedSolids: 1000,
};

describe('the solver behind an integrator', () => {
  it('finds the same pH from any guess', () => {
    fc.assert(
      fc.property(permittedWater, within([-1, 15]), (any, guess) => {
        const ledger = ledgerOrNone(any);
        if (ledger === null) return;
        expect(Math.abs(pHOfLedger(ledger, guess) - any.pH)).toBeLessThanOrEqual(1e-6);
      }),
      { numRuns: 3000 },
    );
  });

  it('does not swing between the borate and the carbonate buffer for ever', () => {
    // Newton alone goes 7.5, 4.49, 7.45, 4.51, 7.44 ... here.
    const swinging: WaterAnalysis = {
      freeChlorine: 7.951176570500012,
      pH: 5.729711274559296,
      totalAlkalinity: 38.25229700657421,
      calciumHardness: 1295.2140624133558,
      cyanuricAcid: 57.105123677135225,
      temperature: 10.408783272346824,
      dissolvedSolids: 21030.05057528591,
      borate: 88.23399383063865,
    };
    expect(pHOfLedger(ledgerOf(swinging))).toBeCloseTo(swinging.pH, 7);
  });

  it('carries a state from step to step with the same answers as from scratch', () => {
    const ledger = ledgerOf(water);
    const constants = constantsOfLedger(ledger);
    const state = newLedgerState(water.pH);
    for (let step = 0; step < 200; step += 1) {
      takeOut(ledger, 0.01);
      ledger.inorganicCarbon -= 1e-6;
      solveLedger(ledger, constants, state);
      expect(state.pH).toBeCloseTo(pHOfLedger(ledger, 7.5, constants), 7);
      const fresh = speciesOfLedger(ledger, state.pH, constants);
      expect(state.hypochlorousAcid).toBeCloseTo(fresh.hypochlorousAcid, 7);
      expect(state.hypochlorite).toBeCloseTo(fresh.hypochlorite, 7);
      expect(state.cyanurateBound).toBeCloseTo(fresh.cyanurateBound, 6);
      const excess = carbonDioxideExcess(ledger, state.pH, constants);
      expect(state.carbonDioxideExcess / excess).toBeCloseTo(1, 5);
    }
    expect(ledger.freeChlorine).toBeCloseTo(1, 9);
  });

  it('agrees with the checked functions', () => {
    const ledger = ledgerOf(water);
    expect(speciesOfLedger(ledger, water.pH)).toEqual(chlorineSpecies(water));
    const dose = { substance: 'sodium-hypochlorite', amount: 400, strength: 10, alkali: 0.3 } as const;
    const once = addDoseToLedger(ledger, 40, dose);
    const slowly = { ...ledger };
    for (let part = 0; part < 100; part += 1) addContents(slowly, 40, contentsPerUnit(dose), 4);
    for (const field of Object.keys(once) as (keyof typeof once)[]) expect(slowly[field]).toBeCloseTo(once[field], 9);
    expect(ledger).toEqual(ledgerOf(water));
  });

  it('never uses up more than is there, nor makes its acid', () => {
    const ledger = ledgerOf({ ...water, freeChlorine: 0.5 });
    const { alkalinity } = ledger;
    takeOut(ledger, 2);
    expect(ledger.freeChlorine).toBe(0);
    expect(alkalinity - ledger.alkalinity).toBeCloseTo(0.5 / 70_906, 12);
  });

  it('permits what the forms permit', () => {
    // One source for the measured quantities: lib/schemas/measured-range. The two others are the model's own.
    expect(PERMITTED).toMatchObject({
      freeChlorine: [0, 200],
      pH: [5, 10.5],
      dissolvedSolids: [0, 30000],
      borate: [0, 100],
    });
  });
});
