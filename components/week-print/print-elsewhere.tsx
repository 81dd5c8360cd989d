import { useTranslations } from 'next-intl';

/** Stands on paper in place of a page that is made for a screen. */
export function PrintElsewhere() {
  const t = useTranslations('week-print');
  return <p className="hidden print:block">{t('elsewhere')}</p>;
}
