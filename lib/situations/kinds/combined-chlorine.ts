import { dayOf } from '@/lib/calendar/household-day';
import { limits } from '@/lib/standards/limits';
import { combinedRules, freshTest } from '@/lib/standards/situations';
import { EARLY } from '../morning-steps';
import { morningAfter } from '../mornings';
import { NIGHT } from './accident';
import { fastDoses, newest, since, type SituationRecord } from '../record';
import { follow, hold, quick, test, ticksNow, type Way } from '../way';

const HOUR = 3_600_000;

/** Too much used-up chlorine: care rules, part 7. No ten-times figure on screen. */
export function combinedChlorine(record: SituationRecord): Way {
  const limit = limits.combinedChlorineAct.value;
  const read = newest(record, 'combinedChlorine');
  const freshSince = record.openedAt - freshTest.value * HOUR;
  const combined = read && read.takenAt >= freshSince ? read : null;
  const base = {
    stayOut: false,
    cautions: ['never-mix', 'liquid-low', 'granules-into-water'],
    doneWhen: 'combined-low',
    callWhen: ['three-evenings', 'doctor-first'],
  } as const;
  const wants = ['freeChlorine', 'combinedChlorine', 'pH'] as const;
  if (!combined)
    return {
      ...base,
      branch: 'never-measured',
      lead: follow,
      headline: 'test-next',
      reasons: [],
      steps: [test('test-combined', record.openedAt, wants)],
      done: false,
      callNow: false,
    };
  const reasons = [{ code: 'combined', combinedChlorine: combined.value, limit } as const];
  if (combined.value <= limit)
    return {
      ...base,
      branch: 'not-high',
      lead: follow,
      headline: combined.takenAt >= record.openedAt ? 'done' : 'nothing-to-do',
      reasons,
      steps: [test('test-combined', record.openedAt, wants)],
      done: true,
      callNow: false,
    };

  const { timeZone } = record.pool;
  const evenings = [...new Set(fastDoses(record).map(({ at }) => dayOf(at, timeZone)))];
  const lastDose = fastDoses(record).at(-1)?.at ?? -Infinity;
  // Minutes after a dose it shows nothing: the next day's test counts.
  const readSince =
    !Number.isFinite(lastDose) ||
    (combined.takenAt - lastDose >= NIGHT && dayOf(combined.takenAt, timeZone) > dayOf(lastDose, timeZone));
  const usedUp = evenings.length >= combinedRules.evenings && readSince;
  const tested = since(record, freshSince).some(({ values }) => quick.every((each) => values[each] !== undefined));
  return {
    ...base,
    branch: usedUp ? 'professional' : 'treatment-evenings',
    lead:
      usedUp || !readSince || !tested
        ? hold
        : {
            kind: 'treat',
            treatment: { kind: 'combined-chlorine', aim: { by: combinedRules.rise }, evening: 'treatment' },
          },
    headline: usedUp ? 'ask-professional' : readSince && tested ? 'dose-on' : 'test-next',
    reasons: [
      ...reasons,
      usedUp
        ? { code: 'evenings-used-up', most: combinedRules.evenings }
        : { code: 'evening-of', evening: evenings.length + 1, most: combinedRules.evenings },
    ],
    steps: [
      ...(tested && evenings.length === 0 ? [] : [test('test-before-dose', record.openedAt, quick, freshSince)]),
      ...ticksNow(record, ['open-cover-and-sun']),
      ...evenings.map((day) => {
        const at = morningAfter(day, timeZone);
        return test('test-combined', at, wants, at - EARLY, `test-combined-${dayOf(at, timeZone)}`);
      }),
    ],
    done: false,
    callNow: usedUp,
  };
}
