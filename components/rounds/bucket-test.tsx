'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Disclosure } from '@/components/ui/disclosure';
import { NumberTextField } from '@/components/ui/number-text-field';
import { type BucketTest as Outcome, bucketTestOf } from '@/lib/standards/bucket-test';
import { dropUnit, HIGHEST_DROP, readDrop, writtenDrop } from './bucket-drops';
import type { RoundHousehold } from './round-household';

const answerWords = { leak: 'leak', weather: 'weather', 'bucket-fell-further': 'bucketFellFurther' } as const;

/** Leak or weather: how far the bucket and the pool fell in a day, and what the difference says. */
export function BucketTest({ household: { unitSystem, locale } }: { household: RoundHousehold }) {
  const t = useTranslations('rounds.bucket');
  const units = useTranslations('units');
  const [typed, setTyped] = useState({ bucketDrop: '', poolDrop: '' });
  const said = (drop: number) => {
    const { value, unitCode } = writtenDrop(drop, unitSystem, locale);
    return units(unitCode, { value });
  };
  const [bucketDrop, poolDrop] = [readDrop(typed.bucketDrop, unitSystem), readDrop(typed.poolDrop, unitSystem)];
  const outcome =
    bucketDrop === undefined || poolDrop === undefined ? undefined : bucketTestOf({ bucketDrop, poolDrop });
  const words = ({ answer, difference, error }: Outcome) =>
    t(answerWords[answer], { difference: said(Math.abs(difference)), error: said(error) });
  return (
    <Disclosure summary={<span className="text-small">{t('open')}</span>}>
      <div className="grid gap-3">
        {(['bucketDrop', 'poolDrop'] as const).map((part) => (
          <NumberTextField
            key={part}
            label={`${t(part)} [${dropUnit[unitSystem]}]`}
            hint={t('hint')}
            value={typed[part]}
            onKeyDown={(event) => {
              // The form around it is the round: working out a bucket test must not send it.
              if (event.key === 'Enter') event.preventDefault();
            }}
            problem={
              typed[part].trim() === '' || readDrop(typed[part], unitSystem) !== undefined
                ? undefined
                : t('problem', { most: said(HIGHEST_DROP) })
            }
            onChange={(event) => setTyped({ ...typed, [part]: event.target.value })}
          />
        ))}
      </div>
      <p role="status" className="mt-2.5 text-body font-strong">
        {outcome && words(outcome)}
      </p>
    </Disclosure>
  );
}
