'use client';

import { Dialog as BaseDialog } from '@base-ui/react/dialog';
import { X } from 'lucide-react';
import { classNames } from './class-names';

export type DialogProps = {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  title: React.ReactNode;
  /** One sentence under the title, read out when the dialog opens. */
  description?: React.ReactNode;
  closeLabel: string;
  children?: React.ReactNode;
  /** The buttons at the end, main one first. */
  actions?: React.ReactNode;
};

export const scrim =
  'fixed inset-0 z-20 bg-ink opacity-50 transition-opacity duration-expand data-ending-style:opacity-0 data-starting-style:opacity-0';

/** The dialog itself; `Dialog` fetches it. Focus stays inside; Escape and a click outside close it. */
export function DialogPanel({ open, onOpenChange, title, description, closeLabel, children, actions }: DialogProps) {
  return (
    <BaseDialog.Root open={open} onOpenChange={onOpenChange}>
      <BaseDialog.Portal>
        <BaseDialog.Backdrop className={scrim} />
        {/* Above the tabs of a phone, which would cover its buttons. */}
        <BaseDialog.Viewport className="fixed inset-0 z-30 flex items-end justify-center overflow-y-auto sm:items-center sm:p-6">
          <BaseDialog.Popup
            className={classNames(
              'relative w-full max-w-form border-t-stop border-ink bg-paper-lift p-5 text-body text-ink outline-none sm:border-due sm:p-6',
              'before:absolute before:inset-x-0 before:top-px before:border-t before:border-ink sm:before:hidden',
              'transition-opacity duration-expand data-ending-style:opacity-0 data-starting-style:opacity-0',
            )}
          >
            <div className="flex items-start justify-between gap-3">
              <BaseDialog.Title className="font-display text-section text-balance">{title}</BaseDialog.Title>
              <BaseDialog.Close
                aria-label={closeLabel}
                className="-mt-2.5 -mr-2.5 flex size-11 shrink-0 cursor-pointer items-center justify-center rounded"
              >
                <X aria-hidden="true" className="size-5.5" />
              </BaseDialog.Close>
            </div>
            {description === undefined ? null : (
              <BaseDialog.Description className="mt-1 text-body text-ink-2">{description}</BaseDialog.Description>
            )}
            {children === undefined ? null : <div className="mt-3">{children}</div>}
            {actions === undefined ? null : <div className="mt-5 flex flex-wrap gap-2.5">{actions}</div>}
          </BaseDialog.Popup>
        </BaseDialog.Viewport>
      </BaseDialog.Portal>
    </BaseDialog.Root>
  );
}
