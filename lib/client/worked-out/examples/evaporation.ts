import { evaporationRate } from '@/lib/projection/evaporation';
import { pointsOf, roundHeight, ticksOf } from './curve';
import type { Example } from './example';

/** Surface that a day's evaporation is also told for [m2]. */
const SURFACE = 40;

export const evaporationExample: Example<'temperature' | 'airTemperature' | 'humidity' | 'wind'> = {
  inputs: [
    { name: 'temperature', low: 15, high: 34, step: 1, start: 27, unit: 'degC', decimals: 0 },
    { name: 'airTemperature', low: 5, high: 40, step: 1, start: 25, unit: 'degC', decimals: 0 },
    { name: 'humidity', low: 10, high: 100, step: 5, start: 50, unit: 'percent', decimals: 0 },
    { name: 'wind', low: 0, high: 5, step: 0.5, start: 1, unit: 'mPerSecond', decimals: 1 },
  ],
  work({ temperature, airTemperature, humidity, wind }) {
    const rateAt = (waterTemperature: number, cover: 'none' | 'floating' = 'none') =>
      evaporationRate({ waterTemperature, airTemperature, relativeHumidity: humidity / 100, windSpeed: wind, cover });
    const open = rateAt(temperature);
    const highest = roundHeight(rateAt(34), [4, 8, 16, 32, 64]);
    return {
      figures: [
        { name: 'evaporation', value: open, unit: 'mm', decimals: 1 },
        { name: 'evaporationVolume', value: open * SURFACE, unit: 'L', decimals: 0 },
        { name: 'evaporationCovered', value: rateAt(temperature, 'floating'), unit: 'mm', decimals: 1 },
      ],
      curve: {
        across: { low: 15, high: 34, unit: 'degC', decimals: 0, ticks: [15, 20, 25, 30, 34] },
        up: { low: 0, high: highest, unit: 'mm', decimals: 0, ticks: ticksOf(0, highest, highest / 4) },
        lines: [{ name: 'evaporation', mark: 'ink', points: pointsOf(15, 34, 38, (celsius) => rateAt(celsius)) }],
      },
    };
  },
};
