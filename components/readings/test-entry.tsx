'use client';

import { useTranslations } from 'next-intl';
import { lazy, startTransition, useEffect, useState } from 'react';
import { PageLink } from '@/components/navigation/page-link';
import { buttonClass } from '@/components/ui/button-class';
import { untilFetched } from '@/components/ui/until-fetched';
import { type ReadingHousehold, ReadingSettingProvider } from './reading-setting';
import { TestComing } from './test-coming';
import type { TestForNowProps } from './test-for-now';

type TestEntryProps = TestForNowProps & { household: ReadingHousehold };

/** Drafts live on the device, which the server does not know; so the form and what checks it follow the page. */
const LazyTest = lazy(async () => {
  // What checks a reading takes a phone as long to set up as the form itself: each has a turn of its own.
  await untilFetched(() => import('@/lib/schemas/reading'));
  await new Promise((resolve) => setTimeout(resolve));
  return { default: (await untilFetched(() => import('./test-for-now'))).TestForNow };
});

/** Enter a test. */
export function TestEntry({ household, kind, serverNow }: TestEntryProps) {
  const [drawn, setDrawn] = useState(false);
  // The head stays as it is until the form is whole.
  useEffect(() => startTransition(() => setDrawn(true)), []);
  if (household.role === 'viewer') return <OnlyLooking />;
  return (
    <ReadingSettingProvider household={household}>
      {drawn ? <LazyTest kind={kind} serverNow={serverNow} /> : <TestComing kind={kind} serverNow={serverNow} />}
    </ReadingSettingProvider>
  );
}

function OnlyLooking() {
  const t = useTranslations('readings.viewer');
  return (
    <div className="mx-auto max-w-reading px-margin py-8">
      <h1 className="font-display text-board">{t('title')}</h1>
      <p className="mt-2 text-body text-ink-2">{t('words')}</p>
      <PageLink href="/week" className={buttonClass({ variant: 'primary', className: 'mt-4' })}>
        {t('seeWeek')}
      </PageLink>
    </div>
  );
}
