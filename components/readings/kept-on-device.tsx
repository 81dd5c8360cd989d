'use client';

import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { Button } from '@/components/ui/button';
import { buttonClass } from '@/components/ui/button-class';
import { UnsentTests } from './unsent-tests';

/** No connection: the test is on this device, and said to be. */
export function KeptOnDevice({ onAgain }: { onAgain: () => void }) {
  const t = useTranslations('readings.kept');
  return (
    <div className="mx-auto grid max-w-reading gap-3.5 px-margin py-6">
      <h1 className="font-display text-board">{t('title')}</h1>
      <p className="text-body">{t('words')}</p>
      <p className="border-t-stop border-b border-ink bg-paper-lift px-3.5 py-3 text-body font-strong">{t('swim')}</p>
      <UnsentTests />
      <div className="flex flex-wrap gap-2.5">
        <PageLink href="/week" className={buttonClass({ variant: 'primary' })}>
          {t('seeWeek')}
        </PageLink>
        <Button onClick={onAgain}>{t('again')}</Button>
      </div>
    </div>
  );
}
