import { middleOf } from '@/lib/projection/reading-error';
import type { Reading } from '@/lib/schemas/reading';
import { type FilterState, jointOrder, type UncertainQuantity, uncertainQuantities } from '@/lib/schemas/posterior';
import type { FeederLoad } from './feeder';
import { errorOf } from './measurement';
import { forEveryParameter, parameterPlaces, placeOf } from './state';

/** Taken where a quantity was not measured, with how far it may be off; assumptions. */
export const assumed: Record<UncertainQuantity, { value: number; sigma: number }> = {
  freeChlorine: { value: 1.5, sigma: 1.5 },
  pH: { value: 7.5, sigma: 0.3 },
  totalAlkalinity: { value: 90, sigma: 30 },
  calciumHardness: { value: 250, sigma: 80 },
  cyanuricAcid: { value: 35, sigma: 20 },
};

export const ASSUMED_COMBINED_CHLORINE = 0.1;
export const ASSUMED_TEMPERATURE = 26;
export const ASSUMED_DISSOLVED_SOLIDS = 1000;

/** Nothing learnt yet: every parameter at its prior. The water is put in by {@link waterAnew}. */
export function untaught(): FilterState {
  return {
    at: 0,
    mean: jointOrder.map(() => 0),
    covariance: jointOrder.map((_, row) => jointOrder.map((__, column) => (row === column ? 1 : 0))),
    combinedChlorine: ASSUMED_COMBINED_CHLORINE,
    temperature: ASSUMED_TEMPERATURE,
    dissolvedSolids: ASSUMED_DISSOLVED_SOLIDS,
    loads: [],
    doubts: {},
    readingsThatCounted: forEveryParameter(() => 0),
  };
}

/** The same parameters with the water of a reading, as sure as the test is; nothing else says anything about it. */
export function waterAnew(state: FilterState, at: number, reading: Reading, loads: FeederLoad[]): FilterState {
  const mean = [...state.mean];
  const covariance = jointOrder.map((_, row) =>
    jointOrder.map((__, column) =>
      parameterPlaces.includes(row) && parameterPlaces.includes(column) ? state.covariance[row]![column]! : 0,
    ),
  );
  for (const quantity of uncertainQuantities) {
    const value = reading[quantity];
    const place = placeOf[quantity];
    const middle = value === undefined ? assumed[quantity].value : middleOf(value);
    mean[place] = middle;
    covariance[place]![place] =
      (value === undefined ? assumed[quantity].sigma : errorOf(quantity, value, reading.method, middle)) ** 2;
  }
  return { ...state, at, mean, covariance, loads, doubts: {} };
}
