'use client';

import dynamic from 'next/dynamic';
import { useTranslations } from 'next-intl';
import { buttonClass } from '@/components/ui/button-class';
import { PageLink } from '@/components/ui/page-link';
import { Skeleton } from '@/components/ui/skeleton';
import { untilFetched } from '@/components/ui/until-fetched';
import { type ReadingHousehold, ReadingSettingProvider } from './reading-setting';
import type { TestForNowProps } from './test-for-now';

type TestEntryProps = TestForNowProps & { household: ReadingHousehold };

/** Drafts live on the device, which the server does not know; so the form and what checks it follow the page. */
const LazyTest = dynamic(() => untilFetched(() => import('./test-for-now')).then((part) => part.TestForNow), {
  ssr: false,
  loading: Loading,
});

/** Enter a test. */
export function TestEntry({ household, kind, serverNow }: TestEntryProps) {
  if (household.role === 'viewer') return <OnlyLooking />;
  return (
    <ReadingSettingProvider household={household}>
      <LazyTest kind={kind} serverNow={serverNow} />
    </ReadingSettingProvider>
  );
}

function Loading() {
  const common = useTranslations('common');
  return <Skeleton label={common('loading')} className="m-margin h-96" />;
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
