import { describe, expect, it } from 'vitest';
import { ledgerOf } from '@/lib/chemistry';
import { forcingBetween } from '@/lib/learning/gap';
import { settingOf } from '@/lib/projection';
import { prepareForcing } from '@/lib/projection/forcing';
import { integrateWeek } from '@/lib/projection/integrate';
import { aPool, aWeek, everyDay, takenAt } from '../projection/pools';
import { HOUR, simulatedPool, WEEK, weekAfter } from './simulated-pools';

describe('the time between two readings', () => {
  it('ends where the hourly projection of that week ends', () => {
    for (let seed = 0; seed < 25; seed++) {
      const sim = simulatedPool(seed, 3);
      const from = Date.parse(sim.history.readings[1]!.takenAt);
      const { water, loads } = sim.weeks[1]!;
      const setting = { ...settingOf(sim.pool, water.temperature), parameters: sim.truth };
      const doses = sim.history.doses.filter(({ at }) => at >= from && at < from + WEEK);
      const temperatures = { first: water.temperature, last: water.temperature };
      const start = { ledger: ledgerOf(water), loads };
      const coarse = integrateWeek(forcingBetween(sim.history, from, from + WEEK, temperatures), start, doses, setting);
      const hourly = integrateWeek(
        prepareForcing(sim.pool, from, weekAfter(sim, 1), water.temperature),
        start,
        doses,
        setting,
      );
      expect(Math.abs(coarse.end.freeChlorine - hourly.end.freeChlorine)).toBeLessThan(0.03);
      expect(Math.abs(coarse.endPH - hourly.endPH)).toBeLessThan(0.005);
      expect(coarse.end.cyanurate).toBeCloseTo(hourly.end.cyanurate, 7);
    }
  });

  it('brings each day what was written down of it, and the usual where nothing was', () => {
    const pool = aPool();
    const from = Date.parse(takenAt);
    const days = { '2026-07-06': { rain: 30, swimmerHours: 10, sky: 0.1 }, '2026-07-08': { waterTemperature: 20 } };
    const forcing = forcingBetween({ pool, days }, from, from + 4 * 24 * HOUR, { first: 24, last: 29 });
    const sum = (values: Float64Array) => values.reduce((total, value) => total + value * forcing.stepHours, 0);
    expect(sum(forcing.rain)).toBeCloseTo(0.03, 9);
    expect(sum(forcing.swimmers)).toBeCloseTo(10, 9);
    expect(Math.min(...forcing.temperature)).toBe(20);
    const usual = prepareForcing(pool, from, aWeek({ evaporation: everyDay(5) }), 26, { hours: 96 });
    const sunny = usual.sun.reduce((total, value) => total + value, 0);
    expect(sum(forcing.sun)).toBeLessThan(0.85 * sunny);
    expect(sum(forcing.evaporation)).toBeCloseTo(0.005 * 4, 9);
  });
});
