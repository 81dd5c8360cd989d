'use client';

import { createContext, use } from 'react';
import { useDosingBar } from '@/components/week-sheet/use-dosing-bar';
import type { PaperState } from './paper-state';

const PaperContext = createContext<PaperState>({ bar: 'noPlan' });

export function PaperProvider({ state, children }: { state: PaperState; children: React.ReactNode }) {
  return <PaperContext value={state}>{children}</PaperContext>;
}

/** How the page stands; `mayAdd` only where a plan holds and nothing that happened bars dosing. */
export function usePaper(): { state: PaperState; mayAdd: boolean } {
  const state = use(PaperContext);
  const happened = useDosingBar();
  return { state, mayAdd: 'end' in state && happened === undefined };
}
