import { chlorineSpecies, type ModelChoice } from '@/lib/chemistry';
import { pointsOf, roundHeight, ticksOf } from './curve';
import type { Example } from './example';
import { ordinaryWater } from './water';

const later: ModelChoice = { constants: 'wahman-2019' };

/** The three forms at a pH and stabilizer, by both published sets of constants. */
export const chlorineForms: Example<'freeChlorine' | 'pH' | 'stabilizer'> = {
  inputs: [
    { name: 'freeChlorine', low: 0.5, high: 8, step: 0.5, start: 3, unit: 'mg/L', decimals: 1 },
    { name: 'pH', low: 6.8, high: 8.2, step: 0.1, start: 7.5, unit: 'none', decimals: 1 },
    { name: 'stabilizer', low: 0, high: 100, step: 2, start: 40, unit: 'mg/L', decimals: 0 },
  ],
  work({ freeChlorine, pH, stabilizer }) {
    const water = { ...ordinaryWater, temperature: 25, freeChlorine, pH };
    const acidAt = (cyanuricAcid: number, choice?: ModelChoice) =>
      chlorineSpecies({ ...water, cyanuricAcid }, choice).hypochlorousAcid;
    const first = chlorineSpecies({ ...water, cyanuricAcid: stabilizer });
    const second = chlorineSpecies({ ...water, cyanuricAcid: stabilizer }, later);
    const highest = roundHeight(acidAt(10), [0.1, 0.2, 0.5, 1, 2, 5]);
    return {
      figures: [],
      comparison: {
        columns: ['obrien', 'wahman'],
        unit: 'mg/L',
        decimals: 3,
        rows: (['hypochlorousAcid', 'hypochlorite', 'cyanurateBound'] as const).map((name) => ({
          name,
          values: [first[name], second[name]],
        })),
      },
      curve: {
        across: { low: 10, high: 100, unit: 'mg/L', decimals: 0, ticks: ticksOf(20, 100, 20) },
        up: { low: 0, high: highest, unit: 'mg/L', decimals: 2, ticks: ticksOf(0, highest, highest / 2) },
        lines: [
          { name: 'hypochlorousByObrien', mark: 'chlorine', points: pointsOf(10, 100, 45, (cya) => acidAt(cya)) },
          { name: 'hypochlorousByWahman', mark: 'before', points: pointsOf(10, 100, 45, (cya) => acidAt(cya, later)) },
        ],
      },
    };
  },
};
