import { describe, expect, it } from 'vitest';
import { WaterRangeError } from '@/lib/errors';
import { type LiquidBottle, shareLeftOnDay, strengthOnDay } from '@/lib/storage/liquid-strength';

const bottle: LiquidBottle = { strength: 12.5, boughtOn: '2026-06-20', storedAt: 25 };

describe('liquid chlorine on the shelf', () => {
  it('is as strong as its label on the day it was bought, and before', () => {
    expect(strengthOnDay(bottle, '2026-06-20')).toBe(12.5);
    expect(strengthOnDay(bottle, '2026-06-01')).toBe(12.5);
  });

  it('has half of it left after its half-life', () => {
    // tests/reference/published-values.csv, HYPO-T12-12.5-77: 187 d at 25 deg C (Adam & Gordon 1999), tolerance 22 d.
    expect(shareLeftOnDay(bottle, '2026-12-24')).toBeGreaterThan(187 / (187 + 187 + 22) - 0.01);
    expect(shareLeftOnDay(bottle, '2026-12-24')).toBeLessThan((187 + 22) / (187 + 187 + 22) + 0.01);
  });

  it('weakens about twice as fast in a shed at 30 degrees as at 25', () => {
    // HYPO-T12-12.5-86: 93 d at 30 deg C against 187 d at 25 deg C.
    const lost = (storedAt: number) => 1 / shareLeftOnDay({ ...bottle, storedAt }, '2026-09-20') - 1;
    expect(lost(30) / lost(25)).toBeGreaterThan(1.7);
    expect(lost(30) / lost(25)).toBeLessThan(2.3);
  });

  it('of last season is far from its label', () => {
    const share = shareLeftOnDay({ ...bottle, boughtOn: '2025-05-20' }, '2026-05-20');
    expect(share).toBeGreaterThan(0.2);
    expect(share).toBeLessThan(0.45);
  });

  it('hardly changes in a frosty shed, colder than the water model knows', () => {
    expect(shareLeftOnDay({ ...bottle, storedAt: -15 }, '2026-09-20')).toBeGreaterThan(0.98);
  });

  it('refuses what is no strength, no place and no day', () => {
    expect(() => strengthOnDay({ ...bottle, strength: 0 }, '2026-07-01')).toThrow(WaterRangeError);
    expect(() => strengthOnDay({ ...bottle, strength: 125 }, '2026-07-01')).toThrow(WaterRangeError);
    expect(() => strengthOnDay({ ...bottle, storedAt: 70 }, '2026-07-01')).toThrow(WaterRangeError);
    expect(() => strengthOnDay(bottle, '2026-02-30')).toThrow('not a calendar day');
  });
});
