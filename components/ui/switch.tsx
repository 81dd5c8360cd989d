'use client';

import { Switch as BaseSwitch } from '@base-ui/react/switch';
import { useId } from 'react';

export type SwitchProps = {
  label: React.ReactNode;
  detail?: React.ReactNode;
  checked: boolean;
  onChange: (checked: boolean) => void;
  name?: string;
};

/** On is solid ink, off is a dashed track: the difference does not hang on a colour. */
export function Switch({ label, detail, checked, onChange, name }: SwitchProps) {
  const id = useId();
  const detailId = useId();
  return (
    <div className="flex min-h-11 items-center justify-between gap-4">
      <span className="min-w-0">
        <label htmlFor={id} className="block cursor-pointer text-field font-strong">
          {label}
        </label>
        {detail === undefined ? null : (
          <span id={detailId} className="block text-small text-ink-2">
            {detail}
          </span>
        )}
      </span>
      <BaseSwitch.Root
        id={id}
        nativeButton
        render={<button type="button" />}
        checked={checked}
        onCheckedChange={onChange}
        aria-describedby={detail === undefined ? undefined : detailId}
        {...(name === undefined ? {} : { name })}
        className="relative flex h-7 w-12 shrink-0 cursor-pointer items-center rounded-full border-control border-dashed border-ink bg-transparent px-1 before:absolute before:-inset-2.5 data-checked:border-solid data-checked:bg-ink"
      >
        <BaseSwitch.Thumb className="size-4.5 rounded-full border-control border-ink bg-paper-lift transition-[translate] duration-tick data-checked:translate-x-[18px] data-checked:border-paper-lift" />
      </BaseSwitch.Root>
    </div>
  );
}
