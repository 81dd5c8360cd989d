import { z } from 'zod';
import { readingKinds, readingMethods, waterLooks } from '@/lib/schemas/reading-kinds';
import type { UnitSystem } from '@/lib/units/unit';
import { entryQuantities, type EntryQuantity, padQuantities } from './quantities';
import { textOf, typedValue } from './typed-value';

const intervalSchema = z.object({ low: z.number(), high: z.number() });

/**
 * A test while it is written down. Its id is made when the form opens: pressing twice, reloading and sending again are all
 * the same test.
 */
export const testDraftSchema = z.object({
  id: z.uuid(),
  kind: z.enum(readingKinds),
  method: z.enum(readingMethods),
  /** Day and wall time when it was not just now. */
  time: z.object({ day: z.string(), time: z.string() }).nullable(),
  look: z.enum(waterLooks),
  /** Read from the strip: one step, or from one step to the next. */
  strip: z.partialRecord(z.enum(padQuantities), intervalSchema),
  /** Typed from a kit or a slip; the temperature of every method. */
  typed: z.partialRecord(z.enum(entryQuantities), z.string()),
  system: z.enum(['metric', 'us']),
  /** Rare values of which somebody said that they are right, each with its quantity. */
  confirmed: z.array(z.string()),
  zeroAnswer: z.enum(['flashed', 'stayed-pale', 'later']).nullable(),
  /** The reading of free chlorine that the answer is about. */
  zeroFor: z.string(),
  /** It stands on the server already and is being corrected. */
  correcting: z.boolean(),
});
export type TestDraft = z.infer<typeof testDraftSchema>;

/** Whether anything was written down that would be missed. */
export function isTouched({ strip, typed, look, time, correcting }: TestDraft): boolean {
  const somethingTyped = Object.values(typed).some((text) => text.trim() !== '');
  return correcting || somethingTyped || Object.keys(strip).length > 0 || look !== 'clear' || time !== null;
}

/** The typed temperature in the other scale, when the household has changed its measures meanwhile. */
export function testInSystem(draft: TestDraft, system: UnitSystem, locale: string): TestDraft {
  if (draft.system === system) return draft;
  const { temperature } = draft.typed;
  const celsius = temperature === undefined ? undefined : typedValue(temperature, 'temperature', draft.system);
  const typed =
    celsius === undefined
      ? draft.typed
      : { ...draft.typed, temperature: textOf(celsius, 'temperature', system, locale) };
  return { ...draft, typed, system };
}

export function confirmationOf(quantity: EntryQuantity, text: string): string {
  return `${quantity} ${text.trim()}`;
}
