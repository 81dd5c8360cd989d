'use client';

import { useQuery } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { situationsOptions } from '@/lib/client/situations';

/**
 * A ringed count beside Situations while one is open; never a colour. It is one at most. It shows what this browser has been
 * told already: to ask on every page would plan the week once more for each.
 */
export function OpenSituations() {
  const t = useTranslations('navigation');
  const { data } = useQuery({ ...situationsOptions(), enabled: false });
  if (!data?.open) return null;
  return (
    <span className="inline-flex size-4.5 items-center justify-center rounded-full border-[1.4px] border-ink text-figure font-strong text-ink">
      <span aria-hidden="true">{t('situationsCount', { count: 1 })}</span>
      <span className="sr-only">{t('situationsOpen', { count: 1 })}</span>
    </span>
  );
}
