'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { PhotosOf } from '@/components/photos/photos-of';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { useRemoveProduct } from '@/lib/client/shelf-products';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import type { HouseholdProduct } from '@/lib/schemas/household-product';
import { factsOf } from './ingredients';
import { IngredientMark } from './ingredient-mark';
import { useProductWords } from './product-words';
import { usePoolSetting } from './setting';

/** What stands on the shelf, a row each. */
export function ShelfList({
  products,
  onEdit,
}: {
  products: readonly HouseholdProduct[];
  /** Left out while another product is being written down. */
  onEdit?: ((product: HouseholdProduct) => void) | undefined;
}) {
  const t = useTranslations('pool.shelf');
  const words = useProductWords();
  const { place, timeZone, locale } = usePoolSetting();
  const [leaving, setLeaving] = useState<HouseholdProduct | null>(null);
  return (
    <>
      <ul>
        {products.map((product) => (
          <li
            key={product.id}
            className="grid grid-cols-[30px_1fr_auto] items-center gap-x-2 border-t border-rule pt-2.5 pb-1 first:border-t-0"
          >
            <IngredientMark substance={product.substance} form={product.form} />
            <span className="min-w-0">
              <b className="block text-field font-strong">{words.name(product)}</b>
              <span className="block text-small text-ink-2">{words.detail(product)}</span>
              {factsOf(product.substance).asksLabelWay && product.labelWay === 'unknown' ? (
                <span className="block text-small font-emphasis text-ochre-ink">{t('noWay')}</span>
              ) : null}
            </span>
            <span className="font-display text-name font-headline">{words.left(product)}</span>
            {onEdit === undefined ? null : (
              <span className="col-start-2 -ml-1.5 flex gap-3">
                <Button
                  variant="quiet"
                  onClick={() => onEdit(product)}
                  aria-label={t('changeOne', { name: words.name(product) })}
                >
                  {t('change')}
                </Button>
                <Button
                  variant="quiet"
                  onClick={() => setLeaving(product)}
                  aria-label={t('removeOne', { name: words.name(product) })}
                >
                  {t('remove')}
                </Button>
              </span>
            )}
            {place === 'profile' ? (
              <div className="col-start-2 pb-1.5">
                <PhotosOf kind="label" about={product.id} setting={{ timeZone, locale }} />
              </div>
            ) : null}
          </li>
        ))}
      </ul>
      {leaving === null ? null : <RemoveDialog product={leaving} onDone={() => setLeaving(null)} />}
    </>
  );
}

function RemoveDialog({ product, onDone }: { product: HouseholdProduct; onDone: () => void }) {
  const t = useTranslations('pool.shelf');
  const common = useTranslations('common');
  const words = useProductWords();
  const problemWords = useProblemWords();
  const remove = useRemoveProduct();
  return (
    <Dialog
      open
      onOpenChange={(open) => {
        if (!open) onDone();
      }}
      title={t('removeTitle', { name: words.name(product) })}
      description={t('removeNote')}
      closeLabel={common('close')}
      actions={
        <>
          <Button
            variant="primary"
            onClick={() => remove.mutate(product.id, { onSuccess: onDone })}
            busy={remove.isPending ? t('removing') : undefined}
          >
            {t('removeYes')}
          </Button>
          <Button onClick={onDone}>{common('cancel')}</Button>
        </>
      }
    >
      {remove.error === null ? null : <p role="alert">{problemWords(remove.error)}</p>}
    </Dialog>
  );
}
