import type { AnswersOf } from '@/lib/schemas/situation';
import type { StepCode } from '../codes';
import { since, type SituationRecord } from '../record';
import { allTicked, dayAt, follow, hold, quick, test, tick, ticksNow, type Way } from '../way';

const MINUTE = 60_000;

/** The drain cover is loose, broken or missing: it can hold somebody under water. */
export function drainCover(record: SituationRecord): Way {
  const done = record.ticks.has('cover-replaced');
  return {
    branch: 'pump-off',
    lead: hold,
    stayOut: !done,
    headline: done ? 'done' : 'out-drain-cover',
    cautions: ['drain-holds'],
    reasons: [],
    steps: [
      ...ticksNow(record, ['everyone-out', 'pump-off', 'keep-out-sign']),
      tick('cover-replaced', dayAt(record, 1)),
    ],
    doneWhen: 'cover-replaced',
    done,
    callWhen: ['drain-cover'],
    callNow: !done,
  };
}

/** A storm: nothing is dosed, nobody is in or near the water; then the pool is looked over and tested. */
export function storm({ pumpRoom, shock }: AnswersOf<'storm'>, record: SituationRecord): Way {
  const over = record.ticks.get('thunder-over');
  const electrician = pumpRoom === 'wet' || shock === 'yes';
  const codes: StepCode[] = [
    'thunder-over',
    ...(electrician ? (['electrician'] as const) : []),
    'skim',
    'level',
    'baskets',
    ...(electrician ? [] : (['earth-leakage-test'] as const)),
  ];
  const ticks = ticksNow(record, codes);
  const tested = over !== undefined && since(record, over).some(hasQuick);
  const done = allTicked(record, ticks) && tested;
  const held = over === undefined || (electrician && !record.ticks.has('electrician'));
  return {
    branch: electrician ? 'electrician-first' : 'look-round',
    lead: hold,
    stayOut: held,
    headline: done ? 'done' : allTicked(record, ticks) ? 'test-next' : 'steps-next',
    cautions: [
      'thunder',
      ...(pumpRoom === 'wet' ? (['wet-pump-room'] as const) : []),
      ...(shock === 'yes' ? (['shock', 'no-metal-ladder'] as const) : []),
    ],
    reasons: [],
    steps: [...ticks, test('test-now', record.openedAt, quick, over ?? Infinity)],
    doneWhen: 'ticks-and-test',
    done,
    callWhen: ['electrician', 'tingle'],
    callNow: electrician && !record.ticks.has('electrician'),
  };
}

/** How long a cover is off before the first swim after a long time. */
const AIRING = 30 * MINUTE;

/** A cover that comes off. */
export function cover({ covered, floaterUnder }: AnswersOf<'cover'>, record: SituationRecord): Way {
  const ticks = ticksNow(record, [...(floaterUnder === 'yes' ? (['floater-out'] as const) : []), 'air-cover']);
  const aired = record.ticks.get('air-cover');
  const tested = aired !== undefined && since(record, aired + AIRING).some(hasQuick);
  const long = covered === 'week-or-more';
  const done = allTicked(record, ticks) && (tested || !long);
  return {
    branch: long ? 'air-and-test' : 'air-first',
    lead: follow,
    stayOut: long && !done,
    headline: done ? 'done' : aired === undefined ? 'steps-next' : 'test-next',
    cautions: ['half-open-cover', ...(floaterUnder === 'yes' ? (['no-floater-under-cover'] as const) : [])],
    reasons: [],
    steps: [
      ...ticks,
      ...(long
        ? [test('test-before-swim', (aired ?? record.openedAt) + AIRING, quick, (aired ?? Infinity) + AIRING)]
        : []),
    ],
    doneWhen: 'ticks-and-test',
    done,
    callWhen: ['still-low-next-day'],
    callNow: false,
  };
}

/** A stain, or metals: nothing is planned against it here. */
export function stain(record: SituationRecord): Way {
  const said = record.ticks.get('professional-done');
  const done = said !== undefined && since(record, said).some(hasQuick);
  return {
    branch: 'professional',
    lead: follow,
    stayOut: false,
    headline: done ? 'done' : 'ask-professional',
    cautions: ['metals', 'nothing-of-ours'],
    reasons: [],
    steps: [
      ...ticksNow(record, ['ask-professional', 'metal-test']),
      tick('professional-done', dayAt(record, 3)),
      test('test-full', dayAt(record, 3), quick, said ?? Infinity),
    ],
    doneWhen: 'professional-and-test',
    done,
    callWhen: ['metals'],
    callNow: !record.ticks.has('ask-professional'),
  };
}

function hasQuick({ values }: { values: Partial<Record<string, number>> }): boolean {
  return quick.every((each) => values[each] !== undefined);
}
