import { describe, expect, it } from 'vitest';
import { feederAt, feederLoad, loadsAtLife, tabletsWorth, timerBetween } from '@/lib/learning/feeder';
import { type WeekDose, weekDose } from '@/lib/projection/events';
import { integrateWeek } from '@/lib/projection/integrate';
import { prepareForcing } from '@/lib/projection/forcing';
import { settingOf } from '@/lib/projection';
import { ledgerOf } from '@/lib/chemistry';
import { aPool, aWeek, someWater } from '../projection/pools';
import { HOUR } from './simulated-pools';

const pool = aPool();
const monday = Date.parse('2026-07-06T00:00:00-04:00');
const tablets = (at: number, tabletMass = 227): WeekDose => ({
  at,
  kind: 'tablets',
  load: { count: 2, tabletMass, strength: 90, erodedShare: 0 },
});
const hoursAt = (doses: WeekDose[], to: number, floater = false) =>
  feederAt([], doses, timerBetween(pool, monday, to), floater, monday, to).map(({ runningHours }) => runningHours);

describe('the feeder in running hours', () => {
  it('counts the hours of the timer since the tablets went in', () => {
    expect(hoursAt([tablets(monday)], monday + 48 * HOUR)).toEqual([16]);
    expect(hoursAt([tablets(monday + 12 * HOUR)], monday + 24 * HOUR)).toEqual([4]);
    expect(hoursAt([tablets(monday + 20 * HOUR)], monday + 24 * HOUR)).toEqual([0]);
  });

  it('counts a floater round the clock, and the pump kept on after a dose once', () => {
    expect(hoursAt([tablets(monday)], monday + 30 * HOUR, true)).toEqual([30]);
    const evening = weekDose(monday + 14 * HOUR, { substance: 'sodium-hypochlorite', amount: 500 }, pool.volume);
    expect(hoursAt([tablets(monday), evening], monday + 24 * HOUR)).toEqual([10]);
  });

  it('leaves out what went in before, after, or is long gone', () => {
    expect(hoursAt([tablets(monday - 1), tablets(monday + 24 * HOUR)], monday + 24 * HOUR)).toEqual([]);
    expect(hoursAt([tablets(monday)], monday + 30 * 24 * HOUR)).toEqual([]);
  });

  it('erodes like the loads of the projection, whatever the mass and the life', () => {
    const water = someWater();
    for (const life of [30, 48, 90]) {
      const doses = [tablets(monday), tablets(monday + 30 * HOUR, 20)];
      const setting = settingOf(pool, water.temperature, { tabletLife: life });
      const forcing = prepareForcing(pool, monday, aWeek(), water.temperature, { hours: 48 });
      const course = integrateWeek(forcing, { ledger: ledgerOf(water), loads: [] }, doses, setting);
      const kept = feederAt([], doses, forcing.pumpIntervals, false, monday, monday + 48 * HOUR);
      loadsAtLife(kept, life).forEach(({ erodedShare }, index) =>
        expect(erodedShare).toBeCloseTo(course.loads[index]!.erodedShare, 9),
      );
    }
  });

  it('takes tablets that were half eroded at the usual life as they are', () => {
    const load = feederLoad({ count: 3, tabletMass: 227, strength: 90, erodedShare: 0.5 }, 0);
    expect(load.runningHours).toBe(24);
    expect(tabletsWorth([load], 48)).toBeCloseTo(3 * (1 - 0.5 / 3) ** 2 * 0.5, 12);
    expect(tabletsWorth([load], 24)).toBe(0);
  });
});
