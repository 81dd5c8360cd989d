'use client';

import { createContext, use } from 'react';
import type { SituationHousehold } from './situation-household';

const SituationContext = createContext<SituationHousehold | null>(null);

export function SituationProvider({
  household,
  children,
}: {
  household: SituationHousehold;
  children: React.ReactNode;
}) {
  return <SituationContext value={household}>{children}</SituationContext>;
}

export function useHousehold(): SituationHousehold {
  const household = use(SituationContext);
  if (household === null) throw new Error('Outside a SituationProvider');
  return household;
}
