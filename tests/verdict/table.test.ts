import { describe, expect, it } from 'vitest';
import { swimVerdict, type SwimReasonCode, type SwimState, type SwimVerdictInput } from '@/lib/verdict';
import { swimReasons } from '@/lib/verdict/codes';
import { good, HOUR, now, takenAt, withOpen, withOutlook, withoutOutlook, withReadings, withSince } from './inputs';

const two = { codeMinimum: 2, lowestLevel: 2.2, swimLimit: 4 };
const old = now - 48 * HOUR - 1;

/** care.md 2, row by row: what is wrong, the state, and the code that says so. */
const table: [string, SwimVerdictInput, SwimState, SwimReasonCode][] = [
  ['chlorine under 2, stabilized', withOutlook({ p10: 1.5, p50: 1.9 }), 'stay-out', 'chlorine-under-code-minimum'],
  [
    'chlorine under 1, no stabilizer',
    { ...withOutlook({ p10: 0.6, p50: 0.9, lowestLevel: 1 }), limits: { ...two, codeMinimum: 1 } },
    'stay-out',
    'chlorine-under-code-minimum',
  ],
  ['chlorine over 10', withOutlook({ p50: 10.1, p90: 12, swimLimit: 10 }), 'stay-out', 'chlorine-over-maximum'],
  ['pH under 7.0', withOutlook({ pH: 6.9 }), 'stay-out', 'ph-too-low'],
  ['pH over 8.0', withOutlook({ pH: 8.1 }), 'stay-out', 'ph-too-high'],
  ['cloudy', withOpen({ cloudy: true }), 'stay-out', 'water-cloudy'],
  ['green', withOpen({ green: true }), 'stay-out', 'water-green'],
  ['accident', withOpen({ accident: true }), 'stay-out', 'accident-open'],
  ['drain cover', withOpen({ drainCoverBroken: true }), 'stay-out', 'drain-cover-broken'],
  ['another situation', withOpen({ situationOpen: true }), 'stay-out', 'situation-open'],
  ['a tingle', withOpen({ electricitySuspected: true }), 'stay-out', 'electricity-suspected'],
  ['double dose', withOpen({ suspectedDoubleDose: true }), 'stay-out', 'suspected-double-dose'],
  ['a dose just given', { ...good, waits: [{ from: now - HOUR, until: now + HOUR }] }, 'wait', 'dose-waiting-time'],
  ['middle over the swim limit', withOutlook({ p50: 4.1, p90: 5 }), 'wait', 'chlorine-over-swim-limit'],
  ['middle under the lowest level', withOutlook({ p10: 2, p50: 2.1 }), 'wait', 'chlorine-under-lowest-level'],
  ['pH under 7.2', withOutlook({ pH: 7.1 }), 'wait', 'ph-below-range'],
  ['pH over 7.8', withOutlook({ pH: 7.9 }), 'wait', 'ph-above-range'],
  [
    'combined chlorine over 0.4',
    withReadings({ combinedChlorine: { value: 0.5, takenAt: old } }),
    'wait',
    'combined-chlorine-high',
  ],
  ['old chlorine', withReadings({ freeChlorine: { value: 3, takenAt: old } }), 'test-first', 'chlorine-reading-old'],
  ['old pH', withReadings({ pH: { value: 7.5, takenAt: old } }), 'test-first', 'ph-reading-old'],
  ['no chlorine', { ...good, readings: { pH: { value: 7.5, takenAt } } }, 'test-first', 'chlorine-not-known'],
  ['no pH', { ...good, readings: { freeChlorine: { value: 3, takenAt } } }, 'test-first', 'ph-not-known'],
  ['low edge', withOutlook({ p10: 1.9 }), 'test-first', 'low-edge-under-code-minimum'],
  ['high edge', withOutlook({ p90: 10.1 }), 'test-first', 'high-edge-over-maximum'],
  ['false zero', withOpen({ falseZero: true }), 'test-first', 'false-zero-open'],
  ['rain', withSince({ rainMillimetres: 10.1 }), 'test-first', 'much-rain'],
  ['storm', withSince({ storm: true }), 'test-first', 'storm'],
  ['swimmers', withSince({ swimmerHoursInADay: 19 }), 'test-first', 'many-swimmers'],
  ['pump', withSince({ pumpFailure: true }), 'test-first', 'pump-failure'],
  ['open dose', withSince({ dueDoseOpen: true }), 'test-first', 'due-dose-open'],
  ['doubtful tick', withSince({ doubtfulTick: true }), 'test-first', 'doubtful-tick'],
  ['a situation ended early', withSince({ situationEndedEarly: true }), 'test-first', 'situation-ended-early'],
  ['cover', withSince({ coverOffAfterAWeek: true }), 'test-first', 'cover-off-after-a-week'],
  ['no outlook', withoutOutlook(good), 'test-first', 'no-outlook'],
];

describe('care.md 2, row by row', () => {
  it('says fine when there is nothing to say', () => {
    expect(swimVerdict(good)).toMatchObject({ state: 'fine', reasons: [], adviseDailyCheck: false });
  });

  it.each(table)('%s', (_, input, state, code) => {
    const verdict = swimVerdict(input);
    expect(verdict.state).toBe(state);
    expect(verdict.reasons.map((reason) => reason.code)).toContain(code);
  });

  it('has a row for every code of the closed list', () => {
    expect(new Set(table.map((row) => row[3]))).toEqual(new Set(Object.keys(swimReasons)));
  });
});

describe('the worst one wins', () => {
  const wait = { waits: [{ from: now - HOUR, until: now + HOUR }] };
  it('stay out before wait before test first, and every reason is listed, worst first', () => {
    const all = { ...withSince({ storm: true, rainMillimetres: 30 }), ...wait, open: { ...good.open, green: true } };
    expect(swimVerdict(all).state).toBe('stay-out');
    expect(swimVerdict(all).reasons).toEqual([
      { code: 'water-green' },
      { code: 'dose-waiting-time', until: now + HOUR },
      { code: 'much-rain', value: 30, limit: 10 },
      { code: 'storm' },
    ]);
    expect(swimVerdict({ ...withSince({ storm: true }), ...wait }).state).toBe('wait');
    expect(swimVerdict({ ...withOpen({ cloudy: true }), ...wait }).state).toBe('stay-out');
  });

  it('gives stay out and test first no end', () => {
    expect(swimVerdict(withOpen({ green: true }))).not.toHaveProperty('until');
    expect(swimVerdict(withSince({ storm: true }))).not.toHaveProperty('until');
  });
});

describe('exactly at a limit the limit is kept', () => {
  it.each<[string, SwimVerdictInput]>([
    ['chlorine at the code minimum, low edge too', withOutlook({ p10: 2, p50: 2.2 })],
    ['chlorine at the lowest level', withOutlook({ p50: 2.2 })],
    ['chlorine at the swim limit', withOutlook({ p50: 4, p90: 5 })],
    ['chlorine at 10', withOutlook({ p50: 10, p90: 10, swimLimit: 10 })],
    ['pH at 7.2', withOutlook({ pH: 7.2 })],
    ['pH at 7.8', withOutlook({ pH: 7.8 })],
    ['combined chlorine at 0.4', withReadings({ combinedChlorine: { value: 0.4, takenAt } })],
    ['10 mm of rain', withSince({ rainMillimetres: 10 })],
    ['one swimmer-hour for 4 m3', { ...withSince({ swimmerHoursInADay: 18 }), volume: 72 }],
    ['the end of a waiting time', { ...good, waits: [{ from: now - 4 * HOUR, until: now }] }],
    [
      'readings of exactly 48 hours',
      {
        ...withOutlook({}, now - 48 * HOUR),
        readings: {
          freeChlorine: { value: 3, takenAt: now - 48 * HOUR },
          pH: { value: 7.5, takenAt: now - 48 * HOUR },
        },
      },
    ],
  ])('%s', (_, input) => {
    expect(swimVerdict(input)).toMatchObject({ state: 'fine', reasons: [] });
  });

  it('pH at 7.0 and 8.0 waits and does not send anybody out', () => {
    expect(swimVerdict(withOutlook({ pH: 7 })).state).toBe('wait');
    expect(swimVerdict(withOutlook({ pH: 8 })).state).toBe('wait');
  });

  it('chlorine at the code minimum is not under it', () => {
    const codes = swimVerdict(withOutlook({ p10: 2, p50: 2 })).reasons.map(({ code }) => code);
    expect(codes).toEqual(['chlorine-under-lowest-level']);
  });

  it('a waiting time begins with its first instant', () => {
    expect(swimVerdict({ ...good, waits: [{ from: now, until: now + HOUR }] }).state).toBe('wait');
  });
});

describe('the reading itself', () => {
  const measured = (value: number, pH = 7.5, at = now) => ({
    ...withOutlook({}, at),
    readings: { freeChlorine: { value, takenAt: at }, pH: { value: pH, takenAt: at } },
  });

  it('counts beside the outlook in its first hour: the line after saving agrees with the number entered', () => {
    expect(swimVerdict(measured(1.9))).toMatchObject({
      state: 'stay-out',
      reasons: [
        { code: 'chlorine-under-code-minimum', value: 1.9, limit: 2, measured: true },
        { code: 'chlorine-under-lowest-level', value: 1.9, limit: 2.2, measured: true },
      ],
    });
    expect(swimVerdict(measured(3, 7.9)).reasons).toEqual([
      { code: 'ph-above-range', value: 7.9, limit: 7.8, measured: true },
    ]);
    expect(swimVerdict(measured(1.9, 7.5, now - HOUR)).state).toBe('stay-out');
    expect(swimVerdict(measured(1.9, 7.5, now - HOUR - 1)).state).toBe('fine');
  });

  it('counts as long as it is valid where there is no outlook', () => {
    const at = now - 40 * HOUR;
    const low = withoutOutlook(measured(0.5, 7.5, at));
    expect(swimVerdict(low).state).toBe('stay-out');
    const stale = withoutOutlook(measured(0.5, 7.5, old));
    expect(swimVerdict(stale).state).toBe('test-first');
  });

  it('ignores a pH that was read together with chlorine over 10', () => {
    const verdict = swimVerdict({
      ...measured(12, 6.5),
      projection: withOutlook({ p50: 9, p90: 10 }, now).projection!,
    });
    expect(verdict.reasons.map(({ code }) => code)).not.toContain('ph-too-low');
    expect(verdict.reasons.map(({ code }) => code)).toContain('ph-not-known');
    expect(verdict.state).toBe('stay-out');
  });

  it('does not trust a reading from the future', () => {
    const verdict = swimVerdict(withReadings({ pH: { value: 7.5, takenAt: now + 2 * HOUR } }));
    expect(verdict.reasons.map(({ code }) => code)).toContain('ph-not-known');
  });
});

describe('numbers that are none never read as fine', () => {
  const broken: [string, SwimVerdictInput][] = [
    ['low edge', withOutlook({ p10: Number.NaN })],
    ['middle', withOutlook({ p50: Number.NaN })],
    ['high edge', withOutlook({ p90: Number.NaN })],
    ['lowest level', withOutlook({ lowestLevel: Number.NaN })],
    ['swim limit', withOutlook({ swimLimit: Number.NaN })],
    ['pH', withOutlook({ pH: Number.NaN })],
    ['measured chlorine', withReadings({ freeChlorine: { value: Number.NaN, takenAt } })],
    ['age of the pH', withReadings({ pH: { value: 7.5, takenAt: Number.NaN } })],
    ['combined chlorine', withReadings({ combinedChlorine: { value: Number.NaN, takenAt } })],
    ['code minimum', { ...good, limits: { ...good.limits, codeMinimum: Number.NaN } }],
    ['volume', { ...good, volume: Number.NaN }],
    ['rain', withSince({ rainMillimetres: Number.NaN })],
    ['swimmers', withSince({ swimmerHoursInADay: Number.NaN })],
    ['end of a waiting time', { ...good, waits: [{ from: now - HOUR, until: Number.NaN }] }],
    ['hours', { ...good, projection: { ...good.projection!, hours: [Number.NaN] } }],
    ['no hours at all', { ...good, projection: { ...good.projection!, hours: [] } }],
    ['a short series', { ...good, projection: { ...good.projection!, pH: { p50: [7.5] } } }],
  ];
  it.each(broken)('%s', (_, input) => expect(swimVerdict(input).state).not.toBe('fine'));

  it('refuses a now that is none', () => {
    expect(() => swimVerdict({ ...good, now: Number.NaN })).toThrow('is not an instant');
  });
});
