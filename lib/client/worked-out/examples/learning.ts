import { addDose, ledgerOf, type WaterAnalysis } from '@/lib/chemistry';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import { learnFrom } from '@/lib/learning';
import { dailyLoss, dayOfLoss } from '@/lib/learning/daily-loss';
import { projectWeek, settingOf } from '@/lib/projection';
import { type WeekDose, weekDose } from '@/lib/projection/events';
import { learntStart } from '@/lib/projection/learnt-start';
import { poolSchema } from '@/lib/schemas/pool';
import { type Reading, readingSchema } from '@/lib/schemas/reading';
import { amountOf } from './amount-of-chlorine';
import { type Point, ticksOf } from './curve';
import type { Example } from './example';
import { ordinaryWater } from './water';

const pool = poolSchema.parse({ volume: 60, latitude: 38, longitude: 0, timeZone: 'UTC' });
const HOURS_APART = 72;
const TESTS = 6;
const AFTER_DOSE = 4;
const firstTest = Date.UTC(2026, 5, 1, 17);

/** What a household of a pool with this sun would have read and poured, the tests without error. */
function historyUnder(sunStrength: number) {
  const readings: Reading[] = [];
  const doses: WeekDose[] = [];
  let water: WaterAnalysis = { ...ordinaryWater, freeChlorine: AFTER_DOSE };
  for (let test = 0; test < TESTS; test++) {
    const at = firstTest + test * HOURS_APART * 3_600_000;
    const takenAt = toOffsetIso(at, pool.timeZone);
    const { freeChlorine, pH, totalAlkalinity, calciumHardness, cyanuricAcid, temperature } = water;
    const read = { freeChlorine, pH, totalAlkalinity, calciumHardness, cyanuricAcid, temperature };
    readings.push(readingSchema.parse({ takenAt, method: 'drop-kit', ...read }));
    const amount = amountOf('sodium-hypochlorite', Math.max(0, AFTER_DOSE - freeChlorine)) * pool.volume;
    const dose = { substance: 'sodium-hypochlorite', amount } as const;
    if (amount > 0) doses.push(weekDose(at + 1, dose, pool.volume));
    const start = { takenAt, water: addDose(water, pool.volume, dose) };
    water = projectWeek(pool, start, {}, [], { sunStrength }).water[HOURS_APART] ?? water;
  }
  return { pool, readings, doses, days: {}, tabletsLeft: [], loads: [] };
}

export const learningExample: Example<'poolSun'> = {
  inputs: [{ name: 'poolSun', low: 50, high: 160, step: 10, start: 130, unit: 'percent', decimals: 0 }],
  work({ poolSun }) {
    const steps = learnFrom(null, historyUnder(poolSun / 100));
    const losses = steps.map(({ posterior }) => dailyLoss(posterior, pool));
    const last = steps.at(-1);
    const prior = losses.at(-1)?.prior;
    const learnt = losses.at(-1)?.learnt;
    if (last === undefined || prior === undefined || learnt === undefined) return { figures: [] };
    const start = { ledger: ledgerOf(learntStart(last.posterior).water), loads: [] };
    const truth = settingOf(pool, ordinaryWater.temperature, { sunStrength: poolSun / 100 });
    const trueLoss = dayOfLoss(last.posterior, pool)(start, truth);
    const edge = (which: 'p10' | 'p50' | 'p90') =>
      losses.map((loss, test): Point => [test + 1, test === 0 ? loss.prior[which] : loss.learnt[which]]);
    return {
      figures: [{ name: 'trueLoss', value: trueLoss, unit: 'mg/L', decimals: 2 }],
      comparison: {
        columns: ['low', 'middle', 'high'],
        unit: 'mg/L',
        decimals: 2,
        rows: [
          { name: 'lossBefore', values: [prior.p10, prior.p50, prior.p90] },
          { name: 'lossLearnt', values: [learnt.p10, learnt.p50, learnt.p90] },
        ],
      },
      curve: {
        across: { low: 1, high: TESTS, unit: 'none', decimals: 0, ticks: ticksOf(1, TESTS, 1) },
        up: { low: 0, high: 3, unit: 'mg/L', decimals: 0, ticks: ticksOf(0, 3, 1) },
        lines: [{ name: 'lossLearnt', mark: 'chlorine', points: edge('p50') }],
        ranges: [{ name: 'learntBand', low: edge('p10'), high: edge('p90') }],
        levels: [{ name: 'truth', at: trueLoss }],
      },
    };
  },
};
