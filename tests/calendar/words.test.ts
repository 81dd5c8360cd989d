import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ageOf } from '@/lib/calendar/age';
import { firstWeekday } from '@/lib/calendar/first-weekday';
import {
  dayAndMonth,
  dayHeading,
  dayRange,
  dayWithYear,
  longDay,
  timeOfDay,
  wallTimeText,
  weekdayName,
} from '@/lib/calendar/format';
import { nextPart, partOfDay, spokenPart } from '@/lib/calendar/part-of-day';
import { wallToInstant } from '@/lib/calendar/wall-time';
import { zones } from './zones';

const zone = 'America/New_York';
const local = (day: string, time: string, timeZone: string = zone) => wallToInstant(day, time, timeZone).instant;

describe('parts of the day', () => {
  it.each([
    ['05:59', 'night'],
    ['06:00', 'morning'],
    ['10:59', 'morning'],
    ['11:00', 'midday'],
    ['14:00', 'afternoon'],
    ['17:29', 'afternoon'],
    ['17:30', 'evening'],
    ['21:29', 'evening'],
    ['21:30', 'night'],
    ['00:00', 'night'],
  ])('%s is %s', (time, part) => expect(partOfDay(local('2026-07-09', time), zone)).toBe(part));

  it('calls the small hours the night of the day before', () => {
    expect(spokenPart(local('2026-07-10', '02:00'), zone)).toEqual({ day: '2026-07-09', part: 'night' });
    expect(spokenPart(local('2026-07-09', '23:00'), zone)).toEqual({ day: '2026-07-09', part: 'night' });
    expect(spokenPart(local('2026-07-10', '06:00'), zone)).toEqual({ day: '2026-07-10', part: 'morning' });
  });

  it.each([
    ['23:40', '2026-07-10', 'morning'],
    ['02:00', '2026-07-09', 'morning'],
    ['06:00', '2026-07-09', 'morning'],
    ['06:01', '2026-07-09', 'midday'],
    ['21:30', '2026-07-09', 'night'],
  ])('after %s the next part is that of %s, %s', (time, day, part) => {
    expect(nextPart(local('2026-07-09', time), zone)).toMatchObject({ day, part });
  });

  it('never lets a wait end early, on any day in any zone', () => {
    const anyInstant = fc.integer({ min: Date.UTC(2012, 0, 1), max: Date.UTC(2037, 11, 31) });
    fc.assert(
      fc.property(anyInstant, fc.constantFrom(...zones), (instant, place) => {
        const { part, startsAt } = nextPart(instant, place);
        expect(startsAt).toBeGreaterThanOrEqual(instant);
        expect(startsAt - instant).toBeLessThanOrEqual(10 * 3_600_000);
        expect(partOfDay(startsAt, place)).toBe(part);
      }),
      { numRuns: 500 },
    );
  });
});

describe('days and times in words', () => {
  it('writes days', () => {
    expect(dayHeading('2026-07-06', 'en-GB')).toBe('Mon 6');
    expect(dayHeading('2026-07-06', 'en-US')).toBe('Mon 6');
    expect(weekdayName('2026-07-09', 'en-US')).toBe('Thursday');
    expect(weekdayName('2026-07-09', 'en-US', 'narrow')).toBe('T');
    expect(dayAndMonth('2026-07-12', 'en-GB')).toBe('12 July');
    expect(dayAndMonth('2026-07-12', 'en-US')).toBe('July 12');
    expect(longDay('2026-07-12', 'en-US')).toBe('Sunday, July 12');
    expect(longDay('2026-07-12', 'en-GB')).toBe('Sunday 12 July');
    expect(dayWithYear('2026-07-12', 'en-GB')).toBe('12 July 2026');
  });

  it('writes ranges with the word it is given', () => {
    expect(dayRange('2026-07-06', '2026-07-12', 'en-GB', 'to')).toBe('6 to 12 July');
    expect(dayRange('2026-07-06', '2026-07-12', 'en-US', 'to')).toBe('July 6 to 12');
    expect(dayRange('2026-06-29', '2026-07-05', 'en-GB', 'to')).toBe('29 June to 5 July');
    expect(dayRange('2026-06-29', '2026-07-05', 'en-US', 'to')).toBe('June 29 to July 5');
    expect(dayRange('2026-07-06', '2026-07-06', 'en-GB', 'to')).toBe('6 July');
  });

  it('writes times as the locale counts them, with a plain space', () => {
    expect(timeOfDay(local('2026-07-05', '19:40'), zone, 'en-GB')).toBe('19:40');
    expect(timeOfDay(local('2026-07-05', '19:40'), zone, 'en-US')).toBe('7:40 PM');
    expect(wallTimeText('00:05', 'en-GB')).toBe('00:05');
    expect(wallTimeText('00:05', 'en-US')).toBe('12:05 AM');
    expect(wallTimeText('07:05', 'de-DE')).toBe('07:05');
  });

  it.each([
    [59_999, 0, 'minute'],
    [60_000, 1, 'minute'],
    [59 * 60_000, 59, 'minute'],
    [3_600_000, 1, 'hour'],
    [15.9 * 3_600_000, 15, 'hour'],
    [47.99 * 3_600_000, 47, 'hour'],
    [48 * 3_600_000, 2, 'day'],
    [-5_000, 0, 'minute'],
  ])('an age of %d ms is %d %s', (elapsed, count, unit) => {
    expect(ageOf(1_000_000, 1_000_000 + elapsed)).toEqual({ count, unit });
  });
});

describe('first weekday', () => {
  it.each([
    ['en-US', 7],
    ['en', 7],
    ['en-GB', 1],
    ['en-AU', 1],
    ['de', 1],
    ['pt-BR', 7],
    ['ar-EG', 6],
    ['dv-MV', 5],
  ])('%s begins on %d', (locale, day) => expect(firstWeekday(locale)).toBe(day));

  it('agrees with the week data this Node.js carries, where no edition of it ever differed', () => {
    const regions = 'US CA MX BR CO PE IN JP KR IL ZA KE TH ID PH GB IE DE FR ES IT NL SE NO PL CZ CH NZ RU EG JO MV';
    for (const region of regions.split(' ')) {
      const locale = new Intl.Locale(`und-${region}`) as Intl.Locale & {
        weekInfo?: { firstDay: number };
        getWeekInfo?: () => { firstDay: number };
      };
      const known = locale.getWeekInfo?.() ?? locale.weekInfo;
      expect({ region, first: firstWeekday(`und-${region}`) }).toEqual({ region, first: known?.firstDay });
    }
  });
});
