import { addDays, type CalendarDay } from '@/lib/calendar/household-day';
import { wallToInstant } from '@/lib/calendar/wall-time';
import type { StepCode } from '../codes';
import { since, type SituationRecord } from '../record';
import { allTicked, follow, quick, test, tick, type Way } from '../way';

/** Lists by the day after the first on which each is to be done: what protects people comes first. */
const openingList: readonly (readonly [day: number, codes: readonly StepCode[]])[] = [
  [0, ['drain-cover-looked-at', 'electrician-tested', 'ladder', 'gate', 'kit-dates', 'old-products']],
  [1, ['cover-off-clean', 'leaves-out', 'level-up']],
  [2, ['filter-and-pump', 'drips', 'baskets']],
  [3, ['skim-and-brush']],
  [4, ['bottom-seen']],
];
const closingList: readonly (readonly [day: number, codes: readonly StepCode[]])[] = [
  [0, ['drain-cover-looked-at', 'electrician-tested', 'skim-and-brush']],
  [1, ['balance-before-closing', 'filter-rested', 'feeder-empty', 'floater-away']],
  [
    2,
    [
      'pump-by-its-paper',
      'level-for-cover',
      'liquid-used-up',
      'products-dry',
      'ladder',
      'breaker-off',
      'cover-on',
      'gate-locked',
    ],
  ],
];

/** Opening the pool: safety first, then cleaning, pump and filter, then a full test makes the first plan. */
export function opening({ startsOn }: { startsOn: CalendarDay }, record: SituationRecord): Way {
  return list(openingList, { startsOn, testOn: 3 }, record);
}

/** Closing it: a last full test while the water still moves. */
export function closing({ startsOn }: { startsOn: CalendarDay }, record: SituationRecord): Way {
  return list(closingList, { startsOn, testOn: 0 }, record);
}

function list(
  days: typeof openingList,
  { startsOn, testOn }: { startsOn: CalendarDay; testOn: number },
  record: SituationRecord,
): Way {
  const { timeZone } = record.pool;
  const at = (day: number) =>
    Math.max(record.openedAt, wallToInstant(addDays(startsOn, day), '09:00', timeZone).instant);
  const steps = days.flatMap(([day, codes]) => codes.map((code) => tick(code, at(day))));
  const full = [...quick, 'totalAlkalinity'] as const;
  const tested = since(record, record.openedAt).some(({ values }) => full.every((each) => values[each] !== undefined));
  const done = allTicked(record, steps) && tested;
  const opens = days === openingList;
  return {
    branch: 'list',
    lead: follow,
    stayOut: opens && !done,
    headline: done ? 'done' : allTicked(record, steps) ? 'test-next' : 'steps-next',
    cautions: opens
      ? ['nobody-in-cloudy', 'drain-holds', 'half-open-cover', 'never-mix']
      : ['half-open-cover', 'no-floater-under-cover', 'never-mix'],
    reasons: [],
    steps: [...steps, test('test-full', at(testOn), full, record.openedAt)].toSorted((a, b) => a.at - b.at),
    doneWhen: 'ticks-and-test',
    done,
    callWhen: opens ? ['electrician', 'drain-cover'] : ['electrician', 'winter-lines'],
    callNow: false,
  };
}
