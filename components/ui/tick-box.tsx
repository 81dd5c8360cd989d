'use client';

import { Check } from 'lucide-react';
import { useId } from 'react';
import { classNames } from './class-names';

export type TickBoxProps = {
  label: React.ReactNode;
  detail?: React.ReactNode;
  checked: boolean;
  onChange: (checked: boolean) => void;
  name?: string;
  /** Why it is off: the box is dashed and the words stand beside it. */
  offReason?: string | undefined;
  problem?: React.ReactNode;
  className?: string;
};

/** A box to tick, with a stroke that is drawn in 120 ms. */
export function TickBox({ label, detail, checked, onChange, name, offReason, problem, className }: TickBoxProps) {
  const wordsId = useId();
  const words = problem ?? offReason ?? detail;
  const off = offReason !== undefined;
  return (
    <label
      className={classNames(
        'group flex min-h-11 items-start gap-2.5 py-2.5',
        off ? 'cursor-not-allowed' : 'cursor-pointer',
        className,
      )}
    >
      <input
        type="checkbox"
        className="peer sr-only"
        name={name}
        checked={checked}
        aria-disabled={off || undefined}
        aria-invalid={problem === undefined ? undefined : true}
        aria-describedby={words === undefined ? undefined : wordsId}
        onChange={(event) => {
          if (!off) onChange(event.target.checked);
        }}
      />
      <span
        aria-hidden="true"
        className={classNames(
          'mt-px flex size-5 shrink-0 items-center justify-center rounded-tick border-[1.6px] bg-paper-lift text-on-ink',
          off ? 'border-dashed border-rule-2' : 'border-ink group-has-checked:bg-ink',
          problem !== undefined && 'border-terra-ink',
          'peer-focus-visible:outline-3 peer-focus-visible:outline-offset-2 peer-focus-visible:outline-teal',
        )}
      >
        <Check className="size-3.5 transition-[stroke-dashoffset] duration-tick [stroke-dasharray:24] [stroke-dashoffset:24] [stroke-width:3] group-has-checked:[stroke-dashoffset:0]" />
      </span>
      <span className="min-w-0 text-body">
        {label}
        {words === undefined ? null : (
          <span
            id={wordsId}
            className={classNames(
              'block text-small',
              problem === undefined ? 'text-ink-2' : 'font-emphasis text-terra-ink',
            )}
          >
            {words}
          </span>
        )}
      </span>
    </label>
  );
}
