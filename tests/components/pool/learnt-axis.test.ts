import { describe, expect, it } from 'vitest';
import { barAxis } from '@/components/pool/learnt/bar-axis';
import { besideBar, widthOf } from '@/components/pool/learnt/beside-bar';

const range = (p10: number, p90: number) => ({ p10, p50: (p10 + p90) / 2, p90 });

describe('the axis of two bars', () => {
  it.each([
    [range(0.8, 2.2), range(1.2, 1.5), { from: 0, decimals: 1 }],
    [range(61, 75), range(69, 74), { from: 55, decimals: 0 }],
    [range(4.5, 9.5), range(6.4, 7.6), { decimals: 0 }],
    [range(10600, 13700), range(10800, 13600), { decimals: 0 }],
    [range(0.05, 0.15), range(0.08, 0.15), { from: 0, decimals: 2 }],
  ])('has three to seven round ticks round %o and %o', (before, learnt, wanted) => {
    const axis = barAxis(before, learnt);
    expect(axis).toMatchObject(wanted);
    expect(axis.ticks.length).toBeGreaterThanOrEqual(3);
    expect(axis.ticks.length).toBeLessThanOrEqual(7);
    expect(axis.from).toBeLessThan(Math.min(before.p10, learnt.p10));
    expect(axis.to).toBeGreaterThan(Math.max(before.p90, learnt.p90));
    // What is written beside a tick is what it stands for.
    for (const tick of axis.ticks) expect(Math.abs(tick - Number(tick.toFixed(axis.decimals)))).toBeLessThan(1e-9);
  });
});

describe('the words of a bar', () => {
  const words = 'before: 0.8 to 2.2';
  it.each([
    ['to its right', { from: 20, middle: 60, to: 120 }, 400, { anchor: 'start', above: false, x: 129 }],
    ['to its left', { from: 220, middle: 280, to: 380 }, 400, { anchor: 'end', above: false, x: 211 }],
    ['above it', { from: 60, middle: 120, to: 330 }, 340, { anchor: 'start', above: true, x: 129 }],
    ['above it, left of its middle', { from: 60, middle: 250, to: 330 }, 340, { anchor: 'end', above: true, x: 241 }],
  ])('stand %s where there is room, and inside the drawing', (_where, bar, width, wanted) => {
    const place = besideBar(bar, words, width);
    expect(place).toEqual(wanted);
    const from = place.anchor === 'start' ? place.x : place.x - widthOf(words);
    expect(from).toBeGreaterThanOrEqual(0);
    expect(from + widthOf(words)).toBeLessThanOrEqual(width);
  });
});
