import type { AnswersOf } from '@/lib/schemas/situation';
import { dayOf } from '@/lib/calendar/household-day';
import { accidentTime, freshTest } from '@/lib/standards/situations';
import type { Call } from '../codes';
import { fastDoses, inRange, isStabilized, lowestOf, newest, since, type SituationRecord, type Taken } from '../record';
import { dayAt, follow, hold, quick, test, tick, ticksNow, type Way } from '../way';

const MINUTE = 60_000;
const HOUR = 60 * MINUTE;
/** The next day is a night later, not the next minute after midnight [ms]. */
export const NIGHT = 8 * HOUR;
/** Free chlorine that a published time asks for, and a little for what is used up meanwhile [mg/L]. */
const WITH_RESERVE = 0.5;
/** As near to the swim limit as a kit can tell [mg/L]. */
const NEAR = 0.5;

/** An accident in the water: care rules, part 7. */
export function accident(answers: AnswersOf<'accident'>, record: SituationRecord): Way {
  if (answers.what === 'blood' || (answers.what === 'vomit' && answers.moreThanSwallowedWater === 'no'))
    return noExtraStep(record);
  if (answers.what === 'loose-stool' || (answers.what === 'dead-animal' && answers.animal === 'raccoon-calf-lamb'))
    return healthDepartment(answers, record);
  return raise(answers, record);
}

const calls: readonly Call[] = ['health-department', 'doctor-first', 'still-low-next-day'];

function noExtraStep(record: SituationRecord): Way {
  const done = since(record, record.openedAt).some((taken) => inRange(taken, record));
  return {
    branch: 'no-extra-step',
    lead: follow,
    stayOut: !done,
    headline: done ? 'done' : 'test-next',
    cautions: ['everyone-out', 'nobody-ill-swims'],
    reasons: [],
    steps: [...ticksNow(record, ['everyone-out']), test('test-now', record.openedAt)],
    doneWhen: 'test-in-range',
    done,
    callWhen: ['doctor-first'],
    callNow: false,
  };
}

/** No table for a home owner: no waiting time is named at any stabilizer. */
function healthDepartment({ what }: AnswersOf<'accident'>, record: SituationRecord): Way {
  const said = record.ticks.get('health-department-done');
  const done = said !== undefined && since(record, said).some((taken) => inRange(taken, record));
  return {
    branch: 'health-department',
    lead: hold,
    stayOut: !done,
    headline: done ? 'done' : 'out-health-department',
    cautions: ['everyone-out', 'no-time-for-loose-stool', 'gloves-and-net', 'nobody-ill-swims'],
    reasons: [],
    steps: [
      ...ticksNow(record, ['everyone-out', 'call-health-department']),
      ...(what === 'dead-animal' ? ticksNow(record, ['double-bag']) : []),
      ...ticksNow(record, ['filter-running']),
      tick('health-department-done', dayAt(record, 1)),
      test('test-before-swim', dayAt(record, 1), quick, said ?? Infinity),
    ],
    doneWhen: 'health-department-and-test',
    done,
    callWhen: ['health-department', 'doctor-first'],
    callNow: !record.ticks.has('call-health-department'),
  };
}

function raise({ what }: AnswersOf<'accident'>, record: SituationRecord): Way {
  const tests = since(record, record.openedAt).filter(({ values }) =>
    quick.every((each) => values[each] !== undefined),
  );
  const first = ticksNow(record, [
    'everyone-out',
    what === 'dead-animal' ? 'double-bag' : 'lift-out',
    'net-in-water',
    'filter-running',
  ]);
  const common = {
    cautions: ['everyone-out', 'gloves-and-net', 'nobody-ill-swims', 'never-mix'],
    callWhen: calls,
    callNow: false,
  } as const;
  return publishedTimeHolds(record)
    ? { ...common, ...publishedTime(tests, record, first) }
    : { ...common, ...nextDay(tests, record, first) };
}

/** The published time is for water without stabilizer that is warm enough and of a pH low enough. */
function publishedTimeHolds(record: SituationRecord): boolean {
  const fresh = (quantity: 'pH' | 'temperature') => {
    const read = newest(record, quantity);
    return read && read.takenAt >= record.openedAt - freshTest.value * HOUR ? read.value : null;
  };
  const pH = fresh('pH');
  const temperature = fresh('temperature');
  return (
    !isStabilized(record) &&
    pH !== null &&
    pH <= accidentTime.pHAtMost &&
    temperature !== null &&
    temperature >= accidentTime.temperatureAtLeast
  );
}

type Rest = Omit<Way, 'cautions' | 'callWhen' | 'callNow'>;

function publishedTime(tests: readonly Taken[], record: SituationRecord, first: Way['steps']): Rest {
  const enough = ({ values }: Taken) =>
    (values.freeChlorine ?? 0) >= accidentTime.freeChlorine && (values.pH ?? Infinity) <= accidentTime.pHAtMost;
  const start = tests.findIndex((taken, index) => enough(taken) && tests.slice(index).every(enough));
  const from = tests[start]?.takenAt ?? Infinity;
  const until = from + accidentTime.minutes * MINUTE;
  const last = tests.at(-1);
  const done = tests.some(({ takenAt }) => takenAt >= until) && last !== undefined && inRange(last, record);
  return {
    branch: 'published-time',
    lead:
      last === undefined || Number.isFinite(from) || (fastDoses(record).at(-1)?.at ?? -Infinity) >= last.takenAt
        ? hold
        : {
            kind: 'treat',
            treatment: {
              kind: 'accident',
              aim: { to: Math.min(record.pool.swimLimit, accidentTime.freeChlorine + WITH_RESERVE) },
              evening: 'treatment',
            },
          },
    stayOut: !done,
    headline: done ? 'done' : 'out-accident',
    reasons: [{ code: 'not-stabilized' }],
    steps: [
      ...first,
      test('test-now', record.openedAt),
      {
        ...test('test-after-time', Number.isFinite(until) ? until : dayAt(record, 1), quick, until),
        figures: { minutes: accidentTime.minutes },
      },
    ],
    doneWhen: 'thirty-minutes-and-test',
    done,
  };
}

function nextDay(tests: readonly Taken[], record: SituationRecord, first: Way['steps']): Rest {
  const { swimLimit, timeZone } = record.pool;
  const doses = fastDoses(record);
  const lastDose = doses.at(-1)?.at ?? -Infinity;
  const last = tests.at(-1);
  const raised =
    doses.some((dose) => levelWith(dose, record) >= swimLimit - NEAR) ||
    tests.some(({ values }) => (values.freeChlorine ?? 0) >= swimLimit - NEAR);
  const heldSince = Math.max(record.openedAt, lastDose);
  const isNextDay = ({ takenAt }: Taken) =>
    dayOf(takenAt, timeZone) > dayOf(heldSince, timeZone) && takenAt - heldSince >= NIGHT;
  const done = raised && tests.some((taken) => isNextDay(taken) && inRange(taken, record));
  const lowAgain = last !== undefined && (last.values.freeChlorine ?? 0) < lowestOf(record).lowest;
  const treats = last !== undefined && lastDose < last.takenAt && !done && (!raised || lowAgain);
  const stabilizer = newest(record, 'cyanuricAcid');
  return {
    branch: 'next-day',
    lead: treats
      ? { kind: 'treat', treatment: { kind: 'accident', aim: { to: swimLimit }, evening: 'treatment' } }
      : hold,
    stayOut: !done,
    headline: done ? 'done' : 'out-accident',
    reasons: [
      isStabilized(record)
        ? stabilizer === null
          ? { code: 'stabilizer-unknown' }
          : { code: 'stabilized', stabilizer: stabilizer.value }
        : coldOrHighPH(record),
    ],
    steps: [...first, test('test-now', record.openedAt), test('test-next-day', dayAfter(heldSince, record), quick)],
    doneWhen: 'next-day-and-test',
    done,
  };
}

/** What a dose brought chlorine to at most: what was read before it, and what it adds [mg/L]. */
function levelWith({ at, rise }: { at: number; rise: number }, record: SituationRecord): number {
  const before = record.readings.findLast(({ takenAt, values }) => takenAt <= at && values.freeChlorine !== undefined);
  return (before?.values.freeChlorine ?? 0) + rise;
}

/** Why no published time holds, with what was measured of it. */
function coldOrHighPH(record: SituationRecord): Way['reasons'][number] {
  const pH = newest(record, 'pH')?.value;
  const temperature = newest(record, 'temperature')?.value;
  return {
    code: 'cold-or-high-pH',
    ...(pH === undefined ? {} : { pH }),
    ...(temperature === undefined ? {} : { temperature }),
  };
}

function dayAfter(instant: number, record: SituationRecord): number {
  return dayAt({ ...record, openedAt: instant }, 1);
}
