'use client';

import { useTranslations } from 'next-intl';
import { Fragment, useId } from 'react';
import { classNames } from '@/components/ui/class-names';
import { formatNumber } from '@/lib/units/format';
import type { Interval } from '@/lib/schemas/reading';

export type StripPadProps = {
  label: string;
  /** At the right: what was read, or that it was not measured yet. */
  aside: string;
  steps: readonly number[];
  value: Interval | undefined;
  /** Undefined when the chosen step is tapped again: not measured. */
  onChange: (value: Interval | undefined) => void;
  locale: string;
};

/**
 * One pad: its printed steps as keys, and between two keys a seam for "in between". They are the browser's own radios, so
 * arrow keys walk from step to seam to step.
 */
export function StripPad({ label, aside, steps, value, onChange, locale }: StripPadProps) {
  const t = useTranslations('readings.strip');
  const name = useId();
  // pH is printed with its tenths also where they are 0.
  const decimals = steps.every((step) => Number.isInteger(step)) ? 0 : 1;
  const figure = (step: number) => formatNumber(step, { decimals, locale });
  const isRead = (low: number, high: number) => value?.low === low && value.high === high;
  const radio = (low: number, high: number) => (
    <input
      type="radio"
      name={name}
      className="sr-only"
      checked={isRead(low, high)}
      onChange={() => onChange({ low, high })}
      onClick={() => {
        if (isRead(low, high)) onChange(undefined);
      }}
      onKeyDown={(event) => {
        if (event.key === 'Delete' || event.key === 'Backspace') onChange(undefined);
      }}
    />
  );
  return (
    <fieldset className="min-w-0">
      <legend className="mb-1 flex w-full items-baseline justify-between gap-3">
        <span className="text-[16px] leading-5 font-strong">{label}</span>
        <span className="text-right text-small text-ink-2">{aside}</span>
      </legend>
      <div className="relative grid h-11 auto-cols-fr grid-flow-col rounded border-control border-edge bg-paper-lift">
        {steps.map((step, index) => {
          const previous = steps[index - 1];
          const inside = value !== undefined && step >= value.low && step <= value.high;
          const joined = inside && previous !== undefined && previous >= value.low;
          return (
            <Fragment key={step}>
              {previous === undefined ? null : (
                <label
                  className="absolute inset-y-0 w-6 -translate-x-1/2 cursor-pointer rounded-tick has-focus-visible:z-1 has-focus-visible:outline-3 has-focus-visible:outline-teal"
                  style={{ left: `${(index / steps.length) * 100}%` }}
                >
                  {radio(previous, step)}
                  <span className="sr-only">{t('between', { low: figure(previous), high: figure(step) })}</span>
                </label>
              )}
              <label
                className={classNames(
                  'flex cursor-pointer items-center justify-center border-l-control text-[16.5px] leading-none font-chart first:rounded-l-[2px] first:border-l-0 last:rounded-r-[2px]',
                  'has-focus-visible:z-1 has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-teal',
                  inside ? 'bg-ink font-strong text-on-ink' : '',
                  joined ? 'border-ink' : 'border-rule-2',
                )}
              >
                {radio(step, step)}
                {figure(step)}
              </label>
            </Fragment>
          );
        })}
      </div>
    </fieldset>
  );
}
