'use client';

import { Activity, Suspense, useState } from 'react';
import { useHydrated } from './use-hydrated';

/**
 * A part whose words the server draws in their place and whose code comes after the page. A server would send what stands in
 * Suspense at the end of the page, where nobody sees it before the scripts. What stands in it never gets other props: with new
 * ones React would throw the server's words away before that code is there.
 */
export function Follows({ children }: { children: React.ReactNode }) {
  const hydrated = useHydrated();
  const [part] = useState(hydrated ? <Suspense fallback={null}>{children}</Suspense> : <Activity>{children}</Activity>);
  return part;
}
