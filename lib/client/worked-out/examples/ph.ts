import { addDose, aerateToEquilibrium, useUpChlorine as usedUp } from '@/lib/chemistry';
import { amountOf } from './amount-of-chlorine';
import { pointsOf, ticksOf } from './curve';
import type { Example } from './example';
import { ordinaryWater } from './water';

type Form = 'trichlor' | 'dichlor' | 'sodium-hypochlorite';

export const pHExample: Example<'pH' | 'alkalinity' | 'stabilizer' | 'chlorineUsed'> = {
  inputs: [
    { name: 'pH', low: 7, high: 8, step: 0.1, start: 7.5, unit: 'none', decimals: 1 },
    { name: 'alkalinity', low: 50, high: 180, step: 5, start: 90, unit: 'mg/L', decimals: 0 },
    { name: 'stabilizer', low: 0, high: 100, step: 5, start: 40, unit: 'mg/L', decimals: 0 },
    { name: 'chlorineUsed', low: 0, high: 15, step: 1, start: 10, unit: 'mg/L', decimals: 0 },
  ],
  work({ pH, alkalinity, stabilizer, chlorineUsed }) {
    const water = { ...ordinaryWater, pH, totalAlkalinity: alkalinity, cyanuricAcid: stabilizer };
    const after = (substance: Form, chlorine: number) =>
      usedUp(addDose(water, 1, { substance, amount: amountOf(substance, chlorine) }), chlorine).pH;
    const line = (substance: Form) => pointsOf(0, 15, 15, (chlorine) => after(substance, chlorine));
    return {
      figures: [
        { name: 'pHTrichlor', value: after('trichlor', chlorineUsed), unit: 'none', decimals: 2 },
        { name: 'pHDichlor', value: after('dichlor', chlorineUsed), unit: 'none', decimals: 2 },
        { name: 'pHHypochlorite', value: after('sodium-hypochlorite', chlorineUsed), unit: 'none', decimals: 2 },
        { name: 'pHInAir', value: aerateToEquilibrium(water).pH, unit: 'none', decimals: 2 },
      ],
      curve: {
        across: { low: 0, high: 15, unit: 'mg/L', decimals: 0, ticks: ticksOf(0, 15, 5) },
        up: { low: 6.4, high: 8.2, unit: 'none', decimals: 1, ticks: ticksOf(6.6, 8, 0.4) },
        lines: [
          { name: 'pHHypochlorite', mark: 'pH', points: line('sodium-hypochlorite') },
          { name: 'pHDichlor', mark: 'before', points: line('dichlor') },
          { name: 'pHTrichlor', mark: 'ink', points: line('trichlor') },
        ],
      },
    };
  },
};
