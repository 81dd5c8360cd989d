'use client';

import { useTranslations } from 'next-intl';
import type { TestDraft } from './test-draft-schema';

/** How the water for it is taken, or what a quick one leaves out. */
export function TestNote({ kind }: Pick<TestDraft, 'kind'>) {
  const t = useTranslations('readings');
  return <p className="py-2.5 text-small text-pretty text-ink-2">{kind === 'quick' ? t('quickNote') : t('sample')}</p>;
}
