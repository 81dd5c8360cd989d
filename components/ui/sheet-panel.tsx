'use client';

import { Dialog as BaseDialog } from '@base-ui/react/dialog';
import { X } from 'lucide-react';
import { classNames } from './class-names';
import { scrim } from './dialog-panel';

export type SheetProps = {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  title: React.ReactNode;
  closeLabel: string;
  children: React.ReactNode;
  /** Leaves this much room below, for a bar that must stay in reach. */
  aboveTabs?: boolean;
};

/** The sheet itself; `Sheet` fetches it. */
export function SheetPanel({ open, onOpenChange, title, closeLabel, children, aboveTabs = false }: SheetProps) {
  const floor = aboveTabs ? 'bottom-tabs' : 'bottom-0';
  return (
    <BaseDialog.Root open={open} onOpenChange={onOpenChange} modal={aboveTabs ? 'trap-focus' : true}>
      <BaseDialog.Portal>
        <BaseDialog.Backdrop className={classNames(scrim, aboveTabs && 'bottom-tabs')} />
        <BaseDialog.Popup
          className={classNames(
            'fixed inset-x-0 z-20 max-h-[calc(100dvh-8rem)] overflow-y-auto border-t-stop border-ink bg-paper-lift text-body text-ink outline-none',
            'before:absolute before:inset-x-0 before:top-px before:border-t before:border-ink',
            'transition-[translate] duration-expand ease-out data-ending-style:translate-y-full data-starting-style:translate-y-full',
            floor,
          )}
        >
          <div className="flex items-center justify-between pt-3 pr-2 pb-1 pl-4">
            <BaseDialog.Title className="font-display text-[24px] leading-[30px] font-section">
              {title}
            </BaseDialog.Title>
            <BaseDialog.Close
              aria-label={closeLabel}
              className="flex size-11 cursor-pointer items-center justify-center rounded"
            >
              <X aria-hidden="true" className="size-5.5" />
            </BaseDialog.Close>
          </div>
          {children}
        </BaseDialog.Popup>
      </BaseDialog.Portal>
    </BaseDialog.Root>
  );
}
