'use client';

import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { buttonClass } from '@/components/ui/button-class';
import { EmptyState } from '@/components/ui/empty-state';

/** Before the first reading there is nothing to draw: the sheet asks for a full test. */
export function FirstTest() {
  const t = useTranslations('week');
  return (
    <EmptyState
      className="px-margin py-8"
      picture={<DippedStrip />}
      title={t('state.firstTitle')}
      action={
        <PageLink href="/test" className={buttonClass({ variant: 'primary' })}>
          {t('next.enter')}
        </PageLink>
      }
    >
      {t('state.firstWords')}
    </EmptyState>
  );
}

function DippedStrip() {
  return (
    <svg viewBox="0 0 96 84" width="96" height="84" aria-hidden="true" fill="none">
      <path d="M6 78H90" className="stroke-ink" strokeWidth="1.6" />
      <rect x="40" y="10" width="15" height="68" className="fill-paper-lift stroke-ink" strokeWidth="1.8" />
      {[18, 32, 46].map((y) => (
        <rect
          key={y}
          x="43.5"
          y={y}
          width="8"
          height="8"
          className="stroke-ink"
          strokeWidth="1.3"
          strokeDasharray="2 2"
        />
      ))}
      <path d="M10 66q6 -5 12 0t12 0M61 66q6 -5 12 0t12 0" className="stroke-teal" strokeWidth="1.8" />
    </svg>
  );
}
