import { SUBSTANCES } from '@/lib/chemistry';
import { genericProducts } from '@/lib/standards/generic-products';
import { parametersOf } from '@/lib/projection/parameters';
import { lifeOf, massLeft } from '@/lib/projection/tablets';
import { pointsOf, ticksOf } from './curve';
import type { Example } from './example';

const { tabletLife } = parametersOf({ volume: 1, waterFeatures: false });
const strength = Math.min(genericProducts.trichlor.strength, SUBSTANCES.trichlor.pureStrength);

export const tabletsExample: Example<'tabletMass' | 'pumpHours'> = {
  inputs: [
    { name: 'tabletMass', low: 20, high: 250, step: 10, start: 230, unit: 'g', decimals: 0 },
    { name: 'pumpHours', low: 4, high: 24, step: 1, start: 8, unit: 'hours', decimals: 0 },
  ],
  work({ tabletMass, pumpHours }) {
    const life = lifeOf(tabletMass, tabletLife);
    const leftAfter = (days: number) => massLeft((days * pumpHours) / life);
    return {
      figures: [
        { name: 'tabletLife', value: life, unit: 'hours', decimals: 0 },
        { name: 'tabletDays', value: life / pumpHours, unit: 'days', decimals: 1 },
        { name: 'firstDay', value: (tabletMass * (1 - leftAfter(1)) * strength) / 100, unit: 'g', decimals: 0 },
      ],
      curve: {
        across: { low: 0, high: 12, unit: 'days', decimals: 0, ticks: ticksOf(0, 12, 3) },
        up: { low: 0, high: 110, unit: 'percent', decimals: 0, ticks: ticksOf(0, 100, 50) },
        lines: [{ name: 'massLeft', mark: 'ink', points: pointsOf(0, 12, 72, (days) => 100 * leftAfter(days)) }],
      },
    };
  },
};
