'use client';

import { useTranslations } from 'next-intl';
import { Callout } from '@/components/ui/callout';
import { useSheet } from './sheet-context';
import { useTimes } from './use-times';

/** The newest state could not be fetched: what stands below may have been overtaken, the swim verdict above all. */
export function NotRefreshed() {
  const t = useTranslations('week');
  const common = useTranslations('common');
  const { picture } = useSheet();
  const times = useTimes();
  return (
    <Callout severity="take-care" word={common('takeCare')} className="mx-margin mt-3">
      <p role="status">{t('notRefreshed', { time: times.clock(picture.now) })}</p>
    </Callout>
  );
}
