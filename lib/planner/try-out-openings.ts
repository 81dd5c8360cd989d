import { dayOf } from '@/lib/calendar/household-day';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import type { Scenario } from '@/lib/schemas/scenario';
import type { TryOutStart } from '@/lib/schemas/try-out';
import { contextOf } from './context';
import { openEvenings } from './evenings';
import { needsOf } from './needs';
import { optionsOf } from './products';

/**
 * What may be tried on a week: the evenings on which chlorine may go in, and the most slow tablets that the rules allow.
 * Whatever was wished before leaves both as they are; where the week cannot be planned there is nothing to try.
 *
 * Errors: as `planWeek`.
 */
export function tryOutOpenings(scenario: Scenario): Pick<TryOutStart, 'evenings' | 'mostTablets'> {
  if (needsOf(scenario).blocking.length > 0) return { evenings: [], mostTablets: 0 };
  const { timeZone } = scenario.pool;
  const context = contextOf(scenario);
  const evenings = openEvenings(context).map(({ at }) => ({
    // That of the instant: a late evening may lie behind midnight.
    day: dayOf(at, timeZone),
    at: toOffsetIso(at, timeZone),
  }));
  return { evenings, mostTablets: optionsOf(context).tablets?.most ?? 0 };
}
