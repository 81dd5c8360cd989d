import { describe, expect, it } from 'vitest';
import { nearestStop, rowAt, stopAfterKey, stopsOf } from '@/components/charts/cursor-stops';

const HOUR = 3_600_000;
const midnight = Date.parse('2026-07-08T00:00:00Z');
const at = (hours: number) => midnight + hours * HOUR;
/** Full hours of two days, with now at 10:20 and a dose at 19:40, where the curve has its foot and its head. */
const rows = [
  ...Array.from({ length: 49 }, (_, hour) => ({ at: at(hour), what: 'hour' })),
  { at: at(10 + 1 / 3), what: 'now' },
  { at: at(19 + 2 / 3), what: 'foot' },
  { at: at(19 + 2 / 3), what: 'head' },
].sort((a, b) => a.at - b.at);
const stops = stopsOf(rows);
const from = (hours: number) => nearestStop(stops, at(hours));
const pressed = (hours: number, key: string, shift = false) => {
  const to = stopAfterKey(stops, from(hours), { key, shift });
  return to === undefined ? undefined : ((stops[to] ?? Number.NaN) - midnight) / HOUR;
};

describe('where a cursor stands', () => {
  it('is each instant once', () => {
    expect(stops).toHaveLength(51);
    expect(stops.every((stop, index) => index === 0 || stop > (stops[index - 1] ?? 0))).toBe(true);
  });

  it('says of the instant of a dose what holds after it', () => {
    expect(rowAt(rows, at(19 + 2 / 3))).toMatchObject({ what: 'head' });
    expect(rowAt(rows, at(3.5))).toBeUndefined();
  });

  it('is nearest to the pointer, and nowhere on an empty curve', () => {
    expect(stops[nearestStop(stops, at(5.4))]).toBe(at(5));
    expect(stops[nearestStop(stops, at(900))]).toBe(at(48));
    expect(nearestStop([], at(5))).toBe(-1);
  });
});

describe('keys', () => {
  it.each([
    ['ArrowRight', false, 6],
    ['ArrowUp', false, 6],
    ['ArrowLeft', false, 4],
    ['ArrowDown', false, 4],
    ['ArrowRight', true, 11],
    ['ArrowLeft', true, 0],
    ['PageUp', false, 29],
    ['PageDown', false, 0],
    ['Home', false, 0],
    ['End', false, 48],
  ])('%s, shift %s, goes from 5 to %s', (key, shift, hour) => {
    expect(pressed(5, key, shift)).toBe(hour);
  });

  it('go on from a stop between the hours to full hours', () => {
    expect(pressed(10 + 1 / 3, 'ArrowRight')).toBe(11);
    expect(pressed(10 + 1 / 3, 'ArrowLeft')).toBe(9);
  });

  it('never stay where they are while there is something that way', () => {
    const sparse = [at(0), at(10), at(20)];
    expect(stopAfterKey(sparse, 0, { key: 'ArrowRight', shift: false })).toBe(1);
    expect(stopAfterKey(sparse, 2, { key: 'ArrowLeft', shift: false })).toBe(1);
    expect(stopAfterKey(sparse, 2, { key: 'ArrowRight', shift: false })).toBe(2);
  });

  it('of any other kind are left to the page', () => {
    expect(pressed(5, 'Tab')).toBeUndefined();
    expect(pressed(5, 'a')).toBeUndefined();
  });
});
