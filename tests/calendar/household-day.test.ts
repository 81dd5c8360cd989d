import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  addDays,
  dayOf,
  daysBetween,
  hoursInDay,
  isCalendarDay,
  startOfDay,
  weekday,
  weekOf,
} from '@/lib/calendar/household-day';
import { localByIntl, zones } from './zones';

const firstDay = '2000-01-01';
const lastIndex = daysBetween(firstDay, '2037-12-31');
const anyZone = fc.constantFrom(...zones);
const anyDay = fc.integer({ min: 0, max: lastIndex }).map((index) => addDays(firstDay, index));

describe('every day from 2000 to 2037 in seven zones', () => {
  it.each(zones)(
    '%s: the day starts where the day before ends and is 24 hours long but for the change days',
    (zone) => {
      const lengths = new Map<number, number>();
      let start = startOfDay(firstDay, zone);
      for (let index = 0; index <= lastIndex; index++) {
        const day = addDays(firstDay, index);
        const next = startOfDay(addDays(day, 1), zone);
        if (dayOf(start, zone) !== day || dayOf(next - 1, zone) !== day) throw new Error(`${day} in ${zone}`);
        const hours = (next - start) / 3_600_000;
        lengths.set(hours, (lengths.get(hours) ?? 0) + 1);
        start = next;
      }
      const short = zone === 'Australia/Lord_Howe' ? 23.5 : 23;
      const long = zone === 'Australia/Lord_Howe' ? 24.5 : 25;
      for (const hours of lengths.keys()) expect([short, 24, long]).toContain(hours);
      const changes = zone === 'Asia/Kathmandu' ? 0 : 37;
      expect(lengths.get(short) ?? 0).toBeGreaterThanOrEqual(changes);
      expect(lengths.get(long) ?? 0).toBeGreaterThanOrEqual(changes);
    },
  );

  it('agrees with the runtime about the day of any instant', () => {
    const anyInstant = fc.integer({ min: Date.UTC(2000, 0, 1), max: Date.UTC(2037, 11, 31) });
    fc.assert(
      fc.property(anyInstant, anyZone, (instant, zone) => {
        expect(dayOf(instant, zone)).toBe(localByIntl(instant, zone).slice(0, 10));
      }),
      { numRuns: 2000 },
    );
  });

  it('keeps weeks: seven days that hold the day and begin with the asked weekday', () => {
    fc.assert(
      fc.property(anyDay, fc.constantFrom(1, 2, 3, 4, 5, 6, 7), (day, first) => {
        const week = weekOf(day, first);
        expect(week).toHaveLength(7);
        expect(week).toContain(day);
        expect(weekday(week[0] as string)).toBe(first);
        expect(daysBetween(week[0] as string, week[6] as string)).toBe(6);
        // getUTCDay is the runtime's own idea of the weekday.
        expect(weekday(day) % 7).toBe(new Date(`${day}T00:00:00Z`).getUTCDay());
      }),
    );
  });
});

describe('days on which clocks change', () => {
  it.each([
    ['America/New_York', '2026-03-08', 23],
    ['America/New_York', '2026-11-01', 25],
    ['Europe/Madrid', '2026-03-29', 23],
    ['Europe/Madrid', '2026-10-25', 25],
    ['Australia/Sydney', '2026-04-05', 25],
    ['Australia/Sydney', '2026-10-04', 23],
    ['Australia/Lord_Howe', '2026-04-05', 24.5],
    ['Australia/Lord_Howe', '2026-10-04', 23.5],
    ['Asia/Kathmandu', '2026-03-29', 24],
  ])('%s %s has %d hours', (zone, day, hours) => {
    expect(hoursInDay(day, zone)).toBe(hours);
  });

  it('starts at 01:00 where clocks go forward at midnight', () => {
    expect(localByIntl(startOfDay('2026-09-06', 'America/Santiago'), 'America/Santiago')).toBe('2026-09-06 01:00:00');
    expect(hoursInDay('2026-09-06', 'America/Santiago')).toBe(23);
  });

  it('gives the day that Samoa left out no hours', () => {
    expect(hoursInDay('2011-12-30', 'Pacific/Apia')).toBe(0);
  });
});

describe('what is no day', () => {
  it.each(['2026-02-30', '2026-13-01', '26-01-01', '2026-1-1', '', '2026-01-01T00:00:00Z', '2025-02-29'])(
    '%s',
    (text) => {
      expect(isCalendarDay(text)).toBe(false);
      expect(() => addDays(text, 1)).toThrow('is not a calendar day');
      expect(() => startOfDay(text, 'UTC')).toThrow('is not a calendar day');
    },
  );

  it('takes the leap day', () => {
    expect(isCalendarDay('2028-02-29')).toBe(true);
    expect(addDays('2028-02-29', 1)).toBe('2028-03-01');
    expect(daysBetween('2028-03-01', '2028-02-28')).toBe(-2);
  });

  it('refuses an unknown zone and a number that is no instant', () => {
    expect(() => dayOf(0, 'Europe/Atlantis')).toThrow('is not a time zone');
    expect(() => startOfDay('2026-01-01', 'Europe/Atlantis')).toThrow('is not a time zone');
    expect(() => dayOf(Number.NaN, 'UTC')).toThrow('is not an instant');
    expect(() => dayOf(Infinity, 'UTC')).toThrow('is not an instant');
  });
});
