'use client';

import { useTranslations } from 'next-intl';
import { TextField } from '@/components/ui/text-field';
import { DoubtAnswers } from './doubt-answers';
import type { Doubt } from './doubts';
import type { EntryQuantity } from './quantities';
import { useReadingSetting } from './reading-setting';
import { confirmationOf } from './test-draft';
import type { TestDraft } from './test-draft-schema';
import { textOf } from './typed-value';
import { useDoubtWords } from './use-doubt-words';
import { useValueWords } from './use-value-words';

export type ValueFieldsProps = {
  quantities: readonly EntryQuantity[];
  draft: TestDraft;
  change: (part: Partial<TestDraft>) => void;
  doubts: readonly Doubt[];
  /** The field in which somebody is typing. */
  onTyping: (quantity: EntryQuantity | null) => void;
  /** The page brings its own keys, so the keyboard of the device stays away. */
  ownKeys?: boolean;
};

/** Values as they are typed from a kit or a slip. Fields start empty; an empty one is not measured. */
export function ValueFields({ quantities, draft, change, doubts, onTyping, ownKeys = false }: ValueFieldsProps) {
  const t = useTranslations('readings');
  const words = useValueWords();
  const doubtWords = useDoubtWords();
  const { locale } = useReadingSetting();
  return (
    <div className="grid grid-cols-2 items-start gap-x-3 gap-y-3.5">
      {quantities.map((quantity) => {
        const text = draft.typed[quantity] ?? '';
        const doubt = doubts.find((one) => one.quantity === quantity);
        const wrong = doubt?.kind === 'outside' || doubt?.kind === 'unreadable';
        const write = (next: string) => change({ typed: { ...draft.typed, [quantity]: next } });
        return (
          <div key={quantity} className={doubt === undefined ? 'min-w-0' : 'col-span-2 min-w-0'}>
            <TextField
              id={fieldId(quantity)}
              name={quantity}
              label={words.name(quantity)}
              unit={words.unit(quantity)}
              value={text}
              autoComplete="off"
              inputMode={ownKeys ? 'none' : 'decimal'}
              enterKeyHint="next"
              {...(wrong ? { problem: doubtWords(doubt) } : text === '' ? { hint: t('notMeasured') } : {})}
              onChange={(event) => write(event.target.value)}
              onFocus={(event) => {
                onTyping(quantity);
                // Our own keys cover the foot of the page.
                if (ownKeys) event.target.scrollIntoView({ block: 'center' });
              }}
              onBlur={() => onTyping(null)}
              onKeyDown={(event) => {
                if (event.key !== 'Enter') return;
                event.preventDefault();
                focusAfter(quantities, quantity);
              }}
            />
            {doubt === undefined ? null : (
              <DoubtAnswers
                doubt={doubt}
                onLikely={(value) => write(textOf(value, quantity, draft.system, locale))}
                onConfirm={() => change({ confirmed: [...draft.confirmed, confirmationOf(quantity, text)] })}
                onClear={() => write('')}
              />
            )}
          </div>
        );
      })}
    </div>
  );
}

export function fieldId(quantity: EntryQuantity): string {
  return `value-${quantity}`;
}

/** On to the next field, or out of the last one. */
export function focusAfter(quantities: readonly EntryQuantity[], quantity: EntryQuantity): void {
  const next = quantities[quantities.indexOf(quantity) + 1];
  const field = document.getElementById(fieldId(next ?? quantity));
  if (next === undefined) field?.blur();
  else field?.focus();
}
