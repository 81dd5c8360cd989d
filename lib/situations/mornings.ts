import { addDays, type CalendarDay, dayOf, daysBetween } from '@/lib/calendar/household-day';
import { wallToInstant } from '@/lib/calendar/wall-time';
import type { Morning } from '@/lib/schemas/situation';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import type { Taken } from './record';

/** Free chlorine that was promised for an instant by a plan made before it [mg/L]; null where none was. */
export type PromiseAt = (instant: number) => { low: number; high: number } | null;

/** The step by which somebody says that the bottom drain was plainly seen on a morning. */
export function drainSeenOn(day: CalendarDay): string {
  return `drain-seen-${day}`;
}

/**
 * The mornings since a procedure was opened, each against the ordinary band: what the sheet of the evening before promised
 * of a clear pool of this size, stabilizer and warmth. A morning is good when free chlorine is not under the band, the water
 * looks clear and somebody has plainly seen the bottom drain; good ones in a row are counted, a day without one starts anew.
 * Above the band is good too: then the water used less than was thought.
 *
 * @param readings oldest first; the first one with free chlorine from 04:00 to noon counts for its day
 */
export function morningsOf(
  readings: readonly Taken[],
  ticks: ReadonlyMap<string, number>,
  promise: PromiseAt,
  { openedAt, timeZone }: { openedAt: number; timeZone: string },
): Morning[] {
  const opened = dayOf(openedAt, timeZone);
  const mornings: Morning[] = [];
  for (const { takenAt, look, values } of readings) {
    const day = dayOf(takenAt, timeZone);
    const { freeChlorine } = values;
    if (freeChlorine === undefined || day <= opened || mornings.at(-1)?.day === day) continue;
    if (takenAt >= wallToInstant(day, '12:00', timeZone).instant) continue;
    // At night nobody sees a drain, and the night has not used up its chlorine yet.
    if (takenAt < wallToInstant(day, '04:00', timeZone).instant) continue;
    const band = promise(takenAt);
    const drainSeen = look === 'clear' ? (ticks.has(drainSeenOn(day)) ? true : null) : false;
    const inside = band && freeChlorine >= band.low;
    const before = mornings.at(-1);
    const follows = before !== undefined && daysBetween(before.day, day) === 1;
    mornings.push({
      day,
      takenAt: toOffsetIso(takenAt, timeZone),
      freeChlorine,
      low: band?.low ?? null,
      high: band?.high ?? null,
      inside,
      drainSeen,
      inARow: inside && drainSeen ? (follows ? before.inARow : 0) + 1 : 0,
    });
  }
  return mornings;
}

/** The morning after a day. */
export function morningAfter(day: CalendarDay, timeZone: string): number {
  return wallToInstant(addDays(day, 1), '08:00', timeZone).instant;
}
