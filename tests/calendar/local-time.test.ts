import fc from 'fast-check';
import * as PlainDateTime from 'temporal-polyfill/fns/PlainDateTime';
import { describe, expect, it } from 'vitest';
import { readLocalTime } from '@/lib/calendar/local-time';
import { zones } from './zones';

/** What the Temporal proposal's reference behaviour makes of a local time. */
function byTemporal(local: number, timeZone: string) {
  const clock = new Date(local);
  const plain = PlainDateTime.create(
    clock.getUTCFullYear(),
    clock.getUTCMonth() + 1,
    clock.getUTCDate(),
    clock.getUTCHours(),
    clock.getUTCMinutes(),
  );
  const read = (disambiguation: 'earlier' | 'later') =>
    PlainDateTime.toZonedDateTime(plain, timeZone, { disambiguation }).epochMilliseconds;
  return { earlier: read('earlier'), later: read('later') };
}

const minute = 60_000;
const far = ['Pacific/Apia', 'Pacific/Kiritimati', 'America/Toronto', 'Africa/Casablanca', 'Asia/Gaza', 'Asia/Manila'];

describe('a local time', () => {
  it('is read as Temporal reads it, in zones far and near', () => {
    const anyLocal = fc.integer({ min: Date.UTC(1900, 0, 1) / minute, max: Date.UTC(2040, 0, 1) / minute });
    fc.assert(
      fc.property(anyLocal, fc.constantFrom(...zones, ...far), (minutes, zone) => {
        expect(readLocalTime(minutes * minute, zone)).toMatchObject(byTemporal(minutes * minute, zone));
      }),
      { numRuns: 1500 },
    );
  });

  it.each([
    ['an hour skipped', 'America/New_York', '2026-03-08'],
    ['an hour twice', 'America/New_York', '2026-11-01'],
    ['half an hour skipped', 'Australia/Lord_Howe', '2026-10-04'],
    ['half an hour twice', 'Australia/Lord_Howe', '2026-04-05'],
    ['a whole day skipped', 'Pacific/Apia', '2011-12-30'],
    ['midnight skipped in the middle of the gap', 'America/Toronto', '1919-03-31'],
    ['clocks that change at midnight', 'Asia/Gaza', '2011-04-01'],
  ])('%s: every ten minutes of two days', (_, zone, day) => {
    const noonBefore = Date.parse(`${day}T00:00Z`) - 12 * 60 * minute;
    for (let local = noonBefore; local < noonBefore + 48 * 60 * minute; local += 10 * minute)
      expect(readLocalTime(local, zone)).toMatchObject(byTemporal(local, zone));
  });

  it('that is skipped names the moment of the change', () => {
    const change = Date.parse('2026-03-08T07:00Z');
    expect(readLocalTime(Date.parse('2026-03-08T02:30Z'), 'America/New_York').gap).toBe(change);
    expect(readLocalTime(Date.parse('2026-03-08T03:00Z'), 'America/New_York').gap).toBeUndefined();
  });

  it('is refused in what is no zone, a bare offset included', () => {
    expect(() => readLocalTime(0, 'Nowhere/Atall')).toThrow('is not a time zone');
    expect(() => readLocalTime(0, '+04:00')).toThrow('is not a time zone');
  });
});
