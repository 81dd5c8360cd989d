'use client';

import { useTranslations } from 'next-intl';
import { type PaperRow, useReadingRows } from './use-reading-rows';

/** What was read last, where it is kept, and room for two tests; it reads like the form it is copied into. */
export function ReadingsTable() {
  const t = useTranslations('week-print.readings');
  const rows = useReadingRows();
  const blank = <td className="w-[58px] border-t border-x border-ink" />;
  const row = ({ name, last, keep }: PaperRow) => (
    <tr key={name}>
      <th scope="row" className="h-[20px] border-t border-ink text-left font-strong whitespace-nowrap">
        {name}
      </th>
      <td className="border-t border-ink pr-1.5 whitespace-nowrap">{last}</td>
      <td className="border-t border-ink pr-1 whitespace-nowrap">{keep}</td>
      {blank}
      {blank}
    </tr>
  );
  return (
    <section>
      <h2 className="font-display text-section">{t('title')}</h2>
      <table className="w-full border-collapse border-b border-ink">
        <thead>
          <tr className="text-left">
            <td />
            <th scope="col" className="font-text">
              {t('last')}
            </th>
            <th scope="col" className="font-text">
              {t('keep')}
            </th>
            <th scope="col" className="pl-1 font-text">
              {t('when')}
            </th>
            <th scope="col" className="pl-1 font-text">
              {t('when')}
            </th>
          </tr>
        </thead>
        <tbody>{[{ name: t('whenAndBy'), last: '', keep: '' }, ...rows].map(row)}</tbody>
      </table>
    </section>
  );
}
