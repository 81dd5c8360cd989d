import { dayOf } from '@/lib/calendar/household-day';
import { freshTest } from '@/lib/standards/situations';
import { morningAfter } from '../mornings';
import { NIGHT } from './accident';
import { fastDoses, newest, since, type SituationRecord } from '../record';
import { hold, quick, test, type Way } from '../way';

const HOUR = 3_600_000;
/** As near to the swim limit as a kit can tell [mg/L]. */
const NEAR = 0.5;

/** Chlorine up to the swim limit in one evening, with granules or liquid, never tablets: care rules, part 7. */
export function quickRaise(record: SituationRecord): Way {
  const { swimLimit, timeZone } = record.pool;
  const freshSince = record.openedAt - freshTest.value * HOUR;
  const chlorine = newest(record, 'freeChlorine');
  const fresh = chlorine !== null && chlorine.takenAt >= freshSince;
  const dose = fastDoses(record).at(-1);
  const checked =
    dose !== undefined &&
    since(record, dose.at).some(
      ({ takenAt, values }) =>
        values.freeChlorine !== undefined &&
        dayOf(takenAt, timeZone) > dayOf(dose.at, timeZone) &&
        takenAt - dose.at >= NIGHT,
    );
  const enough = fresh && dose === undefined && chlorine.value >= swimLimit - NEAR;
  const done = checked || enough;
  return {
    branch: enough ? 'high-enough' : 'one-evening',
    lead:
      fresh && dose === undefined && !enough
        ? { kind: 'treat', treatment: { kind: 'quick-raise', aim: { to: swimLimit }, evening: 'ordinary' } }
        : hold,
    stayOut: false,
    headline: enough ? 'nothing-to-do' : done ? 'done' : fresh && !dose ? 'dose-on' : 'test-next',
    cautions: ['never-mix', 'liquid-low', 'granules-into-water'],
    reasons: enough ? [{ code: 'chlorine-enough', freeChlorine: chlorine.value }] : [],
    steps: [
      ...(fresh && chlorine.takenAt < record.openedAt
        ? []
        : [test('test-before-dose', record.openedAt, quick, freshSince)]),
      ...(dose
        ? [test('morning-reading', morningAfter(dayOf(dose.at, timeZone), timeZone), quick, dose.at + 4 * HOUR)]
        : []),
    ],
    doneWhen: 'test-after-dose',
    done,
    callWhen: ['still-low-next-day'],
    callNow: false,
  };
}
