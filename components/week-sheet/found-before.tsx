'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import { mayAddFound } from './dose-state';
import { useSheet } from './sheet-context';
import { TabletsLeft } from './tablets-left';
import type { Tick } from './use-tick';

/** What was in the feeder before a dose of tablets that has been ticked; asked for where whoever ticked has not said yet. */
export function FoundBefore({ dose, tick }: { dose: PlanDose; tick: Tick }) {
  const t = useTranslations('doses.tabletsLeft');
  const { sheet, picture } = useSheet();
  const [left, setLeft] = useState<number | undefined>(undefined);
  if (dose.tabletsLeft !== null)
    return <p className="text-small text-ink-2">{t('found', { count: dose.tabletsLeft })}</p>;
  if (!mayAddFound(dose, picture.now, sheet.me)) return null;
  return (
    <>
      <TabletsLeft value={left} onChange={setLeft} />
      {left !== undefined && (
        <Button
          wide
          onClick={() => void tick.send({ action: 'given', tabletsLeft: left })}
          busy={tick.busy === 'given' ? t('keeping') : undefined}
        >
          {t('keep')}
        </Button>
      )}
    </>
  );
}
