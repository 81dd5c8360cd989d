import { storedHypochloriteStrength } from '@/lib/chemistry';
import { hypochloriteHalfLife } from '@/lib/chemistry/hypochlorite-decay';
import { pointsOf, ticksOf } from './curve';
import type { Example } from './example';

export const liquidStrengthExample: Example<'strength' | 'temperature' | 'days'> = {
  inputs: [
    { name: 'strength', low: 5, high: 16, step: 0.5, start: 12.5, unit: 'tradePercent', decimals: 1 },
    { name: 'temperature', low: 5, high: 40, step: 1, start: 28, unit: 'degC', decimals: 0 },
    { name: 'days', low: 0, high: 180, step: 5, start: 60, unit: 'days', decimals: 0 },
  ],
  work({ strength, temperature, days }) {
    const after = (age: number) => storedHypochloriteStrength({ strength, temperature, days: age });
    return {
      figures: [
        { name: 'strengthLeft', value: after(days), unit: 'tradePercent', decimals: 1 },
        { name: 'shareLeft', value: (100 * after(days)) / strength, unit: 'percent', decimals: 0 },
        { name: 'halfLife', value: hypochloriteHalfLife(strength, temperature), unit: 'days', decimals: 0 },
      ],
      curve: {
        across: { low: 0, high: 180, unit: 'days', decimals: 0, ticks: ticksOf(0, 180, 60) },
        up: { low: 0, high: 18, unit: 'tradePercent', decimals: 0, ticks: ticksOf(0, 15, 5) },
        lines: [{ name: 'strengthLeft', mark: 'chlorine', points: pointsOf(0, 180, 60, after) }],
      },
    };
  },
};
