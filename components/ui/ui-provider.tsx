'use client';

import { CSPProvider } from '@base-ui/react/csp-provider';
import { Tooltip } from '@base-ui/react/tooltip';
import { ToastProvider } from './toast';

/** What the primitives need once, round the whole page. Their style elements stand in app/globals.css instead. */
export function UiProvider({ children, closeLabel }: { children: React.ReactNode; closeLabel: string }) {
  return (
    <CSPProvider disableStyleElements>
      <Tooltip.Provider>
        <ToastProvider closeLabel={closeLabel}>{children}</ToastProvider>
      </Tooltip.Provider>
    </CSPProvider>
  );
}
