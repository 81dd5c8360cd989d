import { type InstantInterval, joined } from '@/lib/calendar/wall-time';
import { addShare, type Forcing } from './forcing';
import type { WeekDose } from './events';

/** While the pump runs because of doses, whatever its timer says; tablets ask for nothing. */
function pumpOverrides(doses: readonly WeekDose[]): InstantInterval[] {
  return doses.flatMap((dose) => (dose.kind === 'dose' ? [{ from: dose.at, to: dose.pumpUntil }] : []));
}

/** Share of each step in which the pump runs [1], by its timer or because of a dose. */
export function pumpShares(forcing: Forcing, doses: readonly WeekDose[]): Float64Array {
  const overrides = pumpOverrides(doses);
  if (overrides.length === 0) return forcing.pump;
  const shares = new Float64Array(forcing.steps);
  for (const interval of joined([...forcing.pumpIntervals, ...overrides])) addShare(shares, forcing, interval, 1);
  return shares;
}
