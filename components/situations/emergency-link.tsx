'use client';

import { Siren } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { emergencyCard } from '@/components/navigation/addresses';
import { textLink } from '@/components/ui/text-link';

/** One tap from a caution to the emergency card. */
export function EmergencyLink() {
  const t = useTranslations('navigation');
  return (
    <PageLink
      href={emergencyCard}
      className={`inline-flex min-h-11 items-center gap-2 font-emphasis md:min-h-7 pointer-coarse:min-h-11 ${textLink}`}
    >
      <Siren aria-hidden="true" className="size-4.5 shrink-0" />
      {t('emergencyCard')}
    </PageLink>
  );
}
