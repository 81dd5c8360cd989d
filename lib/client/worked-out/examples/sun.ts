import { chlorineSpecies } from '@/lib/chemistry';
import { lossUnderSun, lightThroughDepth } from '@/lib/projection/step';
import { parametersOf } from '@/lib/projection/parameters';
import { solarElevation } from '@/lib/sun/elevation';
import { ultravioletWeight } from '@/lib/sun/ultraviolet';
import { pointsOf, ticksOf } from './curve';
import type { Example } from './example';
import { ordinaryWater } from './water';

const { boundPhotolysis } = parametersOf({ volume: 1, waterFeatures: false });

/** Hours in which this sun alone halves free chlorine, at the start. */
function halfLife(cyanuricAcid: number, light: number): number {
  const water = { ...ordinaryWater, cyanuricAcid };
  return (Math.LN2 * water.freeChlorine) / (light * lossUnderSun(chlorineSpecies(water), boundPhotolysis));
}

export const sunExample: Example<'latitude' | 'month' | 'depth'> = {
  inputs: [
    { name: 'latitude', low: 0, high: 60, step: 1, start: 38, unit: 'degrees', decimals: 0 },
    { name: 'month', low: 1, high: 12, step: 1, start: 6, unit: 'month', decimals: 0 },
    { name: 'depth', low: 0.6, high: 3, step: 0.1, start: 1.5, unit: 'm', decimals: 1 },
  ],
  work({ latitude, month, depth }) {
    const elevationAt = (hour: number) => solarElevation(Date.UTC(2026, month - 1, 21) + hour * 3_600_000, latitude, 0);
    const weightAt = (hour: number) => ultravioletWeight(elevationAt(hour));
    const light = weightAt(12) * lightThroughDepth(depth);
    const halfLives =
      light > 0
        ? ([
            { name: 'halfLifeBare', value: halfLife(0, light) * 60, unit: 'minutes', decimals: 0 },
            { name: 'halfLifeStabilized', value: halfLife(40, light), unit: 'hours', decimals: 0 },
          ] as const)
        : [];
    return {
      figures: [
        { name: 'noonElevation', value: elevationAt(12), unit: 'degrees', decimals: 0 },
        { name: 'noonSun', value: 100 * weightAt(12), unit: 'percent', decimals: 0 },
        ...halfLives,
      ],
      curve: {
        across: { low: 4, high: 20, unit: 'hourOfDay', decimals: 0, ticks: ticksOf(4, 20, 4) },
        up: { low: 0, high: 125, unit: 'percent', decimals: 0, ticks: ticksOf(0, 100, 50) },
        lines: [{ name: 'sun', mark: 'ink', points: pointsOf(4, 20, 64, (hour) => 100 * weightAt(hour)) }],
      },
    };
  },
};
