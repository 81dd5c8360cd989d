import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { instantOf } from './sheet-times';

/** ahead: only its steps may be read; due: it may be ticked; claimed: somebody is at it. */
export type DoseMoment = 'ahead' | 'due' | 'claimed' | 'done' | 'skipped';

export function momentOf(dose: PlanDose, now: number): DoseMoment {
  if (dose.status === 'skipped') return 'skipped';
  if (dose.status !== 'planned') return 'done';
  if (now < instantOf(dose.tickFrom)) return 'ahead';
  return dose.claimedBy === null ? 'due' : 'claimed';
}

/** When it went in, or is to go in [ms]. */
export function doseInstant(dose: PlanDose): number {
  return instantOf(dose.givenAt ?? dose.at);
}

/** How much went in, or is to go in. */
export function effectiveAmount(dose: PlanDose): number {
  return dose.givenAmount ?? dose.amount;
}

/** Whether this person may take a tick back: their own, or as an owner anybody's, for ten minutes. */
export function mayUndo(dose: PlanDose, now: number, me: WeekSheet['me']): boolean {
  if (dose.undoUntil === null || now >= instantOf(dose.undoUntil) || tickBar(me) !== undefined) return false;
  return me.role === 'owner' || dose.recordedBy === me.name;
}

/**
 * Whether this person may still say what was left in the feeder: of tablets that they ticked themselves, in the minutes
 * in which they could take it back. From somebody else it would be a second tick.
 */
export function mayAddFound(dose: PlanDose, now: number, me: WeekSheet['me']): boolean {
  const tablets = dose.form === 'tablet' && dose.status !== 'skipped';
  return tablets && dose.tabletsLeft === null && dose.recordedBy === me.name && mayUndo(dose, now, me);
}

/** Why somebody may read the steps but not tick; undefined when they may. */
export type TickBar = 'viewer' | 'not-handling';

export function tickBar({ role, handlesChemicals }: WeekSheet['me']): TickBar | undefined {
  if (role === 'viewer') return 'viewer';
  return handlesChemicals ? undefined : 'not-handling';
}

/** The first dose that nobody has dealt with yet. */
export function nextDose(doses: readonly PlanDose[]): PlanDose | undefined {
  return doses.filter(({ status }) => status === 'planned').toSorted((a, b) => instantOf(a.at) - instantOf(b.at))[0];
}

const HOUR = 3_600_000;

/** Whole hours that the pump has to run on after a dose; undefined when it does not matter. */
export function pumpHours(dose: PlanDose): number | undefined {
  if (dose.pumpUntil === null) return undefined;
  return Math.ceil((instantOf(dose.pumpUntil) - instantOf(dose.at)) / HOUR);
}

/** Last light: the dose hour stands in the last two hours before sunset, so that one can see. */
export function isLastLight(dose: PlanDose, sunset: string | null): boolean {
  if (sunset === null) return false;
  const before = instantOf(sunset) - instantOf(dose.at);
  return before >= 0 && before <= 2 * HOUR;
}

const BUCKET_LITRES = 15;
const GRAMS_PER_BUCKET = 300;
const GRAMS_OF_CALCIUM_CHLORIDE_PER_BUCKET = 1000;

/** Water for the bucket [L]: at least 15 for each 300 g, for calcium chloride 15 for each kilogram. */
export function bucketLitres({ amount, substance }: PlanDose): number {
  const each = substance === 'calcium-chloride' ? GRAMS_OF_CALCIUM_CHLORIDE_PER_BUCKET : GRAMS_PER_BUCKET;
  return Math.ceil(amount / each) * BUCKET_LITRES;
}
