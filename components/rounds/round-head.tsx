'use client';

import { X } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { DoubleRule } from '@/components/ui/double-rule';
import type { RoundHousehold } from './round-household';
import { roundTimes } from './round-times';

/** What this is, when, and who is walking. The way back is on the left. */
export function RoundHead({ household, serverNow }: { household: RoundHousehold; serverNow: number }) {
  const t = useTranslations('rounds');
  const when = roundTimes(household).full(serverNow);
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
          <p className="text-small text-ink-2">{t('asWhom', { when, name: household.personName })}</p>
        </div>
      </div>
      <DoubleRule />
    </header>
  );
}
