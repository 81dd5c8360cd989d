'use client';

import dynamic from 'next/dynamic';
import { useTranslations } from 'next-intl';
import { useId, useState } from 'react';
import { untilFetched } from '@/components/ui/until-fetched';

const DaysTable = dynamic(() => untilFetched(() => import('./days-table')).then((part) => part.DaysTable), {
  ssr: false,
});
const HoursTable = dynamic(() => untilFetched(() => import('./hours-table')).then((part) => part.HoursTable), {
  ssr: false,
});

const tables = ['chlorine', 'pH', 'stabilizer', 'days'] as const;
type Table = (typeof tables)[number];

/** Every picture of the sheet as a table, one at a time under the lanes. */
export function SheetTables() {
  const t = useTranslations('week.table');
  const [shown, setShown] = useState<Table | undefined>(undefined);
  const id = useId();
  return (
    // Never wider than the page: the tables scroll within themselves.
    <section className="min-w-0">
      <p className="flex flex-wrap items-center gap-x-3 text-fine text-ink-2">
        <span>{t('see')}</span>
        {tables.map((table) => (
          <button
            key={table}
            type="button"
            aria-expanded={shown === table}
            aria-controls={id}
            onClick={() => setShown(shown === table ? undefined : table)}
            className={`inline-flex min-h-6 cursor-pointer items-center underline decoration-1 underline-offset-3 pointer-coarse:min-h-11 ${shown === table ? 'font-strong text-ink' : ''}`}
          >
            {t(table)}
          </button>
        ))}
      </p>
      <div id={id} className={shown === undefined ? 'hidden' : 'mt-2'}>
        {shown === 'chlorine' && <HoursTable quantity="freeChlorine" name={t('chlorine')} />}
        {shown === 'pH' && <HoursTable quantity="pH" name={t('pH')} />}
        {shown === 'stabilizer' && <HoursTable quantity="cyanuricAcid" name={t('stabilizer')} />}
        {shown === 'days' && <DaysTable />}
      </div>
    </section>
  );
}
