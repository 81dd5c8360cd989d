'use client';

import { ChevronDown } from 'lucide-react';
import { Field, type FieldWords } from './field';

export type PlainSelectProps<Value extends string> = FieldWords & {
  options: readonly { value: Value; label: string }[];
  value: Value;
  onChange: (value: Value) => void;
  className?: string;
};

/** One of many in the browser's own list: for pages that have to be light when they open. */
export function PlainSelect<Value extends string>(props: PlainSelectProps<Value>) {
  const { options, value, onChange, className, ...words } = props;
  return (
    <Field {...words} {...(className === undefined ? {} : { className })}>
      {(control) => (
        <span className="relative block">
          <select
            {...control}
            value={value}
            onChange={(event) => {
              const chosen = options.find((option) => option.value === event.target.value);
              if (chosen) onChange(chosen.value);
            }}
            className="h-12 w-full cursor-pointer appearance-none truncate rounded border-control border-ink bg-paper-lift pr-9 pl-3 text-field disabled:border-dashed md:h-9 md:pointer-coarse:h-11"
          >
            {options.map((option) => (
              <option key={option.value} value={option.value}>
                {option.label}
              </option>
            ))}
          </select>
          <ChevronDown
            aria-hidden="true"
            className="pointer-events-none absolute top-1/2 right-2.5 size-5 -translate-y-1/2"
          />
        </span>
      )}
    </Field>
  );
}
