import { addDose, ledgerOf, useUpChlorine as usedUp } from '@/lib/chemistry';
import { alkalinityWithoutCarbonate } from '@/lib/chemistry/ledger';
import { ALKALINITY_MILLIGRAMS_PER_EQUIVALENT } from '@/lib/chemistry/molar-masses';
import { constantsOfLedger } from '@/lib/chemistry/solve-ledger';
import { amountOf } from './amount-of-chlorine';
import { pointsOf, ticksOf } from './curve';
import type { Example } from './example';
import { ordinaryWater } from './water';

/** Chlorine from tablets that is used up, the same for every alkalinity [mg/L]. */
const USED = 5;

export const alkalinityExample: Example<'alkalinity' | 'pH' | 'stabilizer'> = {
  inputs: [
    { name: 'alkalinity', low: 40, high: 180, step: 5, start: 90, unit: 'mg/L', decimals: 0 },
    { name: 'pH', low: 7, high: 8, step: 0.1, start: 7.5, unit: 'none', decimals: 1 },
    { name: 'stabilizer', low: 0, high: 100, step: 5, start: 40, unit: 'mg/L', decimals: 0 },
  ],
  work({ alkalinity, pH, stabilizer }) {
    const waterOf = (totalAlkalinity: number) => ({ ...ordinaryWater, pH, totalAlkalinity, cyanuricAcid: stabilizer });
    const fallAt = (totalAlkalinity: number) => {
      const dose = { substance: 'trichlor', amount: amountOf('trichlor', USED) } as const;
      return pH - usedUp(addDose(waterOf(totalAlkalinity), 1, dose), USED).pH;
    };
    const ledger = ledgerOf(waterOf(alkalinity));
    const notCarbonate =
      alkalinityWithoutCarbonate(ledger, 10 ** -pH, constantsOfLedger(ledger)) * ALKALINITY_MILLIGRAMS_PER_EQUIVALENT;
    return {
      figures: [
        { name: 'pHFall', value: fallAt(alkalinity), unit: 'none', decimals: 2 },
        { name: 'alkalinityOfCarbonate', value: alkalinity - notCarbonate, unit: 'mg/L', decimals: 0 },
        { name: 'alkalinityOfStabilizer', value: notCarbonate, unit: 'mg/L', decimals: 0 },
      ],
      curve: {
        across: { low: 40, high: 180, unit: 'mg/L', decimals: 0, ticks: ticksOf(60, 180, 40) },
        up: { low: 0, high: 0.6, unit: 'none', decimals: 1, ticks: ticksOf(0, 0.6, 0.2) },
        lines: [{ name: 'pHFall', mark: 'pH', points: pointsOf(40, 180, 56, fallAt) }],
      },
    };
  },
};
