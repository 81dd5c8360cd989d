'use client';

import { isUsual } from './likely-typo';
import { NumberPad } from './number-pad';
import type { EntryQuantity } from './quantities';
import type { TestDraft } from './test-draft-schema';
import { typedValue } from './typed-value';
import { fieldId, focusAfter } from './value-fields';

/** The keys for the field that is being filled; a complete figure moves on by itself. */
export function KitPad({
  current,
  quantities,
  draft,
  change,
}: {
  current: EntryQuantity;
  quantities: readonly EntryQuantity[];
  draft: TestDraft;
  change: (part: Partial<TestDraft>) => void;
}) {
  const text = draft.typed[current] ?? '';
  const moveOn = (typed: string) => {
    const value = typed === '' ? undefined : typedValue(typed, current, draft.system);
    // A doubtful figure is left instead: its question has to be seen before the next one is filled.
    if (typed === '' || (value !== undefined && isUsual(current, value))) focusAfter(quantities, current);
    else document.getElementById(fieldId(current))?.blur();
  };
  const write = (next: string) => {
    change({ typed: { ...draft.typed, [current]: next } });
    if (isComplete(current, next)) moveOn(next);
    else document.getElementById(fieldId(current))?.focus();
  };
  return (
    <NumberPad
      onDigit={(character) => write(text + character)}
      onDelete={() => write(text.slice(0, -1))}
      onClear={() => write('')}
      onNext={() => moveOn(text)}
    />
  );
}

const withTenths: readonly EntryQuantity[] = ['freeChlorine', 'totalChlorine', 'pH'];

/** Whether a figure is as long as this test tells: tenths of chlorine and pH, three digits of the others. */
function isComplete(quantity: EntryQuantity, text: string): boolean {
  if (withTenths.includes(quantity)) return /[.,]\d$/.test(text);
  return text.length >= (quantity === 'temperature' ? 2 : 3);
}
