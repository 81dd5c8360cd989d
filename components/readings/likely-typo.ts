import { toInside, type UnitSystem } from '@/lib/units/unit';
import { type EntryQuantity, permitted, usual } from './quantities';

/** Where a slip of the finger is sought: what a kept pool shows on an ordinary day, narrower than what is asked about. */
const everyday: Record<EntryQuantity, readonly [low: number, high: number]> = {
  ...usual,
  totalChlorine: [0.2, 10],
  freeChlorine: [0.2, 8],
  pH: [6.8, 8.4],
  totalAlkalinity: [40, 240],
  calciumHardness: [50, 800],
  temperature: [8, 36],
};

/**
 * What was probably meant by a value that is impossible or rare: a decimal sign that was left out or put in the wrong
 * place, or degrees of the other scale. Undefined when nothing everyday comes of it. mg/L, pH, degrees C.
 */
export function likelyTypo(quantity: EntryQuantity, value: number, system: UnitSystem): number | undefined {
  const [low, high] = everyday[quantity];
  return candidates(quantity, value, system).find((candidate) => candidate >= low && candidate <= high);
}

function candidates(quantity: EntryQuantity, value: number, system: UnitSystem): number[] {
  if (quantity !== 'temperature') return [value / 10, value / 100, value * 10].map(tidied);
  // The figure as it was typed, read on the other scale.
  const typed = system === 'metric' ? value : (value * 9) / 5 + 32;
  return [toInside(typed, system === 'metric' ? 'degF' : 'degC'), value / 10].map(tidied);
}

/** Without the dust of binary fractions: 76 / 10 is 7.6. */
function tidied(value: number): number {
  return Math.round(value * 1000) / 1000;
}

export function isPermitted(quantity: EntryQuantity, value: number): boolean {
  const [low, high] = permitted(quantity);
  return value >= low && value <= high;
}

export function isUsual(quantity: EntryQuantity, value: number): boolean {
  const [low, high] = usual[quantity];
  return value >= low && value <= high;
}
