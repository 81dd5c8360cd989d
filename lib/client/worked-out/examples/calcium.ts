import { langelierIndex, saturationIndex } from '@/lib/chemistry';
import { pointsOf, ticksOf } from './curve';
import type { Example } from './example';
import { ordinaryWater } from './water';

export const calciumExample: Example<'pH' | 'alkalinity' | 'hardness' | 'stabilizer' | 'temperature'> = {
  inputs: [
    { name: 'pH', low: 6.8, high: 8.2, step: 0.1, start: 7.5, unit: 'none', decimals: 1 },
    { name: 'alkalinity', low: 50, high: 200, step: 5, start: 90, unit: 'mg/L', decimals: 0 },
    { name: 'hardness', low: 50, high: 800, step: 25, start: 250, unit: 'mg/L', decimals: 0 },
    { name: 'stabilizer', low: 0, high: 100, step: 5, start: 40, unit: 'mg/L', decimals: 0 },
    { name: 'temperature', low: 5, high: 38, step: 1, start: 27, unit: 'degC', decimals: 0 },
  ],
  work({ pH, alkalinity, hardness, stabilizer, temperature }) {
    const at = (acidity: number) => ({
      ...ordinaryWater,
      pH: acidity,
      totalAlkalinity: alkalinity,
      calciumHardness: hardness,
      cyanuricAcid: stabilizer,
      temperature,
    });
    return {
      figures: [
        { name: 'saturationIndex', value: saturationIndex(at(pH)), unit: 'none', decimals: 2 },
        { name: 'handbookIndex', value: langelierIndex(at(pH)), unit: 'none', decimals: 2 },
      ],
      curve: {
        across: { low: 6.8, high: 8.2, unit: 'none', decimals: 1, ticks: ticksOf(6.8, 8.2, 0.2) },
        up: { low: -2, high: 2, unit: 'none', decimals: 0, ticks: ticksOf(-2, 2, 1) },
        lines: [
          {
            name: 'saturationIndex',
            mark: 'ink',
            points: pointsOf(6.8, 8.2, 28, (acidity) => saturationIndex(at(acidity))),
          },
          {
            name: 'handbookIndex',
            mark: 'before',
            points: pointsOf(6.8, 8.2, 28, (acidity) => langelierIndex(at(acidity))),
          },
        ],
        levels: [{ name: 'inBalance', at: 0 }],
      },
    };
  },
};
