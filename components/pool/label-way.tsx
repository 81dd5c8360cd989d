'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { RadioRows } from '@/components/ui/radio-rows';
import { useSaveProduct } from '@/lib/client/shelf-products';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import type { HouseholdProduct } from '@/lib/schemas/household-product';
import { labelWays } from '@/lib/schemas/shelf-product';
import { useProductWords } from './product-words';

/** How one dry chlorine goes into the water, as its label says; saved at once. Open while nobody has found it. */
export function LabelWay({ product }: { product: HouseholdProduct }) {
  const t = useTranslations('pool');
  const words = useProductWords();
  const problemWords = useProblemWords();
  const save = useSaveProduct();
  const [open, setOpen] = useState(product.labelWay === 'unknown');
  const label = t('label.way', { name: words.name(product) });
  // What was just chosen shows at once; a refusal brings back what is saved.
  const chosen = save.isPending ? save.variables.labelWay : product.labelWay;
  if (!open)
    return (
      <div className="flex items-baseline justify-between gap-3">
        <p className="text-body">
          <span className="block text-label font-strong">{label}</span>
          {t(`product.way.${chosen}.label`)}
        </p>
        <Button
          variant="quiet"
          aria-label={t('label.changeWay', { name: words.name(product) })}
          onClick={() => setOpen(true)}
        >
          {t('shelf.change')}
        </Button>
      </div>
    );
  return (
    <RadioRows
      label={label}
      choices={labelWays.map((way) => ({
        value: way,
        label: t(`product.way.${way}.label`),
        detail: t(`product.way.${way}.detail`),
      }))}
      value={chosen}
      onChange={(labelWay) => save.mutate({ ...product, labelWay })}
      {...(save.error === null ? {} : { problem: problemWords(save.error) })}
    />
  );
}
