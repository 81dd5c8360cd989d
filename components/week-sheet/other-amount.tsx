'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { NumberTextField } from '@/components/ui/number-text-field';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import { formatQuantity } from '@/lib/units/format';
import { parseDecimal, parseQuantity } from '@/lib/units/parse';
import type { UnitOf } from '@/lib/units/unit';
import type { Tick } from './use-tick';
import { useSheet } from './sheet-context';
import { useDoseWords } from './use-dose-words';
import { useUnits } from './use-units';

const FAR_MORE = 2;

/** Another amount went in: typed in the unit of the card, then confirmed in words. Two taps, so that a slip is seen. */
export function OtherAmount({
  dose,
  tick,
  found,
  onClose,
}: {
  dose: PlanDose;
  tick: Tick;
  /** What was said of the feeder before. */
  found: { tabletsLeft?: number };
  onClose: () => void;
}) {
  const t = useTranslations('doses.action');
  const { unitLabel, read } = useAmountField(dose);
  const units = useUnits();
  const [text, setText] = useState('');
  const [amount, setAmount] = useState<number | undefined>(undefined);
  const [problem, setProblem] = useState<string | undefined>(undefined);
  const words = useDoseWords();
  const planned = units.amount(dose.amount, dose.unit);

  if (amount !== undefined)
    return (
      <div role="group" aria-label={t('other')} className="grid gap-2">
        <p className="font-emphasis">
          {t('otherAsk', { amount: units.amount(amount, dose.unit), product: words.productOf(dose), planned })}
          {amount > FAR_MORE * dose.amount && <> {t('otherTwice')}</>}
        </p>
        <Button
          wide
          variant="primary"
          onClick={() => void tick.send({ action: 'changed', amount, ...found })}
          busy={tick.busy === 'changed' ? t('givenBusy') : undefined}
        >
          {t('otherConfirm', { amount: units.amount(amount, dose.unit) })}
        </Button>
        <Button wide variant="quiet" onClick={() => setAmount(undefined)}>
          {t('otherBack')}
        </Button>
      </div>
    );
  return (
    <form
      className="grid gap-3"
      onSubmit={(event) => {
        event.preventDefault();
        const result = read(text);
        if (typeof result === 'number') setAmount(result);
        setProblem(typeof result === 'number' ? undefined : t(result));
      }}
    >
      <NumberTextField
        label={t('otherAmount')}
        hint={t('otherHint', { amount: planned })}
        {...(problem === undefined ? {} : { problem })}
        unit={unitLabel}
        value={text}
        onChange={(event) => setText(event.target.value)}
      />
      <Button wide variant="primary" type="submit">
        {t('otherNext')}
      </Button>
      <Button wide variant="quiet" onClick={onClose}>
        {t('keep')}
      </Button>
    </form>
  );
}

/** Reads what was typed in the unit in which the card gives the amount. */
function useAmountField({ amount, unit }: PlanDose) {
  const { unitSystem, locale } = useSheet().sheet.household;
  const t = useTranslations('doses');
  const units = useTranslations('units');
  const quantity = unit === 'g' ? 'mass' : 'liquidVolume';
  const { unitCode } = formatQuantity(amount, quantity, unitSystem, locale);
  const toAmount = (text: string): number | undefined => {
    if (unit === 'tablet') return parseDecimal(text);
    return unit === 'g'
      ? parseQuantity(text, 'mass', unitCode as UnitOf<'mass'>)
      : parseQuantity(text, 'liquidVolume', unitCode as UnitOf<'liquidVolume'>);
  };
  return {
    unitLabel: unit === 'tablet' ? t('tabletsUnit') : units(unitCode, { value: '' }).trim(),
    read: (text: string): number | 'otherProblem' | 'otherWhole' => {
      const value = toAmount(text);
      if (value === undefined || value <= 0 || value > 1e6) return 'otherProblem';
      return unit === 'tablet' && !Number.isInteger(value) ? 'otherWhole' : value;
    },
  };
}
