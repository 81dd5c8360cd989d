import { dayOf } from '@/lib/calendar/household-day';
import { drainSeenOn } from './mornings';
import { type Asked, quick, test, tick } from './way';

const HOUR = 3_600_000;
/** So long before its hour a morning's reading may be taken: from the first light on. */
export const EARLY = 4 * HOUR;

/** The reading of a morning after a treatment evening, and the look at the drain. */
export function morningSteps(at: number, timeZone: string): Asked[] {
  return [
    test('morning-reading', at, quick, at - EARLY, `morning-reading-${dayOf(at, timeZone)}`),
    drainStep(at, timeZone),
  ];
}

/** Somebody says that the bottom drain was plainly seen on that day. */
export function drainStep(at: number, timeZone: string): Asked {
  return tick('drain-seen', at, undefined, drainSeenOn(dayOf(at, timeZone)));
}
