'use client';

import Link from 'next/link';
import { useTranslations } from 'next-intl';
import { emergencyCard } from '@/components/navigation/places';
import { InlineStop, StopWord } from '@/components/ui/callout';

/** What must never happen, beside every dose. */
export function StopLine({ className = '' }: { className?: string }) {
  const common = useTranslations('common');
  const navigation = useTranslations('navigation');
  return (
    <InlineStop className={className}>
      {common.rich('neverMixStop', { stop: (words) => <StopWord>{words}</StopWord> })}
      <Link href={emergencyCard} className="ml-1 whitespace-nowrap underline decoration-1 underline-offset-3">
        {navigation('emergencyCard')}
      </Link>
    </InlineStop>
  );
}
