'use client';

import { useTranslations } from 'next-intl';
import { GlyphShape, ProductGlyph } from '@/components/charts/product-glyph';
import { PictureOrTable } from '@/components/ui/picture-or-table';
import { type Burden, burdenRows, type BurdenRow, isPossible, markOf, type Mix, placeMarks } from './mix-comparison';
import { useSheet } from './sheet-context';
import { useUnits } from './use-units';

const mixes = ['tablets', 'granular', 'liquid', 'mix'] as const satisfies Mix[];

/** This week's mix beside the best week with each form alone. */
export function FourWays() {
  const t = useTranslations('week.four');
  const common = useTranslations('common');
  const { sheet } = useSheet();
  const valueOf = useBurdenWords();
  const rows = burdenRows(sheet);
  if (rows.length === 0) return null;
  return (
    <section className="pb-3 lg:border-b lg:border-rule lg:pt-3.5">
      <h2 className="mb-1 font-display text-section">{t('title')}</h2>
      <PictureOrTable
        sentence={t('sentence')}
        seeTable={common('seeAsTable')}
        seePicture={common('seeAsPicture')}
        picture={<Comparison rows={rows} />}
        table={{
          columns: [t('burden'), ...mixes.map((mix) => t(mix))],
          rows: rows.map(({ burden, values }) => [
            t(burden),
            ...mixes.map((mix) => {
              const value = values[mix];
              return value === undefined ? t('notKnown') : valueOf(burden, value);
            }),
          ]),
        }}
      />
      <Alone />
    </section>
  );
}

function Comparison({ rows }: { rows: readonly BurdenRow[] }) {
  const t = useTranslations('week.four');
  const valueOf = useBurdenWords();
  return (
    <>
      <ul className="mb-1.5 flex flex-wrap gap-x-3.25 gap-y-1 text-chart text-ink-2">
        {mixes.map((mix) => (
          <li key={mix} className={`inline-flex items-center gap-1.25 ${mix === 'mix' ? 'font-strong text-ink' : ''}`}>
            <ProductGlyph mark={markOf[mix]} size={14} />
            {t(mix)}
          </li>
        ))}
      </ul>
      {rows.map((row) => (
        <div key={row.burden} className="grid min-h-8.75 grid-cols-[minmax(0,1fr)_110px_56px] items-center gap-x-2">
          <span className="text-[13.5px] leading-4">{t(row.burden)}</span>
          <Track row={row} width={110} />
          <span className="text-right text-[13.5px] leading-4 font-strong whitespace-nowrap">
            {row.values.mix === undefined ? null : valueOf(row.burden, row.values.mix)}
          </span>
        </div>
      ))}
      <p className="mt-1 text-fine text-ink-2">{t('note')}</p>
    </>
  );
}

function Track({ row, width }: { row: BurdenRow; width: number }) {
  return (
    <svg width={width} height="35" viewBox={`0 0 ${width} 35`} aria-hidden="true">
      <path d={`M0 17.5H${width}`} fill="none" className="stroke-rule-2" strokeWidth="1" />
      {placeMarks(row, width).map(({ mix, x }) => (
        <g key={mix} transform={`translate(${x} 17.5)`}>
          <circle r="8.5" className="fill-paper" />
          <g transform={`scale(${mix === 'mix' ? 0.92 : 0.78})`}>
            <GlyphShape mark={markOf[mix]} />
          </g>
        </g>
      ))}
    </svg>
  );
}

/** The forms that do not hold the week alone, in words: a mark on a line would hide it. */
function Alone() {
  const t = useTranslations('week.four');
  const { plan } = useSheet().sheet;
  const failing = (plan?.alternatives ?? []).filter(({ feasible }) => !feasible);
  return (
    <ul className="text-fine text-ink-2">
      {failing.map((alternative) => (
        <li key={alternative.kind}>
          {t('aloneIs', {
            form: t(`alone.${alternative.kind}`),
            words: t(isPossible(alternative) ? 'outside' : 'impossible', { hours: alternative.hoursOutside }),
          })}
        </li>
      ))}
    </ul>
  );
}

function useBurdenWords(): (burden: Burden, value: number) => string {
  const units = useUnits();
  return (burden, value) => {
    switch (burden) {
      case 'money':
        return units.number(value, 2);
      case 'visits':
        return units.number(value, 0);
      case 'swing':
        return units.quantity(value, 'freeChlorine');
      case 'stabilizer':
        return units.signed(value, 1);
      case 'hardness':
        return units.signed(value, 0);
      case 'kilograms':
        return units.weightToCarry(value);
    }
  };
}
