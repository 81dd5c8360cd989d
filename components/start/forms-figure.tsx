import { useTranslations } from 'next-intl';
import type { Glyph } from '@/components/charts/chart-doses';
import { ProductGlyph } from '@/components/charts/product-glyph';

const lines: Record<Glyph, React.ReactNode> = {
  tablet: <path d="M2 17L84 4" className="stroke-ochre" strokeWidth="2" strokeDasharray="11 3 1.6 3" />,
  granules: <path d="M2 17L84 6" className="stroke-ink" strokeWidth="2.3" />,
  liquid: <path d="M2 4C28 6 56 13 84 18" className="stroke-teal" strokeWidth="2.2" strokeLinecap="round" />,
};

/** What each form of chlorine leaves behind, as the line that grows or fades. */
export function FormsFigure() {
  const t = useTranslations('start.why');
  const rows: readonly { form: Glyph; name: string; note: string }[] = [
    { form: 'tablet', name: t('tablets'), note: t('tabletsNote') },
    { form: 'granules', name: t('granules'), note: t('granulesNote') },
    { form: 'liquid', name: t('liquid'), note: t('liquidNote') },
  ];
  return (
    <ul className="grid gap-2 text-small">
      {rows.map(({ form, name, note }) => (
        <li
          key={form}
          className="grid grid-cols-[24px_5.5rem_86px_1fr] items-center gap-x-1.5 md:grid-cols-[24px_1fr_86px] lg:grid-cols-[24px_5.75rem_86px_1fr]"
        >
          <ProductGlyph mark={form} size={20} />
          <b className="font-strong">{name}</b>
          <svg width="86" height="24" viewBox="0 0 86 24" aria-hidden="true" className="fill-none">
            <path d="M1 21.5H85" className="stroke-rule-2" />
            {lines[form]}
          </svg>
          <span className="text-ink-2 md:col-span-2 md:col-start-2 lg:col-span-1 lg:col-start-4">{note}</span>
        </li>
      ))}
    </ul>
  );
}
