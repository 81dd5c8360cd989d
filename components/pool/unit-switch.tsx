'use client';

import { useTranslations } from 'next-intl';
import { Segments } from '@/components/ui/segments';
import { usePoolSetting } from './setting';

/** Metric or US while describing the pool: every figure that was typed is carried over. */
export function UnitSwitch({ className = '' }: { className?: string }) {
  const t = useTranslations('pool');
  const { system, setSystem } = usePoolSetting();
  return (
    <div className={`flex flex-wrap items-center gap-x-3 gap-y-1.5 ${className}`}>
      <Segments
        size="small"
        hideLabel
        label={t('units.label')}
        choices={[
          { value: 'metric', label: t('units.metric') },
          { value: 'us', label: t('units.us') },
        ]}
        value={system}
        onChange={setSystem}
        className="w-44"
      />
      <span className="text-small text-ink-2">{t('units.note')}</span>
    </div>
  );
}
