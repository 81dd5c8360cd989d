import { describe, expect, it } from 'vitest';
import { learnPool } from '@/lib/learning';
import { planWeek } from '@/lib/planner';
import { weekDoseOf } from '@/lib/planner/given-doses';
import { contextOf } from '@/lib/planner/context';
import { projectWeek } from '@/lib/projection';
import type { Posterior } from '@/lib/schemas/posterior';
import type { Reading } from '@/lib/schemas/reading';
import { type ParameterOverrides, type Scenario, scenarioSchema } from '@/lib/schemas/scenario';
import { fullTest, scenarioOf } from './scenarios';

const DAY = 86_400_000;
const plain = scenarioOf({ preferences: { visits: 5 } });
const { pool } = plain;
const doseAt = (at: string) => ({ at, substance: 'sodium-hypochlorite', strength: 12.5, amount: 1500 }) as const;

/** Twelve tests two days apart of a pool that is like `truth`, a dose of liquid after each, the last test at the scenario's. */
function taught(truth: ParameterOverrides): { scenario: Scenario; posterior: Posterior } {
  const start = Date.parse(fullTest.takenAt) - 22 * DAY;
  let { freeChlorine, pH, totalAlkalinity, calciumHardness, cyanuricAcid } = fullTest;
  const { temperature } = fullTest;
  const readings: Reading[] = [];
  const doses = [];
  for (let test = 0; test < 12; test++) {
    const takenAt = new Date(start + test * 2 * DAY).toISOString();
    const water = { freeChlorine, pH, totalAlkalinity, calciumHardness, cyanuricAcid, temperature };
    readings.push({ ...water, takenAt, method: 'drop-kit' });
    const dose = doseAt(new Date(Date.parse(takenAt) + 3_600_000).toISOString());
    doses.push(weekDoseOf({ ...dose, unit: 'mL' }, 'dose', [], pool));
    const later = projectWeek(pool, { takenAt, water }, {}, [dose], truth).water[48]!;
    ({ freeChlorine, pH, totalAlkalinity, calciumHardness, cyanuricAcid } = later);
  }
  const posterior = learnPool({ pool, readings, doses, days: {}, tabletsLeft: [], loads: [] })!;
  const last = { ...readings.at(-1)!, takenAt: fullTest.takenAt };
  return { posterior, scenario: { ...plain, reading: last } };
}

const usual = taught({});
const hungry = taught({ sunStrength: 1.35, darkDemand: 0.2 / 24 });

describe('a plan by what the pool has taught', () => {
  it('starts from the posterior of its reading and promises a narrower range', () => {
    const bare = planWeek(usual.scenario).projection!;
    const learnt = planWeek({ ...usual.scenario, posterior: usual.posterior }).projection!;
    const width = ({ p10, p90 }: typeof bare.freeChlorine, hour: number) => p90[hour]! - p10[hour]!;
    expect(width(learnt.freeChlorine, 48)).toBeLessThan(0.8 * width(bare.freeChlorine, 48));
    expect(learnt.median.freeChlorine[0]).toBeCloseTo(usual.posterior.water.freeChlorine, 9);
  });

  it('adds more where more is used up', () => {
    const rises = ({ scenario, posterior }: typeof usual) =>
      planWeek({ ...scenario, posterior }).doses.reduce((sum, { rise }) => sum + rise, 0);
    const same = { scenario: usual.scenario, posterior: { ...hungry.posterior, water: usual.posterior.water } };
    expect(rises(same)).toBeGreaterThan(1.1 * rises(usual));
  });

  it('takes chlorine to spread over the learnt volume, everything else over the measured one', () => {
    const posterior = { ...usual.posterior, medians: { ...usual.posterior.medians, volume: 1.1 * pool.volume } };
    const { median } = contextOf({ ...usual.scenario, posterior });
    expect(median.setting.parameters.volume).toBeCloseTo(1.1 * pool.volume, 9);
    expect(median.setting.volumeRatio).toBeCloseTo(1 / 1.1, 9);
  });

  it('leaves a posterior of another reading alone', () => {
    const other = { ...usual.posterior, readingAt: '2026-07-04T19:00:00-04:00' };
    expect(planWeek({ ...usual.scenario, posterior: other })).toEqual(planWeek(usual.scenario));
  });

  it('yields to parameters that are said outright', () => {
    const scenario = scenarioSchema.parse({
      ...usual.scenario,
      parameters: { darkDemand: 0.01 },
      posterior: usual.posterior,
    });
    expect(contextOf(scenario).median.setting.parameters.darkDemand).toBe(0.01);
  });
});
