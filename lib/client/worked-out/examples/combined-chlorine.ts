import { ledgerOf } from '@/lib/chemistry';
import { breakpointArithmetic } from '@/lib/chemistry/breakpoint';
import { parametersOf } from '@/lib/projection/parameters';
import { holdRates, moveOn, newStepRates, noRelease } from '@/lib/projection/step';
import { limits } from '@/lib/standards/limits';
import { type Point, ticksOf } from './curve';
import type { Example } from './example';
import { ordinaryWater } from './water';

const DAYS = 7;

/** Combined chlorine at noon of each day when no more of it is made. */
function course(combinedChlorine: number, covered: number): Point[] {
  const ledger = ledgerOf({ ...ordinaryWater, combinedChlorine });
  const rates = newStepRates();
  const acting = { sun: 0, covered, evaporation: 0, rain: 0, swimmers: 0, temperature: ordinaryWater.temperature };
  holdRates(rates, acting, noRelease, parametersOf({ volume: 1, waterFeatures: false }), { depth: 1.5, light: 0 });
  const points: Point[] = [[0, ledger.combinedChlorine]];
  for (let quarter = 1; quarter <= DAYS * 4; quarter++) {
    moveOn(ledger, rates, ledger, 6);
    points.push([quarter / 4, ledger.combinedChlorine]);
  }
  return points;
}

export const combinedChlorineExample: Example<'combinedChlorine'> = {
  inputs: [{ name: 'combinedChlorine', low: 0.2, high: 3, step: 0.1, start: 1, unit: 'mg/L', decimals: 1 }],
  work({ combinedChlorine }) {
    const open = course(combinedChlorine, 0);
    const covered = course(combinedChlorine, 1);
    const { byStoichiometry, byFieldRule } = breakpointArithmetic(combinedChlorine);
    return {
      figures: [
        { name: 'combinedOpen', value: open.at(-1)?.[1] ?? 0, unit: 'mg/L', decimals: 1 },
        { name: 'combinedCovered', value: covered.at(-1)?.[1] ?? 0, unit: 'mg/L', decimals: 1 },
        { name: 'halfRule', value: byStoichiometry, unit: 'mg/L', decimals: 1 },
        { name: 'tenTimesRule', value: byFieldRule, unit: 'mg/L', decimals: 0 },
      ],
      curve: {
        across: { low: 0, high: DAYS, unit: 'days', decimals: 0, ticks: ticksOf(0, DAYS, 1) },
        up: { low: 0, high: 3.5, unit: 'mg/L', decimals: 0, ticks: ticksOf(0, 3, 1) },
        lines: [
          { name: 'inTheOpen', mark: 'chlorine', points: open },
          { name: 'underCover', mark: 'before', points: covered },
        ],
        levels: [{ name: 'combinedAct', at: limits.combinedChlorineAct.value, forbidden: 'above' }],
      },
    };
  },
};
