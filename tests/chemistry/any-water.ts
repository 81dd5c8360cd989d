import fc from 'fast-check';
import type { Dose, Substance, WaterAnalysis } from '@/lib/chemistry';
import { PERMITTED, SUBSTANCES } from '@/lib/chemistry';

/** Evenly spread, and shrinking to a round number: fc.double spreads over the exponents, most of it far below 1e-100. */
export const within = ([low, high]: readonly [number, number]): fc.Arbitrary<number> =>
  fc.integer({ min: 0, max: 1_000_000 }).map((share) => low + ((high - low) * share) / 1_000_000);

/** Mostly even, often an end of the range, sometimes absurdly near 0: that is where a solver breaks. */
const edgy = (range: readonly [number, number]) =>
  fc.oneof(
    { weight: 6, arbitrary: within(range) },
    { weight: 2, arbitrary: fc.constantFrom(range[0], range[1]) },
    { weight: 1, arbitrary: fc.double({ min: range[0], max: range[1], noNaN: true }) },
  );

/** Any water the model permits, alkalinity too small for its pH included. */
export const permittedWater: fc.Arbitrary<WaterAnalysis> = fc.record({
  freeChlorine: edgy(PERMITTED.freeChlorine),
  combinedChlorine: edgy(PERMITTED.combinedChlorine),
  pH: edgy(PERMITTED.pH),
  totalAlkalinity: edgy(PERMITTED.totalAlkalinity),
  calciumHardness: edgy(PERMITTED.calciumHardness),
  cyanuricAcid: edgy(PERMITTED.cyanuricAcid),
  temperature: edgy(PERMITTED.temperature),
  dissolvedSolids: edgy(PERMITTED.dissolvedSolids),
  borate: edgy(PERMITTED.borate),
});

/** Water as gardens have it: enough alkalinity for its pH. */
export const poolWater: fc.Arbitrary<WaterAnalysis> = fc.record({
  freeChlorine: within([0, 12]),
  combinedChlorine: within([0, 1]),
  pH: within([6.8, 8.2]),
  totalAlkalinity: within([60, 250]),
  calciumHardness: within([0, 800]),
  cyanuricAcid: within([0, 120]),
  temperature: within([4, 36]),
  dissolvedSolids: within([200, 4000]),
  borate: within([0, 20]),
});

const substances = Object.keys(SUBSTANCES) as Substance[];

/** A dose of about the size people give to a cubic metre. */
export const doseOf = (...only: Substance[]): fc.Arbitrary<Dose> =>
  fc
    .record({
      substance: fc.constantFrom(...(only.length > 0 ? only : substances)),
      amount: within([0.05, 25]),
      share: within([0.1, 1]),
    })
    .map(({ substance, amount, share }) => {
      const { defaultStrength } = SUBSTANCES[substance];
      return { substance, amount, strength: share * defaultStrength };
    });
