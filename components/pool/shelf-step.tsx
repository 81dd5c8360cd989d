'use client';

import { useQuery } from '@tanstack/react-query';
import { Plus } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { z } from 'zod';
import { Button } from '@/components/ui/button';
import { InlineStop, StopWord } from '@/components/ui/callout';
import { EmptyState } from '@/components/ui/empty-state';
import { ProblemState } from '@/components/ui/problem-state';
import { Skeleton } from '@/components/ui/skeleton';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import { shelfOptions } from '@/lib/client/shelf-products';
import type { HouseholdProduct } from '@/lib/schemas/household-product';
import { factsOf } from './ingredients';
import { emptyProduct, productDraftOf, productDraftSchema, productInSystem } from './product-draft';
import { ProductForm } from './product-form';
import { useSaveStep } from './save-step';
import { usePoolSetting } from './setting';
import { ShelfList } from './shelf-list';
import { StepFrame } from './step-frame';
import { useStepDraft } from './use-step-draft';

const draftSchema = z.object({ editing: productDraftSchema.nullable() });

/** What stands on the shelf, by active ingredient. Each product is saved as it is kept. */
export function ShelfStep() {
  const t = useTranslations('pool.shelf');
  const common = useTranslations('common');
  const words = useProblemWords();
  const { system, locale } = usePoolSetting();
  const shelf = useQuery(shelfOptions());
  const { draft, change } = useStepDraft('shelf', draftSchema, null, () => ({ editing: null }));
  const { send, busy, problem } = useSaveStep(() => {});
  const editing = draft.editing && productInSystem(draft.editing, system, locale);
  const products = shelf.data ?? [];
  const usable = products.filter(canBePlanned).length;

  return (
    <StepFrame
      step="shelf"
      title={t('title')}
      lead={t('lead')}
      result={{
        figure: t('count', { count: products.length }),
        words: t('result', { usable, count: products.length }),
      }}
      next={t('next')}
      onNext={() => send({ step: 'shelf' })}
      busy={busy}
      problem={problem}
      offReason={editing ? t('finishFirst') : undefined}
    >
      {shelf.isPending ? <Skeleton className="h-40" label={common('loading')} /> : null}
      {shelf.isError ? (
        <ProblemState
          title={t('notLoaded')}
          action={<Button onClick={() => void shelf.refetch()}>{common('tryAgain')}</Button>}
        >
          {words(shelf.error)}
        </ProblemState>
      ) : null}
      {shelf.isSuccess && products.length === 0 && !editing ? (
        <EmptyState picture={<EmptyShelf />} title={t('emptyTitle')}>
          {t('emptyWords')}
        </EmptyState>
      ) : null}
      <ShelfList
        products={products}
        onEdit={editing ? undefined : (product) => change({ editing: productDraftOf(product, system, locale) })}
      />
      {editing ? (
        <ProductForm
          key={editing.id}
          draft={editing}
          change={(part) => change({ editing: { ...editing, ...part } })}
          onKept={() => change({ editing: null })}
          onLeave={() => change({ editing: null })}
        />
      ) : (
        <div className="border-t border-rule pt-1">
          <Button variant="quiet" onClick={() => change({ editing: emptyProduct(crypto.randomUUID(), system) })}>
            <Plus aria-hidden="true" className="size-5" />
            {products.length === 0 ? t('addFirst') : t('addAnother')}
          </Button>
        </div>
      )}
      <InlineStop className="mt-3 border-t border-ink pt-3">
        {t.rich('stop', { stop: (words) => <StopWord>{words}</StopWord> })}
      </InlineStop>
    </StepFrame>
  );
}

/** Blends are only stored; dry chlorine needs to know how it goes in. */
function canBePlanned({ substance, labelWay }: HouseholdProduct): boolean {
  return substance !== 'other' && !(factsOf(substance).asksLabelWay && labelWay === 'unknown');
}

function EmptyShelf() {
  return (
    <svg viewBox="0 0 96 66" aria-hidden="true" className="w-full fill-none stroke-ink" strokeWidth="1.4">
      <path d="M2 60H94" strokeWidth="1.6" />
      <path d="M10 60V26H30V60M38 60V18H58V60M68 60V34H84V60" strokeDasharray="3 3" />
    </svg>
  );
}
