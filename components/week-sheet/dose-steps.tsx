'use client';

import type { PlanDose } from '@/lib/schemas/plan-dose';
import { useDoseSteps } from './use-dose-steps';
import { useDosingBar } from './use-dosing-bar';

/** The six steps of one dose. Where something happened that bars dosing, that stands in their place. */
export function DoseSteps({ dose, columns = false }: { dose: PlanDose; columns?: boolean }) {
  const steps = useDoseSteps();
  const barred = useDosingBar();
  if (barred) return <p className="border-l-care border-ochre-ink bg-care-wash px-4 py-3 font-emphasis">{barred}</p>;
  return (
    <ol className={`grid gap-x-7 text-[15.5px] leading-[21px] md:text-body ${columns ? 'md:grid-cols-2' : ''}`}>
      {steps(dose).map(({ number, words }) => (
        <li key={number} className="grid grid-cols-[22px_minmax(0,1fr)] border-t border-rule py-1.25 first:border-t-0">
          <span aria-hidden="true" className="font-display font-control text-ink-2">
            {number}
          </span>
          <span>{words}</span>
        </li>
      ))}
    </ol>
  );
}
