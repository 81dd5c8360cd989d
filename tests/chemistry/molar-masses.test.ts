import { expect, it } from 'vitest';
import { MOLAR_MASS } from '@/lib/chemistry/molar-masses';

/** Abridged standard atomic weights, IUPAC Commission on Isotopic Abundances and Atomic Weights 2021. */
const weight = { H: 1.008, B: 10.81, C: 12.011, N: 14.007, O: 15.999, Na: 22.99, S: 32.06, Cl: 35.45, Ca: 40.078 };

type Element = keyof typeof weight;

/** Atoms of each substance. */
const formulas: Record<keyof typeof MOLAR_MASS, Partial<Record<Element, number>>> = {
  chlorine: { Cl: 2 },
  calciumCarbonate: { Ca: 1, C: 1, O: 3 },
  cyanuricAcid: { C: 3, H: 3, N: 3, O: 3 },
  boron: { B: 1 },
  carbonDioxide: { C: 1, O: 2 },
  nitrogen: { N: 1 },
  hydrogenChloride: { H: 1, Cl: 1 },
  sodiumBisulfate: { Na: 1, H: 1, S: 1, O: 4 },
  sodiumBicarbonate: { Na: 1, H: 1, C: 1, O: 3 },
  sodiumCarbonate: { Na: 2, C: 1, O: 3 },
  sodiumHypochlorite: { Na: 1, O: 1, Cl: 1 },
  sodiumChloride: { Na: 1, Cl: 1 },
  sodiumHydroxide: { Na: 1, O: 1, H: 1 },
  calciumHypochlorite: { Ca: 1, O: 2, Cl: 2 },
  calciumHydroxide: { Ca: 1, O: 2, H: 2 },
  calciumChloride: { Ca: 1, Cl: 2 },
  trichlor: { C: 3, N: 3, O: 3, Cl: 3 },
  dichlorDihydrate: { C: 3, N: 3, O: 5, H: 4, Cl: 2, Na: 1 },
};

it.each(Object.entries(formulas) as [keyof typeof MOLAR_MASS, Partial<Record<Element, number>>][])(
  '%s weighs what its atoms weigh',
  (name, atoms) => {
    const sum = (Object.entries(atoms) as [Element, number][]).reduce(
      (mass, [element, n]) => mass + n * weight[element],
      0,
    );
    // Two decimals of the tables the masses were taken from, and the rounding of the weights.
    expect(MOLAR_MASS[name]).toBeCloseTo(sum, 1);
    expect(Math.abs(MOLAR_MASS[name] / sum - 1)).toBeLessThan(2e-4);
  },
);
