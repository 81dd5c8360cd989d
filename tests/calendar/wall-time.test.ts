import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { addDays, startOfDay } from '@/lib/calendar/household-day';
import {
  intervalsOfDay,
  isTimeZone,
  parseInstant,
  toOffsetIso,
  wallClock,
  wallToInstant,
} from '@/lib/calendar/wall-time';
import { localByIntl, zones } from './zones';

const at = (iso: string) => Date.parse(iso);
const hours = (intervals: readonly { from: number; to: number }[]) =>
  intervals.reduce((sum, { from, to }) => sum + (to - from) / 3_600_000, 0);

describe('wall time to instant', () => {
  it.each([
    // An ordinary evening.
    ['America/New_York', '2026-07-05', '19:00', '2026-07-05T23:00:00Z', true],
    // Clocks jump from 02:00 to 03:00: moved on by the hour that is missing.
    ['America/New_York', '2026-03-08', '02:30', '2026-03-08T07:30:00Z', false],
    ['Europe/Madrid', '2026-03-29', '02:00', '2026-03-29T01:00:00Z', false],
    ['Europe/Madrid', '2026-03-29', '03:00', '2026-03-29T01:00:00Z', true],
    // 01:30 comes twice: the first one counts.
    ['America/New_York', '2026-11-01', '01:30', '2026-11-01T05:30:00Z', false],
    ['America/New_York', '2026-11-01', '02:00', '2026-11-01T07:00:00Z', true],
    ['Australia/Sydney', '2026-10-04', '02:30', '2026-10-03T16:30:00Z', false],
    ['Australia/Sydney', '2026-04-05', '02:30', '2026-04-04T15:30:00Z', false],
    // Lord Howe changes by half an hour: 02:00 to 02:30 is skipped, 01:30 to 02:00 comes twice.
    ['Australia/Lord_Howe', '2026-10-04', '02:15', '2026-10-03T15:45:00Z', false],
    ['Australia/Lord_Howe', '2026-10-04', '02:30', '2026-10-03T15:30:00Z', true],
    ['Australia/Lord_Howe', '2026-04-05', '01:45', '2026-04-04T14:45:00Z', false],
    ['Australia/Lord_Howe', '2026-04-05', '01:15', '2026-04-04T14:15:00Z', true],
  ])('%s %s %s', (zone, day, time, iso, exact) => {
    expect(wallToInstant(day, time, zone)).toEqual({ instant: at(iso), exact });
  });

  it('comes back as the same wall time wherever it is exact', () => {
    const minute = fc.integer({ min: 0, max: 1439 });
    const offset = fc.integer({ min: 0, max: 13_000 });
    fc.assert(
      fc.property(minute, offset, fc.constantFrom(...zones), (minuteOfDay, days, zone) => {
        const day = addDays('2000-06-01', days);
        const time = new Date(minuteOfDay * 60_000).toISOString().slice(11, 16);
        const { instant, exact } = wallToInstant(day, time, zone);
        fc.pre(exact);
        expect(localByIntl(instant, zone)).toBe(`${day} ${time}:00`);
      }),
      { numRuns: 1000 },
    );
  });

  it.each(['24:00', '7:00', '19:60', '', '19:40:00'])('refuses "%s" as a time of day', (time) => {
    expect(() => wallToInstant('2026-07-05', time, 'UTC')).toThrow('is not a time of day');
  });
  it('refuses what is no day and no zone', () => {
    expect(() => wallToInstant('2026-02-30', '10:00', 'UTC')).toThrow('is not a calendar day');
    expect(() => wallToInstant('2026-02-28', '10:00', 'GMT+4')).toThrow('is not a time zone');
  });
});

describe('instant to wall clock', () => {
  it('agrees with the runtime', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: Date.UTC(2000, 0, 1) / 1000, max: Date.UTC(2037, 11, 31) / 1000 }),
        fc.constantFrom(...zones),
        (second, zone) => {
          const { day, hour, minute, hourOfDay } = wallClock(second * 1000, zone);
          const local = localByIntl(second * 1000, zone);
          const [h, m, s] = local.slice(11).split(':').map(Number) as [number, number, number];
          expect({ day, hour, minute }).toEqual({ day: local.slice(0, 10), hour: h, minute: m });
          expect(hourOfDay).toBeCloseTo(h + m / 60 + s / 3600, 9);
        },
      ),
      { numRuns: 1000 },
    );
  });

  it.each([
    ['America/New_York', '2026-07-05T23:00:00Z', '2026-07-05T19:00:00-04:00'],
    ['America/New_York', '2026-12-05T23:00:00Z', '2026-12-05T18:00:00-05:00'],
    ['Asia/Kathmandu', '2026-07-05T23:00:00Z', '2026-07-06T04:45:00+05:45'],
    ['America/St_Johns', '2026-07-05T23:00:00Z', '2026-07-05T20:30:00-02:30'],
    ['UTC', '2026-07-05T23:00:00Z', '2026-07-05T23:00:00+00:00'],
  ])('%s writes its offset', (zone, iso, local) => {
    expect(toOffsetIso(at(iso), zone)).toBe(local);
    expect(parseInstant(local)).toBe(at(iso));
  });
});

describe('the moment of a change', () => {
  it('belongs to the new time, also when the hour before was asked first', () => {
    // A zone that no other test here has asked about: its stretches are looked up in this order.
    const change = at('2026-03-08T08:00:00Z');
    expect(wallClock(change - 1, 'America/Chicago').hour).toBe(1);
    expect(wallClock(change, 'America/Chicago').hour).toBe(3);
    expect(wallClock(change - 1, 'America/Chicago').hour).toBe(1);
  });
});

describe('text to instant', () => {
  it.each([
    ['2026-07-05T19:00:00-04:00', 1_783_292_400_000],
    ['2026-07-05T23:00:00Z', 1_783_292_400_000],
    ['2026-07-05T23:00:00.250Z', 1_783_292_400_250],
    ['2026-07-05T23:00Z', 1_783_292_400_000],
    ['1970-01-01T00:00:00Z', 0],
  ])('%s', (text, instant) => expect(parseInstant(text)).toBe(instant));

  it.each([
    '2026-07-05',
    '2026-07-05T19:00:00',
    '2026-02-30T19:00:00Z',
    '2026-07-05T24:00:00Z',
    '2026-07-05T19:00:00-0400',
    '2026-07-05 19:00:00Z',
    'yesterday',
    '',
  ])('"%s" is no instant', (text) => expect(parseInstant(text)).toBeUndefined());
});

describe('zone names', () => {
  it.each(['Europe/Madrid', 'America/Argentina/Ushuaia', 'UTC', 'US/Eastern'])('%s is one', (name) => {
    expect(isTimeZone(name)).toBe(true);
  });
  it.each(['GMT+4', '+04:00', 'Europe/Atlantis', '', ' Europe/Madrid'])('"%s" is none', (name) => {
    expect(isTimeZone(name)).toBe(false);
  });
});

describe('daily wall-clock intervals as instants', () => {
  const zone = 'America/New_York';

  it('gives nothing for no interval', () => {
    expect(intervalsOfDay([], '2026-07-05', zone)).toEqual([]);
  });

  it('gives an ordinary day', () => {
    expect(intervalsOfDay([{ from: '08:00', to: '16:00' }], '2026-07-05', zone)).toEqual([
      { from: at('2026-07-05T12:00:00Z'), to: at('2026-07-05T20:00:00Z') },
    ]);
  });

  it('cuts an interval over midnight into the end of one day and the start of the next', () => {
    expect(intervalsOfDay([{ from: '22:00', to: '06:00' }], '2026-07-05', zone)).toEqual([
      { from: at('2026-07-05T04:00:00Z'), to: at('2026-07-05T10:00:00Z') },
      { from: at('2026-07-06T02:00:00Z'), to: at('2026-07-06T04:00:00Z') },
    ]);
  });

  it('joins intervals that touch or overlap', () => {
    const intervals = [
      { from: '12:00', to: '16:00' },
      { from: '08:00', to: '12:00' },
      { from: '10:00', to: '13:00' },
    ];
    expect(intervalsOfDay(intervals, '2026-07-05', zone)).toEqual([
      { from: at('2026-07-05T12:00:00Z'), to: at('2026-07-05T20:00:00Z') },
    ]);
  });

  it('joins intervals that only touch', () => {
    const halves = [
      { from: '08:00', to: '12:00' },
      { from: '12:00', to: '16:00' },
    ];
    expect(intervalsOfDay(halves, '2026-07-05', zone)).toHaveLength(1);
  });

  it.each([
    // Equal ends: the whole day, whatever its length.
    ['2026-03-08', '00:00', '00:00', 23],
    ['2026-11-01', '00:00', '00:00', 25],
    ['2026-07-05', '10:00', '10:00', 24],
    // Over the change itself.
    ['2026-03-08', '01:00', '05:00', 3],
    ['2026-11-01', '01:00', '05:00', 5],
    // From and to both skipped, and one of them.
    ['2026-03-08', '02:15', '02:45', 0],
    ['2026-03-08', '02:30', '03:15', 0.25],
    ['2026-03-08', '01:30', '02:30', 0.5],
    // From and to both come twice: from the first to the second.
    ['2026-11-01', '01:15', '01:45', 1.5],
  ])('on %s from %s to %s lasts %d hours', (day, from, to, expected) => {
    expect(hours(intervalsOfDay([{ from, to }], day, zone))).toBeCloseTo(expected, 9);
  });

  it('tiles: the days of two years put together neither lose nor double an hour, in any zone', () => {
    for (const place of zones) {
      let total = 0;
      let last = -Infinity;
      for (let index = 0; index < 730; index++) {
        for (const { from, to } of intervalsOfDay(
          [{ from: '20:00', to: '20:00' }],
          addDays('2026-01-01', index),
          place,
        )) {
          expect(from).toBeGreaterThanOrEqual(last);
          total += to - from;
          last = to;
        }
      }
      expect(total).toBe(startOfDay('2028-01-01', place) - startOfDay('2026-01-01', place));
    }
  });
});
