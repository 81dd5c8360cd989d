'use client';

import { Pipette, ReceiptText } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { Segments } from '@/components/ui/segments';
import { type ReadingMethod, readingMethods } from '@/lib/schemas/reading-kinds';

/** By what the water is tested. */
export function MethodChoice({ value, onChange }: { value: ReadingMethod; onChange: (method: ReadingMethod) => void }) {
  const t = useTranslations('readings.method');
  return (
    <Segments
      hideLabel
      label={t('label')}
      choices={readingMethods.map((method) => ({
        value: method,
        label: (
          <span className="inline-flex items-center gap-2">
            <MethodIcon method={method} />
            {t(method)}
          </span>
        ),
      }))}
      value={value}
      onChange={onChange}
    />
  );
}

function MethodIcon({ method }: { method: ReadingMethod }) {
  if (method === 'drop-kit') return <Pipette aria-hidden="true" className="size-5" />;
  if (method === 'slip') return <ReceiptText aria-hidden="true" className="size-5" />;
  return (
    <svg viewBox="0 0 24 24" aria-hidden="true" className="size-5 fill-none stroke-current" strokeWidth="2">
      <rect x="8.5" y="2.5" width="7" height="19" rx="1" />
      <path d="M8.5 7.5h7M8.5 12h7M8.5 16.5h7" />
    </svg>
  );
}
