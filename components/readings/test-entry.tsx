'use client';

import { useTranslations } from 'next-intl';
import { lazy, startTransition, useEffect, useState } from 'react';
import { PageLink } from '@/components/navigation/page-link';
import { buttonClass } from '@/components/ui/button-class';
import { untilFetched } from '@/components/ui/until-fetched';
import { keptDraft } from './kept-draft';
import { type ReadingHousehold, ReadingSettingProvider } from './reading-setting';
import { TestComing } from './test-coming';
import type { TestDraft } from './test-draft-schema';
import type { AskedTest } from './test-for-now';

type TestEntryProps = AskedTest & { household: ReadingHousehold };

/** Drafts live on the device, which the server does not know; so the form follows the page. */
const LazyTest = lazy(() =>
  untilFetched(() => import('./test-for-now')).then(({ TestForNow }) => ({ default: TestForNow })),
);

/** Enter a test. */
export function TestEntry({ household, kind, serverNow }: TestEntryProps) {
  const [kept, setKept] = useState<{ begun: TestDraft | undefined }>();
  const { personId, householdId } = household;
  useEffect(() => {
    // The head stays as it is until the form is whole.
    void keptDraft({ personId, householdId }).then((begun) => startTransition(() => setKept({ begun })));
  }, [personId, householdId]);
  if (household.role === 'viewer') return <OnlyLooking />;
  return (
    <ReadingSettingProvider household={household}>
      {kept ? (
        <LazyTest kind={kind} serverNow={serverNow} begun={kept.begun} />
      ) : (
        <TestComing kind={kind} serverNow={serverNow} />
      )}
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
