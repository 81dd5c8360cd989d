'use client';

import { Printer } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { buttonClass } from '@/components/ui/button-class';
import { bold } from '@/components/week-sheet/bold';

/** How long the pool may be left, and the sheet for whoever looks after it meanwhile. */
export function GoingAway() {
  const t = useTranslations('house');
  return (
    <section aria-labelledby="going-away">
      <PageLink href="/house/sheet" className={buttonClass({ variant: 'primary', size: 'large', wide: true })}>
        <Printer aria-hidden="true" className="size-5" />
        {t('toSheet')}
      </PageLink>
      <p className="mt-1.5 text-small text-ink-2">{t('toSheetNote')}</p>
      <h2 id="going-away" className="mt-5 border-t border-ink pt-2.5 font-display text-section">
        {t('away.title')}
      </h2>
      <ul className="mt-1.5 space-y-2 text-body">
        {(['week', 'longer', 'back'] as const).map((rule) => (
          <li key={rule} className="border-l-stop border-ink pl-3">
            {t.rich(`away.${rule}`, { b: bold })}
          </li>
        ))}
      </ul>
    </section>
  );
}
