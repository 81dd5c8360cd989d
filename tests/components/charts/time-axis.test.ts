import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { cutTo, isOn, shareOf, xOf } from '@/components/charts/time-axis';
import { startOfDay } from '@/lib/calendar/household-day';

const HOUR = 3_600_000;
const week = (from: string, to: string, zone: string) => ({ from: startOfDay(from, zone), to: startOfDay(to, zone) });

describe('the time axis places by instant', () => {
  it.each([
    ['spring, 167 hours', week('2026-03-23', '2026-03-30', 'Europe/Paris'), 167],
    ['autumn, 169 hours', week('2026-10-19', '2026-10-26', 'Europe/Paris'), 169],
    ['an ordinary week', week('2026-07-06', '2026-07-13', 'Europe/Paris'), 168],
    ['half an hour, Lord Howe', week('2026-03-30', '2026-04-06', 'Australia/Lord_Howe'), 168.5],
  ])('%s', (_name, axis, hours) => {
    expect((axis.to - axis.from) / HOUR).toBe(hours);
    for (let hour = 0; hour <= hours; hour++)
      expect(shareOf(axis, axis.from + hour * HOUR)).toBeCloseTo(hour / hours, 12);
  });

  it('gives an hour the same width everywhere, also across a clock change', () => {
    const axis = week('2026-10-19', '2026-10-26', 'Europe/Paris');
    const width = (at: number) => xOf(axis, 910, at + HOUR) - xOf(axis, 910, at);
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 168 }), (hour) => {
        expect(width(axis.from + hour * HOUR)).toBeCloseTo(910 / 169, 9);
      }),
    );
  });

  it('cuts a stretch to what lies on it', () => {
    const axis = { from: 100, to: 200 };
    expect(cutTo(axis, { from: 50, to: 150 })).toEqual({ from: 100, to: 150 });
    expect(cutTo(axis, { from: 200, to: 250 })).toBeUndefined();
    expect([isOn(axis, 99), isOn(axis, 100), isOn(axis, 200)]).toEqual([false, true, true]);
  });
});
