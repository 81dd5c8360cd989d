import { addDays, type CalendarDay, daysBetween } from '@/lib/calendar/household-day';
import { wallToInstant } from '@/lib/calendar/wall-time';
import type { AnswersOf } from '@/lib/schemas/situation';
import type { StepCode } from '../codes';
import { since, type SituationRecord } from '../record';
import { type Asked, follow, quick, test, tick, type Way } from '../way';

const branch = { nobody: 'alone', adult: 'with-adult', closed: 'closed' } as const;

/** Going away: up to seven days alone, longer with a named adult who tests weekly, or closed. Test first on return. */
export function away({ leavesOn, backOn, care }: AnswersOf<'away'>, record: SituationRecord): Way {
  const { timeZone } = record.pool;
  const at = (day: CalendarDay, time = '09:00') =>
    Math.max(record.openedAt, wallToInstant(day, time, timeZone).instant);
  const before = (days: number) => addDays(leavesOn, -days);
  const on = (day: CalendarDay, codes: readonly StepCode[], time?: string): Asked[] =>
    codes.map((code) => tick(code, at(day, time)));
  const back = wallToInstant(backOn, '00:00', timeZone).instant;
  const returned = since(record, back).some(({ values }) => quick.every((each) => values[each] !== undefined));
  return {
    branch: branch[care],
    lead: follow,
    stayOut: false,
    headline: returned ? 'done' : 'steps-next',
    cautions: [
      'bottle-and-gate',
      ...(care === 'closed' ? (['half-open-cover', 'no-floater-under-cover'] as const) : []),
    ],
    reasons: [{ code: 'days-away', days: daysBetween(leavesOn, backOn) }],
    steps: [
      test('test-full', at(before(2)), quick, Math.min(record.openedAt, at(before(2)))),
      ...on(before(1), ['dose-before-leaving', 'level-and-baskets', 'timer'], '18:00'),
      ...on(before(1), care === 'closed' ? ['floater-away', 'cover-on'] : ['house-sheet'], '18:00'),
      ...on(leavesOn, ['gate-locked']),
      ...(care === 'adult' ? weeklyTests(leavesOn, backOn, at) : []),
      test('test-on-return', at(backOn, '12:00'), quick, back),
    ],
    doneWhen: 'back-and-tested',
    done: returned,
    callWhen: ['drain-cover', 'level-falls'],
    callNow: false,
  };
}

/** One test for each week of the absence. */
function weeklyTests(leavesOn: CalendarDay, backOn: CalendarDay, at: (day: CalendarDay) => number): Asked[] {
  const weeks = Math.floor((daysBetween(leavesOn, backOn) - 1) / 7);
  return Array.from({ length: Math.max(0, weeks) }, (_, index) => {
    const day = addDays(leavesOn, 7 * (index + 1));
    // It may be taken a day early.
    return test('adult-tests-weekly', at(day), quick, at(addDays(day, -1)), `adult-tests-weekly-${day}`);
  });
}
