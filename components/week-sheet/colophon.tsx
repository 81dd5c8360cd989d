'use client';

import { Printer } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { textLink } from '@/components/ui/text-link';
import { useSheet } from './sheet-context';

/** What the sheet is worked out from, how to read its grey columns, and the way to the page on paper. */
export function Colophon() {
  const t = useTranslations('week');
  const { sheet, start } = useSheet();
  return (
    <>
      <p className="text-fine text-ink-3">{t('colophon', { count: sheet.readings.length })}</p>
      <p>
        <PageLink
          href={start === undefined ? '/week/print' : `/week/print?start=${start}`}
          className={`${textLink} inline-flex min-h-6 items-center gap-1.5 text-small font-emphasis pointer-coarse:min-h-11`}
        >
          <Printer aria-hidden="true" className="size-4.5" />
          {t('print')}
        </PageLink>
      </p>
    </>
  );
}
