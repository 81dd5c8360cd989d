'use client';

import { useTranslations } from 'next-intl';
import { Segments } from '@/components/ui/segments';
import { Stepper } from '@/components/ui/stepper';
import { parseDecimal } from '@/lib/units/parse';
import { useUnits } from './use-units';

const few = [0, 1, 2, 3] as const;
const FIRST_OF_MORE = 4;
/** As `doseTickSchema` has it. */
const MOST = 50;

/** How many whole tablets were in the feeder before new ones went in: one tap, or none at all. */
export function TabletsLeft({
  value,
  onChange,
}: {
  /** Undefined while nobody said. */
  value: number | undefined;
  onChange: (count: number) => void;
}) {
  const t = useTranslations('doses.tabletsLeft');
  const { number } = useUnits();
  const isMore = value !== undefined && value >= FIRST_OF_MORE;
  const choices = [
    ...few.map((count) => ({ value: `${count}`, label: number(count) })),
    { value: 'more', label: t('more') },
  ];
  const within = (count: number) => Math.min(MOST, Math.max(FIRST_OF_MORE, count));
  return (
    <div className="grid gap-2">
      <Segments
        label={t('ask')}
        aside={t('optional')}
        hint={t('hint')}
        choices={choices}
        value={value === undefined ? null : isMore ? 'more' : `${value}`}
        onChange={(chosen) => onChange(few.find((count) => `${count}` === chosen) ?? FIRST_OF_MORE)}
      />
      {isMore && (
        <Stepper
          label={t('howMany')}
          value={number(value)}
          onChange={(text) => onChange(within(Math.round(parseDecimal(text) ?? FIRST_OF_MORE)))}
          onStep={(direction) => onChange(within(value + direction))}
          moreLabel={t('oneMore')}
          lessLabel={t('oneLess')}
          size="margin"
        />
      )}
    </div>
  );
}
