import type { Interval, Measured } from '@/lib/schemas/reading';
import type { Bottle } from './bottle';
import { type EntryQuantity, quickQuantities, typedQuantities } from './quantities';
import type { TestDraft } from './test-draft-schema';
import { typedValue } from './typed-value';

export type Value = number | Interval;
export type Entered = Partial<Record<EntryQuantity, Value>>;

/** What this test asks for now, in the order in which it is gone through. */
export function asked({ kind, method }: Pick<TestDraft, 'kind' | 'method'>, bottle: Bottle): EntryQuantity[] {
  const all: readonly EntryQuantity[] =
    method === 'strip' ? [...bottle.map(({ quantity }) => quantity), 'temperature'] : typedQuantities;
  return kind === 'quick' ? all.filter((quantity) => quickQuantities.includes(quantity)) : [...all];
}

/** Everything that was read, as values; what cannot be read as a number is left out and asked about. */
export function enteredOf(draft: TestDraft, bottle: Bottle): Entered {
  const entered: Entered = {};
  for (const quantity of asked(draft, bottle)) {
    const value = valueOf(draft, quantity);
    if (value !== undefined) entered[quantity] = value;
  }
  return entered;
}

function valueOf(draft: TestDraft, quantity: EntryQuantity): Value | undefined {
  if (draft.method === 'strip' && quantity !== 'temperature') {
    const read = draft.strip[quantity];
    return read && (read.low === read.high ? read.low : read);
  }
  const text = draft.typed[quantity] ?? '';
  return text.trim() === '' ? undefined : typedValue(text, quantity, draft.system);
}

/** The quantities of a reading: total chlorine becomes used-up chlorine, the difference to the free. */
export function measuredOf(entered: Entered): Measured {
  const { totalChlorine, ...measured } = entered;
  const combined = combinedOf(totalChlorine, entered.freeChlorine);
  return combined === undefined ? measured : { ...measured, combinedChlorine: combined };
}

/**
 * Used-up (combined) chlorine: total less free, never below 0. Where both were read alike it is none, also between the same
 * two steps of a strip: the pads are read side by side, so they lie at the same place between them.
 */
export function combinedOf(total: Value | undefined, free: Value | undefined): Value | undefined {
  if (total === undefined || free === undefined) return undefined;
  const [all, unused] = [asInterval(total), asInterval(free)];
  if (all.low === unused.low && all.high === unused.high) return 0;
  const low = tidied(Math.max(0, all.low - unused.high));
  const high = tidied(Math.max(0, all.high - unused.low));
  return low === high ? low : { low, high };
}

export function asInterval(value: Value): Interval {
  return typeof value === 'number' ? { low: value, high: value } : value;
}

/** One number for a value: the middle of what was read between two steps. */
export function middleOf(value: Value): number {
  const { low, high } = asInterval(value);
  return (low + high) / 2;
}

/** Without the dust of binary fractions: 3.2 - 3.0 is 0.2. */
function tidied(value: number): number {
  return Math.round(value * 1000) / 1000;
}
