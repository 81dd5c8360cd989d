'use client';

import { useTranslations } from 'next-intl';
import { NumberPad } from './number-pad';
import type { EntryQuantity } from './quantities';
import { useIsPhone } from '@/components/week-sheet/use-is-phone';
import { fieldId, focusAfter, ValueFields, type ValueFieldsProps } from './value-fields';

/** A drop kit: the figure of each titration, on a phone with keys of its own that move on by themselves. */
export function KitEntry(props: Omit<ValueFieldsProps, 'ownKeys'> & { typing: EntryQuantity | null }) {
  const { typing, quantities, draft, change } = props;
  const t = useTranslations('readings.kit');
  const phone = useIsPhone();
  const current = typing ?? quantities.find((quantity) => (draft.typed[quantity] ?? '') === '') ?? quantities[0];
  const write = (next: string) => {
    if (current === undefined) return;
    change({ typed: { ...draft.typed, [current]: next } });
    if (next !== '' && isComplete(current, next)) focusAfter(quantities, current);
    else document.getElementById(fieldId(current))?.focus();
  };
  const text = current === undefined ? '' : (draft.typed[current] ?? '');
  return (
    <>
      <p className="pb-2.5 text-small text-ink-2">{phone ? t('phoneNote') : t('note')}</p>
      <ValueFields {...props} ownKeys={phone === true} />
      {phone ? (
        <NumberPad
          onDigit={(character) => write(text + character)}
          onDelete={() => write(text.slice(0, -1))}
          onClear={() => write('')}
          onNext={() => {
            if (current !== undefined) focusAfter(quantities, current);
          }}
        />
      ) : null}
    </>
  );
}

const withTenths: readonly EntryQuantity[] = ['freeChlorine', 'totalChlorine', 'pH'];

/** Whether a figure is as long as this test tells: tenths of chlorine and pH, three digits of the others. */
function isComplete(quantity: EntryQuantity, text: string): boolean {
  if (withTenths.includes(quantity)) return /[.,]\d$/.test(text);
  return text.length >= (quantity === 'temperature' ? 2 : 3);
}
