'use client';

import { OctagonAlert } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { bold } from '@/components/week-sheet/bold';
import { useSheet } from '@/components/week-sheet/sheet-context';
import { stopOf } from '@/components/week-sheet/stop-words';

/** What must never happen, what holds beside it for the products of this week, and what to do when something has. */
export function PaperStop() {
  const common = useTranslations('common');
  const t = useTranslations('doses.stop');
  const trouble = useTranslations('house.sheet.trouble');
  const own = new Set(useSheet().sheet.doses.flatMap((dose) => stopOf(dose) ?? []));
  return (
    <section className="relative mt-2 border-stop border-ink py-1 pr-2.5 pl-7 text-small before:absolute before:inset-y-0 before:left-0 before:w-4.25 before:bg-hatch-stop">
      <h2 className="flex items-center gap-2 text-label font-severity">
        <OctagonAlert aria-hidden="true" className="size-5" />
        {common('stop')}
      </h2>
      <p className="mt-0.5 font-strong">{common('neverMix')}</p>
      {[...own].map((stop) => (
        <p key={stop} className="mt-0.5 font-strong">
          {t(stop)}
        </p>
      ))}
      <p className="mt-0.5">{trouble.rich('smoke', { b: bold })}</p>
    </section>
  );
}
