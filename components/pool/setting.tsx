'use client';

import { createContext, useContext, useMemo, useState, useSyncExternalStore } from 'react';
import { readKept, writeKept } from '@/lib/client/device-store';
import { useSaveUnitSystem } from '@/lib/client/pools';
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
const never = () => () => {};

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
  // The server knows no device: what is kept there is taken up once React listens, and mostly it is the household's own.
  const kept = useSyncExternalStore(
    never,
    () => keptSystem(name, household.unitSystem),
    () => household.unitSystem,
  );
  const [chosen, setChosen] = useState<UnitSystem>();
  const system = chosen ?? kept;
  const setting = useMemo(
    () => ({
      ...household,
      place,
      system,
      setSystem: (next: UnitSystem) => {
        setChosen(next);
        writeKept(name, { over: household.unitSystem, system: next });
        save(next);
      },
    }),
    [household, place, system, name, save],
  );
  return <Setting value={setting}>{children}</Setting>;
}

/** Chosen on this device over what the household had then: a later change of the household wins. */
function keptSystem(name: string, own: UnitSystem): UnitSystem {
  const chosen = readKept(name, choice);
  return chosen?.over === own ? chosen.system : own;
}

type Choice = { over: UnitSystem; system: UnitSystem };

/** By hand: the page of the pool would otherwise wait for zod. */
const choice = {
  safeParse: (kept: unknown) => (isChoice(kept) ? { success: true as const, data: kept } : { success: false as const }),
};

function isChoice(kept: unknown): kept is Choice {
  return (
    typeof kept === 'object' &&
    kept !== null &&
    ['over', 'system'].every((part) => isUnitSystem((kept as Record<string, unknown>)[part]))
  );
}

function isUnitSystem(value: unknown): value is UnitSystem {
  return value === 'metric' || value === 'us';
}

export function usePoolSetting(): PoolSetting {
  const setting = useContext(Setting);
  if (!setting) throw new Error('PoolSettingProvider is missing around this component.');
  return setting;
}
