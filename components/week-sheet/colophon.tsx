'use client';

import { useTranslations } from 'next-intl';
import { useSheet } from './sheet-context';

/** What the sheet is worked out from, and how to read its grey columns. */
export function Colophon() {
  const t = useTranslations('week');
  const { readings } = useSheet().sheet;
  return <p className="text-fine text-ink-3">{t('colophon', { count: readings.length })}</p>;
}
