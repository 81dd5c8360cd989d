'use client';

import { useTranslations } from 'next-intl';
import { NumberTextField } from '@/components/ui/number-text-field';
import { TextField } from '@/components/ui/text-field';
import { productUnits } from './product-draft';
import type { ProductFieldsProps } from './product-fields';

/** How much is left, what one tablet weighs, the measure kept for it, what it cost, when it was bought. */
export function ProductAmounts({ draft, change, problems }: ProductFieldsProps) {
  const t = useTranslations('pool.product.amount');
  const common = useTranslations('common');
  const unitWords = useTranslations('units');
  if (draft.form === null || draft.substance === null) return null;
  const units = productUnits(draft);
  const unit = (code: Parameters<typeof unitWords>[0]) => unitWords(code, { value: '' }).trim();
  const tablets = draft.form === 'tablet';
  const liquid = draft.form === 'liquid';
  return (
    <div className="grid gap-x-3 gap-y-4 sm:grid-cols-2">
      {tablets ? (
        <NumberTextField
          label={t('tabletMass')}
          name="tabletMass"
          unit={unit(units.measure)}
          value={draft.tabletMass}
          onChange={(event) => change({ tabletMass: event.target.value })}
          hint={t('tabletMassNote')}
          problem={problems.tabletMass}
        />
      ) : null}
      <NumberTextField
        label={t('stock')}
        name="stock"
        unit={tablets ? t('tablets') : unit(units.stock)}
        value={draft.stock}
        onChange={(event) => change({ stock: event.target.value })}
        hint={t(tablets ? 'stockTabletsNote' : 'stockNote')}
        problem={problems.stock}
      />
      {tablets || draft.form === 'other' ? null : (
        <NumberTextField
          label={t('measure')}
          aside={common('optional')}
          name="measure"
          unit={unit(units.measure)}
          value={draft.measure}
          onChange={(event) => change({ measure: event.target.value })}
          hint={t('measureNote')}
          problem={problems.measure}
        />
      )}
      <NumberTextField
        label={t('price')}
        aside={common('optional')}
        name="price"
        unit={unit(units.price)}
        value={draft.price}
        onChange={(event) => change({ price: event.target.value })}
        problem={problems.pricePerKg ?? problems.pricePerLitre}
      />
      {liquid ? (
        <TextField
          type="date"
          label={t('boughtOn')}
          {...(draft.substance === 'sodium-hypochlorite' ? {} : { aside: common('optional') })}
          name="boughtOn"
          value={draft.boughtOn}
          onChange={(event) => change({ boughtOn: event.target.value })}
          hint={draft.substance === 'sodium-hypochlorite' ? t('boughtOnNote') : undefined}
          problem={problems.boughtOn}
        />
      ) : null}
    </div>
  );
}
