import type { HouseNotes } from './house-note';
import type { PlanDose } from './plan-dose';
import type { WeekSheet } from './week-sheet';

/** Somebody who may add what the plan says: marked, and with the safety card read this season. */
export type ChemicalHandler = { membershipId: string; name: string };

/** One page for whoever looks after the pool while the household is away. */
export type HouseSheet = {
  /** The week of now: verdict, plan, events, tests to come. */
  week: WeekSheet;
  notes: HouseNotes['notes'];
  handlers: readonly ChemicalHandler[];
  /** For whom the sheet is, where they handle chemicals; null for anybody else, who adds nothing. */
  handler: ChemicalHandler | null;
  /** What the plan still has ahead; empty where nobody is named who may add it, or no plan holds. */
  doses: readonly PlanDose[];
  /** Doses whose hour is over and of which nobody said whether they went in. */
  openDoses: number;
};
