'use client';

import { useTranslations } from 'next-intl';
import type { RecordedReading } from '@/lib/schemas/reading';
import { DoneLine } from './done-line';
import { instantOf } from './sheet-times';
import { useTimes } from './use-times';

/** A test that was made. */
export function DoneReading({ reading }: { reading: RecordedReading }) {
  const t = useTranslations('week');
  const times = useTimes();
  return (
    <DoneLine
      what={t(`check.${reading.kind}`)}
      who={t('check.doneBy', {
        method: t(`method.${reading.method}`),
        by: reading.doneBy ?? 'none',
        time: times.clock(instantOf(reading.takenAt)),
      })}
    />
  );
}
