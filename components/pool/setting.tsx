'use client';

import { createContext, useContext, useMemo, useState } from 'react';
import { z } from 'zod';
import { readKept, writeKept } from '@/lib/client/device-store';
import { useSaveUnitSystem } from '@/lib/client/pools';
import { unitSystems } from '@/lib/schemas/week-sheet';
import type { UnitSystem } from '@/lib/units/unit';

/** Whose pool is described, and how this household writes days and figures. */
export type PoolHousehold = {
  id: string;
  name: string;
  timeZone: string;
  locale: string;
  unitSystem: UnitSystem;
  /** The person in front of the screen. */
  personName: string;
  /** Only an owner changes the profile. */
  mayChange: boolean;
};

/** Where the steps stand: on the way to the first sheet, or opened again for correction. */
export type PoolPlace = 'first-run' | 'profile';

export type PoolSetting = PoolHousehold & {
  place: PoolPlace;
  /** Measures as they are typed now: the household's own, or those switched to while describing the pool. */
  system: UnitSystem;
  setSystem: (system: UnitSystem) => void;
};

const Setting = createContext<PoolSetting | undefined>(undefined);
/** Chosen on this device over what the household had then: a later change of the household wins. */
const chosenSchema = z.object({ over: z.enum(unitSystems), system: z.enum(unitSystems) });

export function PoolSettingProvider({
  household,
  place,
  children,
}: {
  household: PoolHousehold;
  place: PoolPlace;
  children: React.ReactNode;
}) {
  const name = `wadewell.measures.${household.id}`;
  const { mutate: save } = useSaveUnitSystem();
  const [system, setSystem] = useState(() => {
    const chosen = readKept(name, chosenSchema);
    return chosen?.over === household.unitSystem ? chosen.system : household.unitSystem;
  });
  const setting = useMemo(
    () => ({
      ...household,
      place,
      system,
      setSystem: (next: UnitSystem) => {
        setSystem(next);
        writeKept(name, { over: household.unitSystem, system: next });
        save(next);
      },
    }),
    [household, place, system, name, save],
  );
  return <Setting value={setting}>{children}</Setting>;
}

export function usePoolSetting(): PoolSetting {
  const setting = useContext(Setting);
  if (!setting) throw new Error('PoolSettingProvider is missing around this component.');
  return setting;
}
