import { describe, expect, it } from 'vitest';
import { hoursInDay } from '@/lib/calendar/household-day';
import { nextPart, spokenPart } from '@/lib/calendar/part-of-day';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import { swimVerdict, type SwimVerdictInput } from '@/lib/verdict';
import { good, HOUR, type Levels, now, outlook, takenAt, withOutlook, withoutOutlook, withReadings } from './inputs';

const hoursFromNow = (input: SwimVerdictInput) => ((swimVerdict(input).until ?? Number.NaN) - input.now) / HOUR;
const ends = (input: SwimVerdictInput) => swimVerdict(input).then?.reasons.map(({ code }) => code);

describe('fine until the first limit ahead', () => {
  it('ends when the readings grow older than 48 hours, if nothing comes before', () => {
    expect(hoursFromNow(good)).toBe(47);
    expect(swimVerdict(good).then?.state).toBe('test-first');
    expect(ends(good)).toEqual(['chlorine-reading-old', 'ph-reading-old']);
  });

  it('takes the older of the two readings', () => {
    const input = withReadings({ pH: { value: 7.5, takenAt: takenAt - 10 * HOUR } });
    expect(hoursFromNow(input)).toBe(37);
    expect(ends(input)).toEqual(['ph-reading-old']);
  });

  it.each<[string, Levels, number, string]>([
    // The outlook starts an hour ago: hour 2 of it is an hour from now. Crossings lie between the hours.
    ['low edge falls through 2', { p10: [2.4, 2.3, 2.1, 1.9] }, 1.5, 'low-edge-under-code-minimum'],
    ['middle falls through 2.2', { p50: [3, 3, 3, 2, 2] }, 1.8, 'chlorine-under-lowest-level'],
    ['the lowest level rises to the middle', { lowestLevel: [2, 2, 2, 4] }, 1.5, 'chlorine-under-lowest-level'],
    ['middle rises through 4', { p50: [3, 3, 3, 5], p90: 6 }, 1.5, 'chlorine-over-swim-limit'],
    ['high edge rises through 10', { p90: [8, 8, 8, 8, 12] }, 2.5, 'high-edge-over-maximum'],
    ['pH rises through 7.8', { pH: [7.7, 7.7, 7.7, 7.9] }, 1.5, 'ph-above-range'],
    ['pH falls through 7.2', { pH: [7.3, 7.3, 7.3, 7.1] }, 1.5, 'ph-below-range'],
  ])('%s', (_, levels, hours, code) => {
    const input = withOutlook(levels);
    expect(swimVerdict(input).state).toBe('fine');
    expect(hoursFromNow(input)).toBeCloseTo(hours, 6);
    expect(ends(input)).toEqual([code]);
  });

  it('ends with the next dose', () => {
    const input = { ...good, waits: [{ from: now + 24 * HOUR, until: now + 28 * HOUR }] };
    expect(hoursFromNow(input)).toBe(24);
    expect(swimVerdict(input).then).toEqual({
      state: 'wait',
      reasons: [{ code: 'dose-waiting-time', until: now + 28 * HOUR }],
    });
  });

  it('ends with the outlook, which is never extended', () => {
    const input = withOutlook({}, takenAt, 11);
    expect(hoursFromNow(input)).toBe(9);
    expect(ends(input)).toEqual(['no-outlook']);
  });

  it('ends when the expected rain since the reading passes 10 mm', () => {
    const rain = [{ from: now, until: now + 10 * HOUR, amount: 12 }];
    const input = { ...good, ahead: { rain }, sinceReading: { ...good.sinceReading, rainMillimetres: 4 } };
    expect(hoursFromNow(input)).toBeCloseTo(5, 6);
    expect(ends(input)).toEqual(['much-rain']);
  });

  it('counts only the part of the rain that is still to come', () => {
    const rain = [{ from: now - 10 * HOUR, until: now + 10 * HOUR, amount: 18 }];
    expect(hoursFromNow({ ...good, ahead: { rain } })).toBe(47);
  });

  it('ends when the expected swimmers of one day are too many for the water', () => {
    const party = { from: now + 10 * HOUR, until: now + 20 * HOUR, amount: 20 };
    const calm = { from: now + 34 * HOUR, until: now + 44 * HOUR, amount: 10 };
    const input = { ...good, volume: 60, ahead: { swimmerHours: [party, calm] } };
    expect(hoursFromNow(input)).toBeCloseTo(17.5, 6);
    expect(ends(input)).toEqual(['many-swimmers']);
    expect(hoursFromNow({ ...input, ahead: { swimmerHours: [calm, { ...calm, amount: 15 }] } })).toBe(47);
  });

  it('takes the first of several', () => {
    const input = {
      ...withOutlook({ pH: [7.7, 7.7, 7.7, 7.9] }),
      waits: [{ from: now + HOUR, until: now + 2 * HOUR }],
    };
    expect(hoursFromNow(input)).toBe(1);
    expect(hoursFromNow({ ...input, waits: [{ from: now + 2.5 * HOUR, until: now + 3 * HOUR }] })).toBeCloseTo(1.5, 6);
  });
});

describe('an hour in which a dose goes in', () => {
  // Outlook hours are full hours; the dose goes in 40 minutes after one of them and is seen in the next value.
  const dose = now + (40 / 60) * HOUR;
  const levels = { p10: [2, 2.1, 3.5], p50: [2.3, 2.1, 4.5, 3.9], p90: [2.6, 2.6, 5] };
  const input = { ...withOutlook(levels), waits: [{ from: dose, until: dose + 2 * HOUR }] };

  it('is not announced before it is in the water', () => {
    const justBefore = swimVerdict({ ...input, now: dose - 1 });
    expect(justBefore.reasons.map(({ code }) => code)).toEqual(['chlorine-under-lowest-level']);
    const justAfter = swimVerdict({ ...input, now: dose });
    expect(justAfter.reasons).toEqual([
      { code: 'dose-waiting-time', until: dose + 2 * HOUR },
      { code: 'chlorine-over-swim-limit', value: 4.5, limit: 4, measured: false },
    ]);
  });

  it('and a dose on the full hour belongs to that hour: straight lines from there on', () => {
    const onTheHour = { ...input, waits: [{ from: now + HOUR, until: now + 1.25 * HOUR }] };
    const justBefore = swimVerdict({ ...onTheHour, now: now + HOUR - 1 });
    expect(justBefore.reasons.map(({ code }) => code)).toEqual(['chlorine-under-lowest-level']);
    const later = swimVerdict({ ...onTheHour, now: now + 1.5 * HOUR });
    expect(later.reasons).toMatchObject([{ code: 'chlorine-over-swim-limit' }]);
    expect(later.reasons[0]?.value).toBeCloseTo(4.2, 9);
  });
});

describe('wait until', () => {
  it('the waiting time of the last dose is over', () => {
    const waits = [
      { from: now - HOUR, until: now + 2 * HOUR },
      { from: now, until: now + 3 * HOUR },
    ];
    expect(hoursFromNow({ ...good, waits })).toBe(3);
    expect(swimVerdict({ ...good, waits }).then).toEqual({ state: 'fine', reasons: [] });
  });

  it('the middle has come down to the swim limit, when that takes longer', () => {
    const input = {
      ...withOutlook({ p50: [5, 5, 4.6, 4.2, 3.8], p90: 6 }),
      waits: [{ from: now - HOUR, until: now + HOUR }],
    };
    expect(hoursFromNow(input)).toBeCloseTo(2.5, 6);
  });

  it('through stay out as well: the water gets worse before it gets better', () => {
    const input = {
      ...withOutlook({ p10: 2, p50: [2.1, 2.1, 1.9, 1.9, 3], p90: 4, lowestLevel: 2.2 }),
      waits: [{ from: now + 2.5 * HOUR, until: now + 4 * HOUR }],
    };
    expect(swimVerdict(input).state).toBe('wait');
    expect(hoursFromNow(input)).toBe(4);
  });

  it('and then a test, when the readings are too old by then', () => {
    const at = now - 47 * HOUR;
    const input: SwimVerdictInput = {
      ...withOutlook({}, at),
      readings: { freeChlorine: { value: 3, takenAt: at }, pH: { value: 7.5, takenAt: at } },
      waits: [{ from: now - HOUR, until: now + 3 * HOUR }],
    };
    expect(hoursFromNow(input)).toBe(3);
    expect(swimVerdict(input).then?.state).toBe('test-first');
  });

  it('the end of a waiting time, also without an outlook', () => {
    const input = { ...withoutOutlook(good), waits: [{ from: now - HOUR, until: now + HOUR }] };
    expect(hoursFromNow(input)).toBe(1);
    expect(swimVerdict(input).then?.state).toBe('test-first');
  });

  it('nobody knows when, while it is not seen to get better', () => {
    expect(swimVerdict(withOutlook({ pH: 7.9 }))).not.toHaveProperty('until');
    const combined = withReadings({ combinedChlorine: { value: 0.6, takenAt } });
    expect(swimVerdict(combined)).not.toHaveProperty('until');
  });
});

describe('the outlook has to know the newest reading', () => {
  it('is none when a newer reading is not in it', () => {
    const input = { ...good, readings: { ...good.readings, freeChlorine: { value: 3, takenAt: takenAt + 120_000 } } };
    expect(swimVerdict(input).reasons.map(({ code }) => code)).toEqual(['no-outlook']);
  });
  it('may have been written in whole seconds', () => {
    const input = withReadings({ freeChlorine: { value: 3, takenAt: takenAt + 999 } });
    expect(swimVerdict(input).state).toBe('fine');
  });
  it('is none before it starts and after it ends', () => {
    const stateAt = (instant: number) => swimVerdict({ ...good, now: instant }).reasons.map(({ code }) => code);
    expect(stateAt(takenAt)).toEqual([]);
    expect(stateAt(takenAt - 2 * 60_000)).toEqual(['no-outlook']);
    expect(stateAt(takenAt + 168 * HOUR)).not.toContain('no-outlook');
    expect(stateAt(takenAt + 168 * HOUR + 1)).toContain('no-outlook');
  });
});

describe('daily check', () => {
  it.each([
    [23.99, true, false],
    [24, true, true],
    [30, false, false],
  ])('a reading of %d h, swim day %s: %s', (age, swimDay, advise) => {
    const at = now - age * HOUR;
    const input: SwimVerdictInput = {
      ...withOutlook({}, at),
      swimDay,
      readings: { freeChlorine: { value: 3, takenAt: at }, pH: { value: 7.5, takenAt: at } },
    };
    expect(swimVerdict(input)).toMatchObject({ state: 'fine', adviseDailyCheck: advise });
  });

  it('goes by the older of the two readings', () => {
    const chlorine = { value: 3, takenAt };
    const pH = { value: 7.5, takenAt: now - 30 * HOUR };
    expect(swimVerdict({ ...withReadings({ freeChlorine: chlorine, pH }), swimDay: true }).adviseDailyCheck).toBe(true);
  });

  it('is said only under a fine', () => {
    const at = now - 30 * HOUR;
    const input: SwimVerdictInput = {
      ...withOutlook({ pH: 7.9 }, at),
      swimDay: true,
      readings: { freeChlorine: { value: 3, takenAt: at }, pH: { value: 7.5, takenAt: at } },
    };
    expect(swimVerdict(input)).toMatchObject({ state: 'wait', adviseDailyCheck: false });
  });
});

describe('over a night in which clocks change', () => {
  const zone = 'America/New_York';
  const tested = (iso: string): SwimVerdictInput => {
    const at = Date.parse(iso);
    return {
      ...good,
      now: at,
      projection: outlook({}, at),
      readings: { freeChlorine: { value: 3, takenAt: at }, pH: { value: 7.5, takenAt: at } },
    };
  };

  it.each([
    // 48 hours are 48 hours: the wall clock shows one more or one less.
    ['2026-03-07T19:00:00-05:00', '2026-03-08', 23, '2026-03-09T20:00:00-04:00', '2026-03-09', 'evening'],
    ['2026-10-31T19:00:00-04:00', '2026-11-01', 25, '2026-11-02T18:00:00-05:00', '2026-11-02', 'evening'],
    ['2026-10-31T18:00:00-04:00', '2026-11-01', 25, '2026-11-02T17:00:00-05:00', '2026-11-02', 'afternoon'],
  ])('from %s', (from, changeDay, hours, until, day, part) => {
    expect(hoursInDay(changeDay, zone)).toBe(hours);
    const verdict = swimVerdict(tested(from));
    expect(verdict.state).toBe('fine');
    expect(toOffsetIso(verdict.until as number, zone)).toBe(until);
    expect(spokenPart(verdict.until as number, zone)).toEqual({ day, part });
  });

  it.each([
    ['2026-03-08T00:30:00-05:00', '2026-03-08T05:30:00-04:00'],
    ['2026-11-01T00:30:00-04:00', '2026-11-01T03:30:00-05:00'],
  ])('a dose at %s keeps everybody out for four real hours, in words until the morning', (dosed, over) => {
    const input = tested(dosed);
    const verdict = swimVerdict({ ...input, waits: [{ from: input.now, until: input.now + 4 * HOUR }] });
    expect(toOffsetIso(verdict.until as number, zone)).toBe(over);
    expect(nextPart(verdict.until as number, zone)).toMatchObject({ day: dosed.slice(0, 10), part: 'morning' });
  });
});
