'use client';

import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { textLink } from '@/components/ui/text-link';
import type { HouseSheet } from '@/lib/schemas/house-sheet';

/** For whom the sheet is: nobody who adds anything, until somebody who may is named. */
export function SheetFor({ handlers, handler }: Pick<HouseSheet, 'handlers' | 'handler'>) {
  const t = useTranslations('house.sheet.for');
  const choice = (href: string, name: string, current: boolean) => (
    <li key={href}>
      <PageLink
        href={href}
        aria-current={current ? 'true' : undefined}
        className={`inline-flex min-h-11 items-center text-body ${current ? 'font-strong' : textLink}`}
      >
        {name}
      </PageLink>
    </li>
  );
  return (
    <nav aria-labelledby="sheet-for" className="mb-3 print:hidden">
      <h2 id="sheet-for" className="font-display text-section">
        {t('ask')}
      </h2>
      <ul className="flex flex-wrap gap-x-6">
        {choice('/house/sheet', t('nobody'), handler === null)}
        {handlers.map(({ membershipId, name }) =>
          choice(`/house/sheet?for=${membershipId}`, name, handler?.membershipId === membershipId),
        )}
      </ul>
      <p className="text-small text-ink-2">{t('note')}</p>
    </nav>
  );
}
