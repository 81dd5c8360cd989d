import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ledgerOf } from '@/lib/chemistry';
import { projectWeek, projectWeekBand, settingOf } from '@/lib/projection';
import { type WeekDose, weekDose } from '@/lib/projection/events';
import { prepareForcing } from '@/lib/projection/forcing';
import { integrateWeek } from '@/lib/projection/integrate';
import { anyWeek } from './any-week';

const runs = process.env.LONG === '1' ? 3000 : 250;
const errors = { freeChlorine: 0.3, pH: 0.1, totalAlkalinity: 10, calciumHardness: 15, cyanuricAcid: 8 };

describe('any week of any pool', () => {
  it('has finite water at each of its 169 hours, and never less than nothing', () => {
    fc.assert(
      fc.property(anyWeek, ({ pool, start, week, doses, parameters }) => {
        const { hours, water } = projectWeek(pool, start, week, doses, parameters);
        expect(hours).toHaveLength(169);
        expect(water).toHaveLength(169);
        for (const each of water) {
          expect(Object.values(each).every(Number.isFinite)).toBe(true);
          const { freeChlorine, combinedChlorine, cyanuricAcid, calciumHardness, dissolvedSolids } = each;
          expect(
            Math.min(freeChlorine, combinedChlorine!, cyanuricAcid, calciumHardness, dissolvedSolids!),
          ).toBeGreaterThanOrEqual(0);
        }
      }),
      { numRuns: runs },
    );
  });

  it('accounts for every mg/L of chlorine', () => {
    fc.assert(
      fc.property(anyWeek, ({ pool, start, week, doses, parameters }) => {
        const startsAt = Date.parse(start.takenAt);
        const { account, end } = integrateWeek(
          prepareForcing(pool, startsAt, week, start.water.temperature),
          { ledger: ledgerOf(start.water), loads: start.loads },
          doses.map((dose): WeekDose => {
            const at = Date.parse(dose.at);
            if (!('tablets' in dose)) return weekDose(at, dose, pool.volume);
            const { tablets: count, tabletMass, strength } = dose;
            return { at, kind: 'tablets', load: { count, tabletMass, strength, erodedShare: 0 } };
          }),
          settingOf(pool, start.water.temperature, parameters),
        );
        const { dosed, released, usedUp, combined, carriedOut } = account;
        const cameIn = start.water.freeChlorine + Math.abs(dosed) + released;
        const open = start.water.freeChlorine + dosed + released - usedUp - combined - carriedOut - end.freeChlorine;
        expect(Math.abs(open)).toBeLessThanOrEqual(1e-9 * Math.max(1, cameIn));
      }),
      { numRuns: runs },
    );
  });

  it('comes out the same however often it is asked, and whatever was asked in between', () => {
    fc.assert(
      fc.property(anyWeek, anyWeek, (one, other) => {
        const run = ({ pool, start, week, doses, parameters }: typeof one) =>
          projectWeek(pool, start, week, doses, parameters);
        const first = run(one);
        run(other);
        expect(run(one)).toEqual(first);
      }),
      { numRuns: runs / 5 },
    );
  });

  it('has an ordered, finite band', () => {
    fc.assert(
      fc.property(anyWeek, ({ pool, start, week, doses, parameters }) => {
        const band = projectWeekBand(pool, { ...start, errors }, week, doses, parameters);
        for (const { p10, p50, p90 } of Object.values(band))
          for (let hour = 0; hour <= 168; hour++) {
            const [low, middle, high] = [p10[hour]!, p50[hour]!, p90[hour]!];
            if (!(Number.isFinite(high - low) && low <= middle && middle <= high))
              throw new Error(`${low}, ${middle}, ${high} at hour ${hour}`);
          }
      }),
      { numRuns: runs / 5 },
    );
  });
});
