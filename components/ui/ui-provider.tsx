'use client';

import { CSPProvider } from '@base-ui/react/csp-provider';

/** What the primitives need once, round the whole page: their style elements stand in app/globals.css instead. */
export function UiProvider({ children }: { children: React.ReactNode }) {
  return <CSPProvider disableStyleElements>{children}</CSPProvider>;
}
