'use client';

import { Minus, Plus } from 'lucide-react';
import { classNames } from './class-names';
import { Field, type FieldWords } from './field';

export type StepperProps = FieldWords & {
  /** The text in the field, exactly as typed. */
  value: string;
  onChange: (text: string) => void;
  /** Steps up or down; the caller does the sums, because only the caller can read the text as a number. */
  onStep: (direction: 1 | -1) => void;
  unit?: React.ReactNode;
  /** Read out on the two buttons: "one more", "one less". */
  moreLabel: string;
  lessLabel: string;
  name?: string;
  /** `field` is the large one of a phone page, `margin` the 36 px one of a desk's margin column. */
  size?: 'field' | 'margin';
  className?: string;
};

/** A number between two keys. It is a real field: type, arrow up and down, or press. */
export function Stepper(props: StepperProps) {
  const { value, onChange, onStep, unit, moreLabel, lessLabel, name, size = 'field', className, ...words } = props;
  const key = classNames(
    'flex cursor-pointer items-center justify-center border-control border-ink bg-paper-lift',
    size === 'field' ? 'w-14.5' : 'w-9.5 pointer-coarse:w-11',
  );
  return (
    <Field {...words} {...(className === undefined ? {} : { className })}>
      {(control) => (
        <span className={classNames('flex', size === 'field' ? 'h-14' : 'h-9 pointer-coarse:h-11')}>
          <button
            type="button"
            className={classNames(key, 'rounded-l focus-visible:z-1')}
            aria-label={lessLabel}
            onClick={() => onStep(-1)}
          >
            <Minus aria-hidden="true" className="size-5" />
          </button>
          <span
            className={classNames(
              'flex min-w-0 flex-1 items-baseline justify-center gap-1.5 border-y-control bg-paper-lift px-2',
              control['aria-invalid'] ? 'border-terra-ink' : 'border-ink',
              'has-[input:focus-visible]:outline-3 has-[input:focus-visible]:outline-offset-1 has-[input:focus-visible]:outline-teal',
            )}
          >
            <input
              {...control}
              type="text"
              inputMode="decimal"
              autoComplete="off"
              name={name}
              value={value}
              onChange={(event) => onChange(event.target.value)}
              onKeyDown={(event) => {
                if (event.key !== 'ArrowUp' && event.key !== 'ArrowDown') return;
                event.preventDefault();
                onStep(event.key === 'ArrowUp' ? 1 : -1);
              }}
              className={classNames(
                'w-full min-w-0 self-stretch bg-transparent text-center outline-none',
                size === 'field' ? 'font-display text-dose' : 'text-field font-emphasis',
              )}
            />
            {unit === undefined ? null : <span className="shrink-0 text-small text-ink-2">{unit}</span>}
          </span>
          <button
            type="button"
            className={classNames(key, 'rounded-r focus-visible:z-1')}
            aria-label={moreLabel}
            onClick={() => onStep(1)}
          >
            <Plus aria-hidden="true" className="size-5" />
          </button>
        </span>
      )}
    </Field>
  );
}
