import type { HouseNotes } from './house-note';
import type { WeekSheet } from './week-sheet';

/** One page for the pump room: a week, and whom to call in doubt. */
export type PrintedWeek = {
  week: WeekSheet;
  notes: HouseNotes['notes'];
  /** When each dose is due of which nobody has said whether it went in, in whatever week it stands. */
  openDoses: readonly string[];
};
