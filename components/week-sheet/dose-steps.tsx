'use client';

import { useTranslations } from 'next-intl';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import { bold } from './bold';
import { bucketLitres, pumpHours } from './dose-state';
import { useDosingBar } from './use-dosing-bar';
import { useDoseWords } from './use-dose-words';
import { useUnits } from './use-units';

const numbers = ['1', '2', '3', '4', '5', '6'] as const;

/**
 * The six steps of one dose with its own numbers, in the order in which they keep people safe. Where something happened
 * that bars dosing, that stands in their place.
 */
export function DoseSteps({ dose, columns = false }: { dose: PlanDose; columns?: boolean }) {
  const t = useTranslations('doses');
  const words = useDoseWords();
  const units = useUnits();
  const text = textOf(dose);
  const barred = useDosingBar();
  if (barred) return <p className="border-l-care border-ochre-ink bg-care-wash px-4 py-3 font-emphasis">{barred}</p>;
  const figures = {
    hours: pumpHours(dose) ?? 0,
    litres: units.bucket(bucketLitres(dose)),
    heats: dose.substance === 'calcium-chloride' ? 'yes' : 'no',
    after: words.afterwards(dose),
    b: bold,
  };
  return (
    <ol className={`grid gap-x-7 text-[15.5px] leading-[21px] md:text-body ${columns ? 'md:grid-cols-2' : ''}`}>
      {numbers.map((number) => (
        <li key={number} className="grid grid-cols-[22px_minmax(0,1fr)] border-t border-rule py-1.25 first:border-t-0">
          <span aria-hidden="true" className="font-display font-control text-ink-2">
            {number}
          </span>
          <span>{t.rich(`steps.${text}.${number}`, figures)}</span>
        </li>
      ))}
    </ol>
  );
}

/** Two products go in another way than the others of their kind: dry acid is dissolved, stabilizer hangs in a bag. */
function textOf({ substance, steps }: PlanDose) {
  if (substance === 'cyanuric-acid') return 'stabilizer-bag';
  return substance === 'sodium-bisulfate' ? 'dry-acid' : steps;
}
