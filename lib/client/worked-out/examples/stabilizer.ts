import { addDose } from '@/lib/chemistry';
import { limits, lowestLevel } from '@/lib/standards/limits';
import { amountOf } from './amount-of-chlorine';
import { pointsOf, ticksOf } from './curve';
import type { Example } from './example';
import { ordinaryWater } from './water';

/** Stabilizer [mg/L] that one mg/L of chlorine leaves behind. */
function leftBehind(substance: 'trichlor' | 'dichlor'): number {
  const after = addDose(ordinaryWater, 1, { substance, amount: amountOf(substance, 1) });
  return after.cyanuricAcid - ordinaryWater.cyanuricAcid;
}

export const stabilizerExample: Example<'stabilizer' | 'swimLimit'> = {
  inputs: [
    { name: 'stabilizer', low: 0, high: 120, step: 2, start: 44, unit: 'mg/L', decimals: 0 },
    { name: 'swimLimit', low: 4, high: limits.swimLimitHighest.value, step: 1, start: 4, unit: 'mg/L', decimals: 0 },
  ],
  work({ stabilizer, swimLimit }) {
    const lowest = lowestLevel(stabilizer);
    return {
      figures: [
        { name: 'lowestLevel', value: lowest, unit: 'mg/L', decimals: 1 },
        { name: 'room', value: Math.max(0, swimLimit - lowest), unit: 'mg/L', decimals: 1 },
        {
          name: 'closesAt',
          value: (swimLimit - limits.swimLimitMargin.value) * limits.stabilizerPerLowestLevel.value,
          unit: 'mg/L',
          decimals: 0,
        },
        { name: 'stabilizerOfTrichlor', value: leftBehind('trichlor'), unit: 'mg/L', decimals: 2 },
        { name: 'stabilizerOfDichlor', value: leftBehind('dichlor'), unit: 'mg/L', decimals: 2 },
      ],
      curve: {
        across: { low: 0, high: 120, unit: 'mg/L', decimals: 0, ticks: ticksOf(0, 120, 30) },
        up: { low: 0, high: 12, unit: 'mg/L', decimals: 0, ticks: ticksOf(0, 10, 2) },
        lines: [{ name: 'lowestLevel', mark: 'stabilizer', points: pointsOf(0, 120, 120, (cya) => lowestLevel(cya)) }],
        levels: [{ name: 'swimLimit', at: swimLimit, forbidden: 'above' }],
      },
    };
  },
};
