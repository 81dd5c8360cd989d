'use client';

import { useTranslations } from 'next-intl';
import { NumberTextField } from '@/components/ui/number-text-field';
import { RadioRows } from '@/components/ui/radio-rows';
import { liquidStrengthBases } from '@/lib/storage/label-strength';
import { factsOf } from './ingredients';
import { tradeStrength } from './product-draft';
import type { ProductFieldsProps } from './product-fields';
import { usePoolSetting } from './setting';

/** How strong it is as printed; "10 %" of a liquid may mean four things, so it is asked which. */
export function ProductStrength({ draft, change, problems }: ProductFieldsProps) {
  const t = useTranslations('pool.product.strength');
  const { locale } = usePoolSetting();
  if (draft.substance === null) return null;
  const { strength } = factsOf(draft.substance);
  if (strength === 'none') return null;
  const trade = tradeStrength(draft, locale);
  return (
    <>
      <NumberTextField
        label={t(strength)}
        name="strength"
        unit={t('percent')}
        value={draft.strength}
        onChange={(event) => change({ strength: event.target.value })}
        hint={trade === undefined ? t(`where.${strength}`) : t('asTrade', { strength: trade })}
        problem={problems.strength}
      />
      {strength === 'liquid-chlorine' ? (
        <RadioRows
          label={t('basis.label')}
          choices={liquidStrengthBases.map((basis) => ({ value: basis, label: t(`basis.${basis}`) }))}
          value={draft.basis}
          onChange={(basis) => change({ basis })}
          problem={problems.basis}
        />
      ) : null}
    </>
  );
}
