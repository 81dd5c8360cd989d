'use client';

import { useTranslations } from 'next-intl';
import type { Comparison, Worked } from '@/lib/client/worked-out/examples/example';
import { useWritten } from './use-written';

/** What follows from where the sliders stand, read out when it changes. */
export function ExampleFigures({ worked }: { worked: Worked }) {
  const t = useTranslations('how-examples');
  const written = useWritten();
  return (
    <div aria-live="polite" role="status" aria-label={t('results')} className="mt-2">
      {worked.figures.length === 0 ? null : (
        <ul className="grid border-t border-rule-2 sm:grid-cols-2 lg:auto-cols-fr lg:grid-flow-col lg:grid-cols-none">
          {worked.figures.map((figure) => (
            <li
              key={figure.name}
              className="flex items-baseline justify-between gap-3 border-b border-rule py-2 lg:block lg:border-b-0"
            >
              <span className="text-body text-ink-2 lg:block">{t(`figure.${figure.name}`)}</span>
              <b className="font-display text-[21px] leading-[26px] font-headline whitespace-nowrap">
                {written(figure.value, figure)}
              </b>
            </li>
          ))}
        </ul>
      )}
      {worked.comparison === undefined ? null : <SideBySide comparison={worked.comparison} />}
    </div>
  );
}

function SideBySide({ comparison }: { comparison: Comparison }) {
  const t = useTranslations('how-examples');
  const written = useWritten();
  return (
    <table className="w-full border-collapse border-t border-rule-2 text-left text-body">
      <thead>
        <tr className="border-b border-ink">
          <td />
          {comparison.columns.map((column) => (
            <th key={column} scope="col" className="py-2 pl-3 text-right align-bottom font-strong">
              {t(`figure.${column}`)}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {comparison.rows.map(({ name, values }) => (
          <tr key={name} className="border-b border-rule">
            <th scope="row" className="py-2 font-text text-ink-2">
              {t(`figure.${name}`)}
            </th>
            {values.map((value, index) => (
              <td key={index} className="py-2 pl-3 text-right font-emphasis whitespace-nowrap">
                {written(value, comparison)}
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}
