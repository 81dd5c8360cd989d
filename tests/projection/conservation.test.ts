import { describe, expect, it } from 'vitest';
import { ledgerOf, type WaterAnalysis } from '@/lib/chemistry';
import { CHLORINE_MILLIGRAMS_PER_MOLE } from '@/lib/chemistry/molar-masses';
import { projectWeek, settingOf } from '@/lib/projection';
import { type WeekDose, weekDose } from '@/lib/projection/events';
import { prepareForcing } from '@/lib/projection/forcing';
import { integrateWeek } from '@/lib/projection/integrate';
import type { Pool } from '@/lib/schemas/pool';
import type { ParameterOverrides } from '@/lib/schemas/scenario';
import type { WeekAhead } from '@/lib/schemas/week-ahead';
import { aPool, aWeek, everyDay, someWater, still, takenAt } from './pools';

const startsAt = Date.parse(takenAt);
const afterHours = (hours: number) => startsAt + hours * 3_600_000;

/** A week in which nothing acts but what is named. */
function quiet(
  changes: {
    pool?: Record<string, unknown>;
    week?: Partial<WeekAhead>;
    water?: Partial<WaterAnalysis>;
    parameters?: ParameterOverrides;
  } = {},
) {
  return projectWeek(
    aPool({ ...still.pool, ...changes.pool }),
    { takenAt, water: someWater(changes.water) },
    { ...still.week, ...changes.week },
    [],
    { ...still.parameters, ...changes.parameters },
  ).water;
}

describe('a week in which nothing acts', () => {
  it('changes nothing', () => {
    const [first, last] = [someWater({ combinedChlorine: 0 }), quiet({ water: { combinedChlorine: 0 } }).at(-1)!];
    for (const quantity of ['freeChlorine', 'totalAlkalinity', 'calciumHardness', 'cyanuricAcid'] as const)
      expect(last[quantity]).toBeCloseTo(first[quantity], 9);
    expect(last.pH).toBeCloseTo(first.pH, 6);
    expect(last.dissolvedSolids).toBeCloseTo(1000, 9);
  });

  it('lets combined chlorine fade by 0.3 a day in the open, and touches nothing else', () => {
    const last = quiet({ water: { combinedChlorine: 0.6 } }).at(-1)!;
    expect(last.combinedChlorine).toBeCloseTo(0.6 * Math.exp(-0.3 * 7), 9);
    expect(last.freeChlorine).toBeCloseTo(3, 9);
  });
});

describe('dilution alone', () => {
  const depth = 1.5;

  it('by rain: what was in the water goes with exp(-rain / depth)', () => {
    const rain = [20, 0, 60, 0, 0, 10, 0];
    const water = quiet({ week: { rain }, water: { combinedChlorine: 0 } });
    // The first day has 5 of its 24 hours left at 19:00.
    const fallen = (20 * 5) / 24 + 60 + 10;
    const kept = Math.exp(-fallen / 1000 / depth);
    expect(water.at(-1)!.freeChlorine).toBeCloseTo(3 * kept, 9);
    expect(water.at(-1)!.cyanuricAcid).toBeCloseTo(50 * kept, 9);
    expect(water.at(-1)!.calciumHardness).toBeCloseTo(220 * kept, 9);
    expect(water.at(-1)!.totalAlkalinity).toBeCloseTo(80 * kept, 9);
  });

  it('by a leak: the water tends to the fill water with exp(-leak t / volume)', () => {
    const fillWater = { calciumHardness: 300, totalAlkalinity: 140, pH: 7.8, dissolvedSolids: 400 };
    const last = quiet({ pool: { fillWater }, parameters: { leak: 2 } }).at(-1)!;
    const kept = Math.exp((-2 * 7) / 75.7);
    expect(last.calciumHardness).toBeCloseTo(300 + (220 - 300) * kept, 8);
    expect(last.totalAlkalinity).toBeCloseTo(140 + (80 - 140) * kept, 8);
    expect(last.dissolvedSolids).toBeCloseTo(400 + (1000 - 400) * kept, 8);
    expect(last.cyanuricAcid).toBeCloseTo(50 * kept, 8);
  });

  it('by evaporation and top-up: salts of the fill water stay, nothing leaves', () => {
    const last = quiet({ week: { evaporation: everyDay(6) } }).at(-1)!;
    const topUp = (6 * 7) / 1000 / depth;
    expect(last.calciumHardness).toBeCloseTo(220 + 60 * topUp, 9);
    expect(last.totalAlkalinity).toBeCloseTo(80 + 80 * topUp, 9);
    expect(last.cyanuricAcid).toBeCloseTo(50, 9);
    expect(last.freeChlorine).toBeCloseTo(3, 9);
  });

  it('rain takes the place of top-up before it overflows', () => {
    const last = quiet({ week: { evaporation: everyDay(6), rain: [...everyDay(6), 6] } }).at(-1)!;
    expect(last.calciumHardness).toBeCloseTo(220, 9);
    expect(last.cyanuricAcid).toBeCloseTo(50, 9);
  });
});

describe('chlorine in the account', () => {
  const doses = (pool: Pool): WeekDose[] => [
    { at: afterHours(1.3), kind: 'tablets', load: { tabletMass: 227, count: 3, strength: 90, erodedShare: 0.1 } },
    weekDose(afterHours(30.4), { substance: 'calcium-hypochlorite', amount: 300, strength: 65 }, pool.volume),
    weekDose(afterHours(50.1), { substance: 'sodium-hypochlorite', amount: 2000, strength: 11 }, pool.volume),
    weekDose(afterHours(70), { substance: 'sodium-thiosulfate', amount: 200 }, pool.volume),
    weekDose(afterHours(90.7), { substance: 'dichlor', amount: 100, strength: 55 }, pool.volume),
  ];

  it.each([
    ['stabilized', 50],
    ['without stabilizer', 0],
  ])('closes to the last digits, %s', (_, cyanuricAcid) => {
    const pool = aPool({ cover: 'floating' });
    const water = someWater({ cyanuricAcid });
    const week = aWeek({
      rain: [0, 30, 0, 0, 15, 0, 0],
      backwash: [0, 0, 2, 0, 0, 1, 0],
      swimmerHours: [0, 4, 0, 20, 0, 60, 8],
    });
    const forcing = prepareForcing(pool, startsAt, week, water.temperature);
    const { account, end } = integrateWeek(
      forcing,
      { ledger: ledgerOf(water), loads: [] },
      doses(pool),
      settingOf(pool, water.temperature, { leak: 0.5 }),
    );
    for (const part of Object.values(account)) expect(Math.abs(part)).toBeGreaterThan(0);
    const { dosed, released, usedUp, combined, carriedOut } = account;
    expect(water.freeChlorine + dosed + released - usedUp - combined - carriedOut - end.freeChlorine).toBeCloseTo(0, 9);
  });

  it('takes alkalinity with what is used up, and leaves it with what becomes combined', () => {
    const pool = aPool({ ...still.pool, sunExposure: 1 });
    const water = someWater();
    const week = aWeek({ ...still.week, swimmerHours: everyDay(10) });
    const forcing = prepareForcing(pool, startsAt, week, water.temperature);
    const start = ledgerOf(water);
    const setting = settingOf(pool, water.temperature, {
      ...still.parameters,
      waterPerSwimmerHour: 0,
      darkDemand: 0.01,
    });
    const { account, end } = integrateWeek(forcing, { ledger: start, loads: [] }, [], setting);
    expect((start.alkalinity - end.alkalinity) * CHLORINE_MILLIGRAMS_PER_MOLE).toBeCloseTo(account.usedUp, 9);
    expect(account.combined).toBeGreaterThan(0.05);
  });

  it('never leaves less than none', () => {
    const { water } = projectWeek(
      aPool({ volume: 12 }),
      { takenAt, water: someWater({ cyanuricAcid: 0 }) },
      {
        swimmerHours: everyDay(200),
      },
    );
    expect(Math.min(...water.map((each) => each.freeChlorine))).toBe(0);
    expect(water.every((each) => Number.isFinite(each.pH))).toBe(true);
  });
});
