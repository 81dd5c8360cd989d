import type { CalendarDay } from '@/lib/calendar/household-day';
import type { TabletLoad } from '@/lib/projection';
import type { WeekDose } from '@/lib/projection/events';
import type { Pool } from '@/lib/schemas/pool';
import type { Reading } from '@/lib/schemas/reading';

/** What one calendar day brought; anything left out was as usual, see the defaults of `weekAheadSchema`. */
export type DayConditions = {
  /** Share of clear-sky UV. */
  sky?: number | undefined;
  /** Rain [mm]. */
  rain?: number | undefined;
  /** Heads times hours. */
  swimmerHours?: number | undefined;
  /** Evaporation [mm/day]. */
  evaporation?: number | undefined;
  /** Water replaced by backwash at noon [m3]. */
  backwash?: number | undefined;
  /** Water temperature [degrees C]; between those of the readings when left out. */
  waterTemperature?: number | undefined;
};

/**
 * What somebody found in the feeder before filling it up, counted in whole tablets' worth: three halves are 1.5.
 */
export type TabletsLeft = { at: string; tablets: number };

/** Everything a pool is learnt from. Order does not matter, duplicates and contradictions may be in it. */
export type PoolHistory = {
  pool: Pool;
  readings: readonly Reading[];
  /** Everything that went in, as the projection takes it. */
  doses: readonly WeekDose[];
  days: Readonly<Record<CalendarDay, DayConditions>>;
  tabletsLeft: readonly TabletsLeft[];
  /** What was in the feeder at the first reading beside the doses. */
  loads: readonly TabletLoad[];
  /**
   * Times in which something else used chlorine up [ms]: green water, used-up chlorine being raised away. A reading then tells
   * how the water is and nothing of how the pool behaves.
   */
  unusual?: readonly { from: number; until: number }[];
};

/** A reading, or tablets found, at its instant [ms]. */
export type Dated<Thing> = { at: number; what: Thing };
