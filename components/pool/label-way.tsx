'use client';

import { useTranslations } from 'next-intl';
import { RadioRows } from '@/components/ui/radio-rows';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import { useSaveProduct } from '@/lib/client/shelf-products';
import type { HouseholdProduct } from '@/lib/schemas/household-product';
import { labelWays } from '@/lib/schemas/shelf-product';
import { useProductWords } from './product-words';

/** How one dry chlorine goes into the water, as its label says; saved at once. */
export function LabelWay({ product }: { product: HouseholdProduct }) {
  const t = useTranslations('pool');
  const words = useProductWords();
  const problemWords = useProblemWords();
  const save = useSaveProduct();
  // What was just chosen shows at once; a refusal brings back what is saved.
  const chosen = save.isPending ? save.variables.labelWay : product.labelWay;
  return (
    <RadioRows
      label={t('label.way', { name: words.name(product) })}
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
