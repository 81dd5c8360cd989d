import type { UnitSystem } from '@/lib/units/unit';

/** What a round needs to know of its household and of who walks it. */
export type RoundHousehold = {
  timeZone: string;
  locale: string;
  unitSystem: UnitSystem;
  personName: string;
  mayDoRounds: boolean;
  mayKeepHouseNotes: boolean;
};
