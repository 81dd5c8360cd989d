import 'server-only';
import type { StoredDose } from '@/db/queries/plan-doses';
import { timeOfDay, longDay } from '@/lib/calendar/format';
import { dayOf } from '@/lib/calendar/household-day';
import type { HouseholdAccess } from '@/lib/auth/household-access';
import { AppError } from '@/lib/errors';
import type { DoseTick } from '@/lib/schemas/plan-dose';
import { tickFrom } from './sheet-doses';

const HOUR = 3_600_000;
const clockTolerance = 5 * 60_000;
/** A dose may have gone in earlier than planned; what lies further back was another dose. */
const earliestBeforePlanned = 24 * HOUR;

type Access = Pick<HouseholdAccess, 'timeZone' | 'locale'>;
type Pouring = Extract<DoseTick, { action: 'given' | 'changed' }>;

/** Error: `conflict` before a dose may be ticked, with the hour from which it may. */
export function assertMayBeTicked(dose: StoredDose, { timeZone, locale }: Access, now: Date): void {
  const from = tickFrom(dose);
  if (now.getTime() >= from) return;
  const when = `${longDay(dayOf(from, timeZone), locale)}, ${timeOfDay(from, timeZone, locale)}`;
  throw new AppError('conflict', `This dose can be ticked from ${when}, three hours before its hour.`);
}

/**
 * When and how much went in, as the tick says, else as planned and now.
 * Error: `invalid-input` for a moment that cannot be, or a part of a tablet.
 */
export function pouredOf(tick: Pouring, dose: StoredDose, now: Date): { givenAt: Date; givenAmount: number } {
  const givenAmount = tick.action === 'changed' ? tick.amount : dose.amount;
  if (dose.unit !== 'tablet' && tick.tabletsLeft !== undefined)
    throw invalid('tabletsLeft', 'Only a dose of tablets tells what was left in the feeder.');
  if (dose.unit === 'tablet' && !Number.isInteger(givenAmount)) throw invalid('amount', 'Count whole tablets.');
  const claimed = tick.at === undefined ? now.getTime() : Date.parse(tick.at);
  if (claimed > now.getTime() + clockTolerance) throw invalid('at', 'A dose cannot have gone in later than now.');
  if (claimed < dose.at.getTime() - earliestBeforePlanned)
    throw invalid('at', 'That is more than a day before this dose was planned. Check the day and the hour.');
  return { givenAt: new Date(Math.min(claimed, now.getTime())), givenAmount };
}

function invalid(path: string, message: string): AppError {
  return new AppError('invalid-input', message, { problems: [{ path, message }] });
}
