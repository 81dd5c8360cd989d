'use client';

import { X } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { DoubleRule } from '@/components/ui/double-rule';
import { PageLink } from '@/components/ui/page-link';

/** What this is, when, and who is walking. The way back is on the left. */
export function RoundHead({ when, name }: { when: string; name: string }) {
  const t = useTranslations('rounds');
  return (
    <header>
      <div className="flex items-center gap-3 py-2">
        <PageLink
          href="/week"
          aria-label={t('toSheet')}
          className="-ml-3 flex size-11 shrink-0 items-center justify-center"
        >
          <X aria-hidden="true" className="size-5.5" />
        </PageLink>
        <div className="min-w-0">
          <p className="font-display text-section">{t('title')}</p>
          <p className="text-small text-ink-2">{t('asWhom', { when, name })}</p>
        </div>
      </div>
      <DoubleRule />
    </header>
  );
}
