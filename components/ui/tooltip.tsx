'use client';

import { Tooltip as BaseTooltip } from '@base-ui/react/tooltip';

/**
 * A word on hover or focus. It repeats or explains what the trigger's own name already says: a touch screen has no hover,
 * so nothing may stand only here.
 */
export function Tooltip({ words, children }: { words: React.ReactNode; children: React.ReactElement }) {
  return (
    <BaseTooltip.Root>
      <BaseTooltip.Trigger render={children} />
      <BaseTooltip.Portal>
        <BaseTooltip.Positioner sideOffset={6} className="z-30">
          <BaseTooltip.Popup className="max-w-64 rounded bg-ink px-2.5 py-1.5 text-small text-on-ink">
            {words}
          </BaseTooltip.Popup>
        </BaseTooltip.Positioner>
      </BaseTooltip.Portal>
    </BaseTooltip.Root>
  );
}
