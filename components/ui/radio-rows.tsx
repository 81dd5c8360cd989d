'use client';

import { useId } from 'react';
import { classNames } from './class-names';
import { FieldWordsBelow } from './field';
import type { ChoiceProps } from './segments';

/** One of several, a row each with a second line and room for a drawing: the questions of the first run. */
export function RadioRows<Value extends string>(props: ChoiceProps<Value> & { hideLabel?: boolean }) {
  const { label, aside, hint, problem, choices, value, onChange, className, hideLabel } = props;
  const ownName = useId();
  const name = props.name ?? ownName;
  const wordsId = useId();
  const hasWords = (problem ?? hint) !== undefined;
  return (
    <fieldset className={classNames('min-w-0', className)} aria-describedby={hasWords ? wordsId : undefined}>
      <legend className={hideLabel ? 'sr-only' : 'mb-1.5 flex w-full items-baseline justify-between gap-3'}>
        <span className="text-label font-strong">{label}</span>
        {aside === undefined ? null : <span className="text-small font-text text-ink-2">{aside}</span>}
      </legend>
      <div>
        {choices.map((choice) => (
          <label
            key={choice.value}
            className={classNames(
              'group -mx-margin flex min-h-[66px] cursor-pointer items-center gap-4 border-t border-rule px-margin py-2.5 first:border-t-0',
              'has-checked:border-y-due has-checked:border-ink has-checked:bg-paper-lift [&:has(:checked)+&]:border-t-0',
              'has-focus-visible:outline-3 has-focus-visible:-outline-offset-3 has-focus-visible:outline-teal',
              'md:mx-0',
            )}
          >
            {choice.picture}
            <span className="min-w-0 flex-1">
              <span className="block text-field font-strong">{choice.label}</span>
              {choice.detail === undefined ? null : (
                <span className="block text-small text-ink-2">{choice.detail}</span>
              )}
            </span>
            <input
              type="radio"
              className="sr-only"
              name={name}
              value={choice.value}
              checked={value === choice.value}
              onChange={() => onChange(choice.value)}
            />
            <RadioRing />
          </label>
        ))}
      </div>
      {hasWords ? <FieldWordsBelow id={wordsId} hint={hint} problem={problem} /> : null}
    </fieldset>
  );
}

/** The ring of a radio; the dot shows when the row's input is chosen. */
function RadioRing() {
  return (
    <span
      aria-hidden="true"
      className="flex size-5.5 shrink-0 items-center justify-center rounded-full border-[1.6px] border-ink bg-paper-lift"
    >
      <span className="hidden size-2.5 rounded-full bg-ink group-has-checked:block" />
    </span>
  );
}
