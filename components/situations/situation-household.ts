import type { UnitSystem } from '@/lib/units/unit';

/** What the situations need to know of their household and of who looks at them. */
export type SituationHousehold = {
  timeZone: string;
  locale: string;
  unitSystem: UnitSystem;
  /** Whether this person may begin, tick and end; who only looks is told why not. */
  mayOpen: boolean;
};
