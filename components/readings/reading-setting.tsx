'use client';

import { createContext, use } from 'react';
import type { Role } from '@/lib/schemas/week-sheet';
import type { UnitSystem } from '@/lib/units/unit';

/** Who tests which household's water, and how it writes days and figures. */
export type ReadingHousehold = {
  householdId: string;
  personId: string;
  personName: string;
  role: Role;
  handlesChemicals: boolean;
  timeZone: string;
  locale: string;
  unitSystem: UnitSystem;
};

const Setting = createContext<ReadingHousehold | undefined>(undefined);

export function ReadingSettingProvider({
  household,
  children,
}: {
  household: ReadingHousehold;
  children: React.ReactNode;
}) {
  return <Setting value={household}>{children}</Setting>;
}

export function useReadingSetting(): ReadingHousehold {
  const setting = use(Setting);
  if (setting === undefined) throw new Error('ReadingSettingProvider is missing around this component.');
  return setting;
}
