import type { UnitSystem } from '@/lib/units/unit';
import type { EntryQuantity } from './quantities';
import type { TestDraft } from './test-draft-schema';
import { textOf, typedValue } from './typed-value';

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
