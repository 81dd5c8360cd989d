'use client';

import { useTranslations } from 'next-intl';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import { bold } from './bold';
import { bucketLitres, pumpHours } from './dose-state';
import { useDoseWords } from './use-dose-words';
import { useUnits } from './use-units';

const numbers = ['1', '2', '3', '4', '5', '6'] as const;
const beforeAny = ['1', '2', '3'] as const;

/**
 * The six steps of a dose with its own numbers, in the order in which they keep people safe; of a product whose label nobody
 * has read, the three that come before any.
 */
export function useDoseSteps(): (dose: PlanDose) => { number: string; words: React.ReactNode }[] {
  const t = useTranslations('doses');
  const words = useDoseWords();
  const units = useUnits();
  return (dose) => {
    const figures = {
      hours: pumpHours(dose) ?? 0,
      litres: units.bucket(bucketLitres(dose)),
      heats: dose.substance === 'calcium-chloride' ? 'yes' : 'no',
      after: words.afterwards(dose),
      b: bold,
    };
    const text = stepTextOf(dose);
    if (text === 'granules-label-first')
      return beforeAny.map((number) => ({ number, words: t.rich(`steps.${text}.${number}`, figures) }));
    return numbers.map((number) => ({ number, words: t.rich(`steps.${text}.${number}`, figures) }));
  };
}

/** Two products go in another way than the others of their kind: dry acid is dissolved, stabilizer hangs in a bag. */
export function stepTextOf({ substance, steps }: Pick<PlanDose, 'substance' | 'steps'>) {
  if (substance === 'cyanuric-acid') return 'stabilizer-bag';
  return substance === 'sodium-bisulfate' ? 'dry-acid' : steps;
}
