'use client';

import { Toast } from '@base-ui/react/toast';
import { X } from 'lucide-react';

export type ToastMessage = {
  title: string;
  description?: string;
  action?: { label: string; onPress: () => void };
  /** Milliseconds it stays; 0 keeps it until it is closed. */
  stays?: number;
};

/**
 * Short news that needs no answer, such as "Ticked", with a way back. Errors at a field stand at the field. It stands
 * round the pages that use it, not round all of them: it is 26 kB.
 */
export function ToastProvider({ children, closeLabel }: { children: React.ReactNode; closeLabel: string }) {
  return (
    <Toast.Provider timeout={8000}>
      {children}
      <Toast.Portal>
        <Toast.Viewport className="fixed inset-x-4 bottom-22 z-30 grid gap-2 outline-none md:inset-x-auto md:right-7 md:bottom-7 md:w-96">
          <ToastList closeLabel={closeLabel} />
        </Toast.Viewport>
      </Toast.Portal>
    </Toast.Provider>
  );
}

function ToastList({ closeLabel }: { closeLabel: string }) {
  const { toasts } = Toast.useToastManager();
  return toasts.map((toast) => (
    <Toast.Root
      key={toast.id}
      toast={toast}
      className="border-due border-ink bg-paper-lift text-body text-ink transition-opacity duration-expand data-ending-style:opacity-0 data-limited:hidden data-starting-style:opacity-0"
    >
      <Toast.Content className="flex items-center gap-3 py-1 pl-4">
        <span className="min-w-0 flex-1 py-2">
          <Toast.Title className="font-strong" />
          <Toast.Description className="text-small text-ink-2" />
        </span>
        <Toast.Action className="min-h-11 cursor-pointer px-2 font-emphasis underline decoration-1 underline-offset-[3px]" />
        <Toast.Close aria-label={closeLabel} className="flex size-11 cursor-pointer items-center justify-center">
          <X aria-hidden="true" className="size-5" />
        </Toast.Close>
      </Toast.Content>
    </Toast.Root>
  ));
}

/** `const showToast = useToast(); showToast({ title: ... })` */
export function useToast(): (message: ToastMessage) => void {
  const { add } = Toast.useToastManager();
  return ({ title, description, action, stays }) => {
    add({
      title,
      ...(description === undefined ? {} : { description }),
      ...(stays === undefined ? {} : { timeout: stays }),
      ...(action === undefined ? {} : { actionProps: { children: action.label, onClick: action.onPress } }),
    });
  };
}
