'use client';

import { useId } from 'react';
import { classNames } from './class-names';
import { FieldWordsBelow, type FieldWords } from './field';

export type Choice<Value extends string> = {
  value: Value;
  label: React.ReactNode;
  /** A short second line. */
  detail?: React.ReactNode;
  /** A drawing in front of the words. */
  picture?: React.ReactNode;
};

export type ChoiceProps<Value extends string> = FieldWords & {
  name?: string;
  choices: readonly Choice<Value>[];
  /** null while nothing has been chosen. */
  value: Value | null;
  onChange: (value: Value) => void;
  className?: string;
};

/** One of a few, side by side in a single frame. The radios are the browser's own, so arrow keys and forms work. */
export function Segments<Value extends string>(
  props: ChoiceProps<Value> & { size?: 'normal' | 'small'; hideLabel?: boolean },
) {
  const { label, aside, hint, problem, choices, value, onChange, className, size = 'normal', hideLabel } = props;
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
      <div
        className={classNames(
          'grid auto-cols-fr grid-flow-col rounded border-control bg-paper-lift',
          size === 'small' ? 'border-edge' : 'border-ink',
        )}
      >
        {choices.map((choice) => (
          <label
            key={choice.value}
            className={classNames(
              'flex cursor-pointer flex-col items-center justify-center gap-0.5 border-l border-rule-2 px-2 text-center first:rounded-l-[2px] first:border-l-0 last:rounded-r-[2px]',
              size === 'small' ? 'min-h-9 text-small pointer-coarse:min-h-11' : 'min-h-12 text-control md:min-h-11',
              'has-checked:bg-ink has-checked:font-strong has-checked:text-on-ink',
              'has-focus-visible:z-1 has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-teal',
            )}
          >
            <input
              type="radio"
              className="sr-only"
              name={name}
              value={choice.value}
              checked={value === choice.value}
              onChange={() => onChange(choice.value)}
            />
            {choice.picture}
            <span>{choice.label}</span>
            {choice.detail === undefined ? null : <span className="text-small font-text">{choice.detail}</span>}
          </label>
        ))}
      </div>
      {hasWords ? <FieldWordsBelow id={wordsId} hint={hint} problem={problem} /> : null}
    </fieldset>
  );
}
