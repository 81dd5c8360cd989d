'use client';

import { Select as BaseSelect } from '@base-ui/react/select';
import { Check, ChevronDown } from 'lucide-react';
import { classNames } from './class-names';
import { Field, type FieldWords } from './field';

export type SelectProps<Value extends string> = FieldWords & {
  options: readonly { value: Value; label: string }[];
  /** null while nothing has been chosen. */
  value: Value | null;
  onChange: (value: Value) => void;
  /** What stands in the field while nothing has been chosen. */
  placeholder: string;
  name?: string;
  className?: string;
};

/** One of many, in a list that opens. For two to four choices `Segments` shows all at once. */
export function Select<Value extends string>(props: SelectProps<Value>) {
  const { options, value, onChange, placeholder, name, className, ...words } = props;
  return (
    <Field {...words} {...(className === undefined ? {} : { className })}>
      {(control) => (
        <BaseSelect.Root<Value>
          items={options}
          value={value}
          onValueChange={(next) => {
            if (next !== null) onChange(next);
          }}
          id={control.id}
          {...(name === undefined ? {} : { name })}
        >
          <BaseSelect.Trigger
            aria-describedby={control['aria-describedby']}
            aria-invalid={control['aria-invalid']}
            className={classNames(
              'flex min-h-12 w-full cursor-pointer items-center justify-between gap-2.5 rounded border-control bg-paper-lift px-3.5 text-left text-field md:min-h-11 md:px-3',
              control['aria-invalid'] ? 'border-terra-ink' : 'border-ink',
            )}
          >
            <BaseSelect.Value placeholder={placeholder} className="min-w-0 truncate data-placeholder:text-ink-2" />
            <BaseSelect.Icon>
              <ChevronDown aria-hidden="true" className="size-5" />
            </BaseSelect.Icon>
          </BaseSelect.Trigger>
          <BaseSelect.Portal>
            <BaseSelect.Positioner className="z-30 outline-none" sideOffset={4} alignItemWithTrigger={false}>
              <BaseSelect.Popup className="min-w-[var(--anchor-width)] rounded border-control border-ink bg-paper-lift text-ink outline-none">
                <BaseSelect.List className="max-h-[var(--available-height)] overflow-y-auto py-1">
                  {options.map((option) => (
                    <BaseSelect.Item
                      key={option.value}
                      value={option.value}
                      className="flex min-h-11 cursor-pointer items-center justify-between gap-3 px-3.5 text-field outline-none select-none data-highlighted:bg-ink data-highlighted:text-on-ink md:px-3"
                    >
                      <BaseSelect.ItemText>{option.label}</BaseSelect.ItemText>
                      <BaseSelect.ItemIndicator>
                        <Check aria-hidden="true" className="size-4.5" />
                      </BaseSelect.ItemIndicator>
                    </BaseSelect.Item>
                  ))}
                </BaseSelect.List>
              </BaseSelect.Popup>
            </BaseSelect.Positioner>
          </BaseSelect.Portal>
        </BaseSelect.Root>
      )}
    </Field>
  );
}
