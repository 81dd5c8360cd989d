import { expect } from 'vitest';
import { codeMinimum, lowestLevel } from '@/lib/standards/limits';
import { swimVerdict, type SwimState, type SwimVerdictInput } from '@/lib/verdict';
import type { SwimReasonCode } from '@/lib/verdict/codes';
import {
  good,
  HOUR,
  now,
  takenAt,
  withOpen,
  withOutlook,
  withoutOutlook,
  withReadings,
  withSince,
} from '@/tests/verdict/inputs';
import type { Row } from '../row';

const gives = (input: SwimVerdictInput, state: SwimState, code: SwimReasonCode) => {
  const verdict = swimVerdict(input);
  expect(verdict.state).toBe(state);
  expect(verdict.reasons.map((reason) => reason.code)).toContain(code);
};
const isFine = (input: SwimVerdictInput) => expect(swimVerdict(input)).toMatchObject({ state: 'fine', reasons: [] });
const readAt = (hoursAgo: number, freeChlorine: number, pH: number): SwimVerdictInput => {
  const at = now - hoursAgo * HOUR;
  const readings = { freeChlorine: { value: freeChlorine, takenAt: at }, pH: { value: pH, takenAt: at } };
  return { ...withOutlook({}, at), readings };
};
/** Wide limits, so that only the limit in question speaks. */
const wide = { p10: 0.5, p50: 3, p90: 9.9, lowestLevel: 0.5, swimLimit: 10 };
const without = { codeMinimum: 1, lowestLevel: 1, swimLimit: 10 };

/** Part 2, the table of states, row by row. */
export const swimVerdictRows: readonly Row[] = [
  [
    'worst-state-wins',
    'stay out beats wait beats test first beats fine',
    () => {
      const waiting = { waits: [{ from: now - HOUR, until: now + HOUR }] };
      const stormy = withSince({ storm: true });
      expect(swimVerdict(stormy).state).toBe('test-first');
      expect(swimVerdict({ ...stormy, ...waiting }).state).toBe('wait');
      expect(swimVerdict({ ...stormy, ...waiting, open: { ...good.open, green: true } }).state).toBe('stay-out');
      isFine(good);
    },
  ],
  [
    'at-display',
    'the same facts say something else a day later, without anybody doing anything',
    () => {
      isFine(good);
      gives({ ...good, now: takenAt + 48 * HOUR + 1 }, 'test-first', 'chlorine-reading-old');
      isFine({ ...good, waits: [{ from: now + HOUR, until: now + 5 * HOUR }] });
      gives(
        { ...good, now: now + HOUR, waits: [{ from: now + HOUR, until: now + 5 * HOUR }] },
        'wait',
        'dose-waiting-time',
      );
    },
  ],
  [
    'out-chlorine-low',
    'stay out: free chlorine under 2 in stabilized water, projected or just read',
    () => {
      gives(withOutlook({ p10: 1.5, p50: 1.99 }), 'stay-out', 'chlorine-under-code-minimum');
      gives(readAt(0, 1.99, 7.5), 'stay-out', 'chlorine-under-code-minimum');
      expect(swimVerdict(withOutlook({ p10: 2, p50: 2 })).state).not.toBe('stay-out');
    },
  ],
  [
    'out-chlorine-low',
    'stay out: free chlorine under 1 in water without stabilizer, and not under 2 there',
    () => {
      const at = (p50: number) => ({ ...withOutlook({ ...wide, p10: 1, p50 }), limits: without });
      gives(at(0.99), 'stay-out', 'chlorine-under-code-minimum');
      isFine(at(1.5));
    },
  ],
  [
    'out-chlorine-low',
    'stabilized from a reading of 10 on, or with any trichlor or dichlor; lowest level the larger of that and a twentieth',
    () => {
      expect([codeMinimum(9), codeMinimum(10), codeMinimum(0, true)]).toEqual([1, 2, 2]);
      expect([lowestLevel(0), lowestLevel(30), lowestLevel(60)]).toEqual([1, 2, 3]);
    },
  ],
  [
    'out-chlorine-high',
    'stay out: free chlorine over 10, also where the label allows 10',
    () => {
      gives({ ...withOutlook({ ...wide, p50: 10.1, p90: 12 }), limits: without }, 'stay-out', 'chlorine-over-maximum');
      gives(readAt(0, 10.1, 7.5), 'stay-out', 'chlorine-over-maximum');
    },
  ],
  [
    'out-pH',
    'stay out: pH under 7.0 or over 8.0',
    () => {
      gives(withOutlook({ pH: 6.99 }), 'stay-out', 'ph-too-low');
      gives(withOutlook({ pH: 8.01 }), 'stay-out', 'ph-too-high');
      gives(readAt(0, 3, 6.9), 'stay-out', 'ph-too-low');
      expect([7, 8].map((pH) => swimVerdict(withOutlook({ pH })).state)).toEqual(['wait', 'wait']);
    },
  ],
  [
    'out-look',
    'stay out: water cloudy or green, whatever the readings say',
    () => {
      gives(withOpen({ cloudy: true }), 'stay-out', 'water-cloudy');
      gives(withOpen({ green: true }), 'stay-out', 'water-green');
    },
  ],
  [
    'out-accident',
    'stay out: an accident is open',
    () => gives(withOpen({ accident: true }), 'stay-out', 'accident-open'),
  ],
  [
    'out-drain',
    'stay out: a drain cover is broken, and that leads',
    () => {
      const all = withOpen({ drainCoverBroken: true, green: true, accident: true });
      expect(swimVerdict(all).reasons[0]?.code).toBe('drain-cover-broken');
      gives(all, 'stay-out', 'drain-cover-broken');
    },
  ],
  [
    'out-double',
    'stay out: a double dose is suspected',
    () => gives(withOpen({ suspectedDoubleDose: true }), 'stay-out', 'suspected-double-dose'),
  ],
  [
    'wait-dose',
    'wait: inside the waiting time of a dose, from its instant to its end',
    () => {
      gives({ ...good, waits: [{ from: now, until: now + 4 * HOUR }] }, 'wait', 'dose-waiting-time');
      gives({ ...good, waits: [{ from: now - 4 * HOUR, until: now + 1 }] }, 'wait', 'dose-waiting-time');
      isFine({ ...good, waits: [{ from: now - 4 * HOUR, until: now }] });
    },
  ],
  [
    'wait-middle',
    'wait: the middle over the swim limit or under the lowest level',
    () => {
      gives(withOutlook({ p50: 4.01, p90: 5 }), 'wait', 'chlorine-over-swim-limit');
      gives(withOutlook({ p10: 2, p50: 2.19 }), 'wait', 'chlorine-under-lowest-level');
      isFine(withOutlook({ p50: 4, p90: 5 }));
      isFine(withOutlook({ p10: 2, p50: 2.2 }));
    },
  ],
  [
    'wait-pH',
    'wait: pH outside 7.2 to 7.8',
    () => {
      gives(withOutlook({ pH: 7.19 }), 'wait', 'ph-below-range');
      gives(withOutlook({ pH: 7.81 }), 'wait', 'ph-above-range');
      isFine(withOutlook({ pH: 7.2 }));
      isFine(withOutlook({ pH: 7.8 }));
    },
  ],
  [
    'wait-combined',
    'wait: combined chlorine over 0.4, until it is read lower',
    () => {
      const combined = (value: number) =>
        withReadings({ ...good.readings, combinedChlorine: { value, takenAt: takenAt - 90 * HOUR } });
      gives(combined(0.41), 'wait', 'combined-chlorine-high');
      isFine(combined(0.4));
    },
  ],
  [
    'test-old',
    'test first: chlorine or pH older than 48 h',
    () => {
      const old = { value: 3, takenAt: now - 48 * HOUR - 1 };
      gives(withReadings({ ...good.readings, freeChlorine: old }), 'test-first', 'chlorine-reading-old');
      gives(withReadings({ ...good.readings, pH: { ...old, value: 7.5 } }), 'test-first', 'ph-reading-old');
      isFine(readAt(48, 3, 7.5));
    },
  ],
  [
    'test-edges',
    'test first: low edge under the code minimum, high edge over 10',
    () => {
      gives(withOutlook({ p10: 1.99 }), 'test-first', 'low-edge-under-code-minimum');
      gives(withOutlook({ p90: 10.01 }), 'test-first', 'high-edge-over-maximum');
      isFine(withOutlook({ p10: 2, p90: 10 }));
    },
  ],
  [
    'test-rain',
    'test first: over 10 mm of rain since the reading, or a storm',
    () => {
      gives(withSince({ rainMillimetres: 10.1 }), 'test-first', 'much-rain');
      gives(withSince({ storm: true }), 'test-first', 'storm');
      isFine(withSince({ rainMillimetres: 10 }));
    },
  ],
  [
    'test-swimmers',
    'test first: more than one swimmer-hour for 4 m3 in a day',
    () => {
      gives({ ...withSince({ swimmerHoursInADay: 15.1 }), volume: 60 }, 'test-first', 'many-swimmers');
      isFine({ ...withSince({ swimmerHoursInADay: 15 }), volume: 60 });
    },
  ],
  [
    'test-failure',
    'test first: the pump or the power failed',
    () => gives(withSince({ pumpFailure: true }), 'test-first', 'pump-failure'),
  ],
  [
    'test-due',
    'test first: a dose is due, neither ticked nor skipped',
    () => gives(withSince({ dueDoseOpen: true }), 'test-first', 'due-dose-open'),
  ],
  [
    'test-doubt',
    'test first: a tick is in doubt',
    () => gives(withSince({ doubtfulTick: true }), 'test-first', 'doubtful-tick'),
  ],
  [
    'test-cover',
    'test first: the cover came off after a week',
    () => gives(withSince({ coverOffAfterAWeek: true }), 'test-first', 'cover-off-after-a-week'),
  ],
  [
    'fine',
    'fine only when nothing speaks against it, and never without readings or an outlook',
    () => {
      isFine(good);
      expect(swimVerdict({ ...good, readings: {} }).state).toBe('test-first');
      expect(swimVerdict(withoutOutlook(good)).state).toBe('test-first');
    },
  ],
  [
    'parts-of-day',
    'fine ends with whichever limit is met first',
    () => {
      const both = {
        ...withOutlook({ pH: [7.7, 7.7, 7.7, 7.9] }),
        waits: [{ from: now + HOUR, until: now + 2 * HOUR }],
      };
      expect(swimVerdict(both).until).toBe(now + HOUR);
      expect(swimVerdict({ ...both, waits: [] }).until).toBeGreaterThan(now + HOUR);
      expect(swimVerdict(good).until).toBe(takenAt + 48 * HOUR);
    },
  ],
  [
    'daily-check',
    'a Fine of 24 h or more on a swim day advises a check, and only then',
    () => {
      const aged = (hours: number, swimDay: boolean) => swimVerdict({ ...readAt(hours, 3, 7.5), swimDay });
      expect(aged(24, true)).toMatchObject({ state: 'fine', adviseDailyCheck: true });
      expect(aged(23.9, true).adviseDailyCheck).toBe(false);
      expect(aged(30, false).adviseDailyCheck).toBe(false);
    },
  ],
  [
    'zero-holds',
    'a zero that is not answered is Test first',
    () => gives(withOpen({ falseZero: true }), 'test-first', 'false-zero-open'),
  ],
  [
    'bleached-pH',
    'a pH read with free chlorine over 10 counts for nothing in the verdict',
    () => {
      const codes = swimVerdict(readAt(0, 10.1, 6.5)).reasons.map(({ code }) => code);
      expect(codes).toContain('ph-not-known');
      expect(codes).not.toContain('ph-too-low');
      expect(swimVerdict(readAt(0, 10, 6.5)).reasons.map(({ code }) => code)).toContain('ph-too-low');
    },
  ],
];
