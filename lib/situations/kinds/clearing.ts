import { dayOf } from '@/lib/calendar/household-day';
import type { AnswersOf } from '@/lib/schemas/situation';
import { limits } from '@/lib/standards/limits';
import { clearingRules, freshTest } from '@/lib/standards/situations';
import type { Call, Caution } from '../codes';
import { morningAfter } from '../mornings';
import { drainStep, morningSteps } from '../morning-steps';
import { fastDoses, inRange, newest, since, type SituationRecord, type Taken } from '../record';
import { replacingSteps, replacingReason } from '../replacing-steps';
import { allTicked, type Asked, dayAt, follow, hold, quick, test, tick, ticksNow, type Way } from '../way';

const HOUR = 3_600_000;

/** Green or cloudy water: care rules, part 7. */
export function clearing(answers: AnswersOf<'clearing'>, record: SituationRecord): Way {
  if (answers.look === 'spots-or-stain') return professional(record);
  const waiting = answers.look === 'milky' && answers.addedInLastDay === 'yes';
  const waitedUntil = record.openedAt + clearingRules.waitHours * HOUR;
  const afterWaiting = since(record, waitedUntil);
  if (waiting && (afterWaiting.length === 0 || afterWaiting.every(({ look }) => look === 'clear')))
    return waitADay(record, waitedUntil);
  return treat(record);
}

const callWhen: readonly Call[] = ['four-evenings', 'spots-or-slime', 'filter-climbs', 'doctor-first'];
const cautions: readonly Caution[] = [
  'nobody-in-cloudy',
  'never-mix',
  'liquid-low',
  'granules-into-water',
  'nothing-of-ours',
];

function professional(record: SituationRecord): Way {
  const said = record.ticks.get('professional-done');
  const done =
    said !== undefined && since(record, said).some((taken) => taken.look === 'clear' && inRange(taken, record));
  return {
    branch: 'professional',
    lead: hold,
    stayOut: !done,
    headline: done ? 'done' : 'ask-professional',
    cautions: ['nobody-in-cloudy', 'metals', 'nothing-of-ours'],
    reasons: [],
    steps: [
      ...ticksNow(record, ['ask-professional']),
      tick('professional-done', dayAt(record, 1)),
      test('test-full', dayAt(record, 1), quick, said ?? Infinity),
    ],
    doneWhen: 'professional-and-test',
    done,
    callWhen: ['spots-or-slime', 'doctor-first'],
    callNow: !record.ticks.has('ask-professional'),
  };
}

/** Cloudy right after granules, soda or calcium: what was added has not dissolved. */
function waitADay(record: SituationRecord, until: number): Way {
  const done = settled(record, until);
  return {
    branch: 'wait-a-day',
    lead: hold,
    stayOut: !done,
    headline: done ? 'done' : 'wait-a-day',
    cautions: ['nobody-in-cloudy', 'nothing-of-ours'],
    reasons: [],
    steps: [
      ...ticksNow(record, ['pump-day-and-night']),
      test('test-next-day', until, quick),
      drainStep(until, record.pool.timeZone),
      ...secondTest(record, until),
    ],
    doneWhen: 'clear-after-a-day',
    done,
    callWhen,
    callNow: false,
  };
}

function treat(record: SituationRecord): Way {
  if (clearedAt(record) !== null) return settling(record);
  const stabilizer = newest(record, 'cyanuricAcid');
  if (stabilizer && stabilizer.value > clearingRules.stabilizer) return waterFirst(stabilizer.value, record);

  const evenings = eveningsOf(record);
  const last = record.mornings.at(-1);
  const readSince = evenings.length === 0 || (last !== undefined && last.day > evenings.at(-1)!);
  const goodBefore = readSince && last?.inARow === 1;
  const allGiven = evenings.length >= clearingRules.evenings;
  // A good morning is progress: the second one may follow without another evening.
  const usedUp = allGiven && readSince && !goodBefore;
  const freshSince = record.openedAt - freshTest.value * HOUR;
  const tested = since(record, freshSince).some(({ values }) => quick.every((each) => values[each] !== undefined));
  const pH = newest(record, 'pH');
  const sour = pH !== null && pH.value < limits.pHRangeLow.value;
  const pHFirst = evenings.length === 0 && pH !== null && pH.value > clearingRules.pH;
  const treats = tested && readSince && !allGiven;
  const steps = [
    ...ticksNow(record, ['pump-day-and-night', 'leaves-and-brush']),
    ...(tested && evenings.length === 0 ? [] : [test('test-before-dose', record.openedAt, quick, freshSince)]),
    tick('clean-filter', dayAt(record, 1)),
    tick('brush-again', dayAt(record, 2, '11:00')),
    ...evenings.flatMap((day) => morningSteps(morningAfter(day, record.pool.timeZone), record.pool.timeZone)),
  ];
  return {
    branch: usedUp ? 'professional' : pHFirst || sour ? 'pH-first' : 'treatment-evenings',
    lead: !treats
      ? hold
      : sour
        ? // The plan of an ordinary week brings pH up, and chlorine to its lowest level meanwhile.
          follow
        : {
            kind: 'treat',
            treatment: {
              kind: 'clearing',
              aim: { to: clearingRules.freeChlorine },
              evening: 'treatment',
              ...(evenings.length === 0 ? { pHFirst: clearingRules.pH } : {}),
            },
          },
    stayOut: true,
    headline: usedUp ? 'ask-professional' : goodBefore ? 'out-one-good-morning' : 'out-clearing',
    cautions: pHFirst || sour ? [...cautions, 'acid-alone'] : cautions,
    reasons: [
      stabilizer
        ? { code: 'stabilizer-under', stabilizer: stabilizer.value, limit: clearingRules.stabilizer }
        : { code: 'stabilizer-unknown' },
      ...(pHFirst || sour ? [{ code: 'pH-first', pH: pH.value } as const] : []),
      ...(pH === null ? [{ code: 'pH-unknown' } as const] : []),
      allGiven
        ? { code: 'evenings-used-up', most: clearingRules.evenings }
        : { code: 'evening-of', evening: evenings.length + 1, most: clearingRules.evenings },
    ],
    steps,
    doneWhen: 'two-mornings-and-two-tests',
    done: false,
    callWhen,
    callNow: usedUp,
  };
}

/** When two good mornings in a row had cleared the water [ms]; null where it has turned since, or not yet. */
function clearedAt({ mornings, readings }: SituationRecord): number | null {
  const turned = readings.findLast(({ look }) => look !== 'clear')?.takenAt ?? -Infinity;
  const second = mornings.find(
    ({ inARow, takenAt }) => inARow >= clearingRules.mornings && takenAt !== null && Date.parse(takenAt) > turned,
  );
  return second?.takenAt ? Date.parse(second.takenAt) : null;
}

/** The water no longer uses more than it should; chlorine comes down by itself until two tests are in range. */
function settling(record: SituationRecord): Way {
  const from = clearedAt(record) ?? record.openedAt;
  const done = twoInRange(record, from);
  return {
    branch: 'settling',
    lead: follow,
    stayOut: !done,
    headline: done ? 'done' : 'out-settling',
    cautions,
    reasons: [],
    steps: [
      ...eveningsOf(record).flatMap((day) =>
        morningSteps(morningAfter(day, record.pool.timeZone), record.pool.timeZone),
      ),
      ...secondTest(record, from),
    ],
    doneWhen: 'two-mornings-and-two-tests',
    done,
    callWhen,
    callNow: false,
  };
}

function waterFirst(stabilizer: number, record: SituationRecord): Way {
  // Nobody has said what the ground is like: whoever knows the shell is asked before any water goes.
  const ask = ticksNow(record, ['ask-before-lowering']);
  const replacing = replacingSteps('cyanuricAcid', stabilizer, clearingRules.stabilizer, record);
  const steps = allTicked(record, ask) ? [...ask, ...replacing] : ask;
  return {
    branch: 'water-first',
    lead: hold,
    stayOut: true,
    headline: !allTicked(record, ask) ? 'ask-professional' : allTicked(record, steps) ? 'test-next' : 'replace-water',
    cautions: ['nobody-in-cloudy', 'shell-can-float', 'pump-before-skimmer', 'outlet', 'nothing-of-ours'],
    reasons: [
      { code: 'stabilizer-over', stabilizer, limit: clearingRules.stabilizer },
      ...replacingReason('cyanuricAcid', stabilizer, clearingRules.stabilizer, record),
    ],
    steps,
    doneWhen: 'two-mornings-and-two-tests',
    done: false,
    callWhen: ['ground-water', 'level-falls', ...callWhen],
    callNow: false,
  };
}

/** The household days on whose evening a fast dose went in. */
function eveningsOf(record: SituationRecord): string[] {
  return [...new Set(fastDoses(record).map(({ at }) => dayOf(at, record.pool.timeZone)))];
}

/** The test that is still missing: one in range, or the one at least 12 h after it. */
function secondTest(record: SituationRecord, from: number): Asked[] {
  const first = goodInARow(record, from)[0]?.takenAt;
  const apart = clearingRules.hoursBetweenTests * HOUR;
  if (first !== undefined) return [test('test-before-swim', first + apart, quick, first + apart)];
  const last = record.readings.at(-1)?.takenAt ?? from;
  return [test('test-before-swim', last + apart, quick, last + 1)];
}

/** The tests in range since the last one that was not. */
function goodInARow(record: SituationRecord, from: number): Taken[] {
  const taken = since(record, from).filter(({ values }) => quick.every((each) => values[each] !== undefined));
  return taken.slice(taken.findLastIndex((each) => each.look !== 'clear' || !inRange(each, record)) + 1);
}

/** Clear, and chlorine and pH in range twice, at least 12 h apart, with nothing out of range between. */
function twoInRange(record: SituationRecord, from: number): boolean {
  const good = goodInARow(record, from);
  const [first, last] = [good[0], good.at(-1)];
  return !!first && !!last && last.takenAt - first.takenAt >= clearingRules.hoursBetweenTests * HOUR;
}

function settled(record: SituationRecord, from: number): boolean {
  const seen = [...record.ticks.keys()].some((step) => step.startsWith('drain-seen-'));
  return seen && twoInRange(record, from);
}
