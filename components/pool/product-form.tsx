'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Callout } from '@/components/ui/callout';
import { ProblemState } from '@/components/ui/problem-state';
import { RadioRows } from '@/components/ui/radio-rows';
import { Segments } from '@/components/ui/segments';
import { Select } from '@/components/ui/select';
import { TextField } from '@/components/ui/text-field';
import { RequestProblem } from '@/lib/client/fetch-json';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import { useSaveProduct } from '@/lib/client/shelf-products';
import { householdProductSchema } from '@/lib/schemas/household-product';
import { labelWays } from '@/lib/schemas/shelf-product';
import { checkAnswers, focusFirstProblem, noProblems } from './field-problems';
import { factsOf, ingredientNames } from './ingredients';
import { missingOf, productAnswersOf } from './product-draft';
import type { ProductFieldsProps } from './product-fields';
import { ProductStrength } from './product-strength';
import { ProductAmounts } from './product-amounts';

/** One product, copied from its label. */
export function ProductForm({
  draft,
  change,
  onKept,
  onLeave,
}: Omit<ProductFieldsProps, 'problems'> & { onKept: () => void; onLeave: () => void }) {
  const t = useTranslations('pool.product');
  const names = useTranslations('pool.ingredient');
  const common = useTranslations('common');
  const words = useProblemWords();
  const save = useSaveProduct();
  const [problems, setProblems] = useState(noProblems);
  const facts = draft.substance === null ? undefined : factsOf(draft.substance);

  const keep = () => {
    const checked = checkAnswers(householdProductSchema, productAnswersOf(draft));
    const missing = Object.fromEntries(missingOf(draft).map((what) => [fieldOf[what], t(`missing.${what}`)]));
    const all = { ...checked.problems, ...missing };
    setProblems(all);
    if (checked.answers && Object.keys(all).length === 0) save.mutate(checked.answers, { onSuccess: onKept });
    else focusFirstProblem();
  };

  return (
    <section aria-label={t('title')} className="grid gap-4 border-y-due border-ink bg-paper-lift p-4">
      <h2 className="font-display text-section">{t('title')}</h2>
      <Select
        label={t('ingredient')}
        name="substance"
        placeholder={t('choose')}
        options={ingredientNames.map((value) => ({ value, label: names(`${value}.name`) }))}
        value={draft.substance}
        onChange={(substance) => {
          const { forms } = factsOf(substance);
          change({ substance, form: forms.length === 1 ? (forms[0] ?? null) : null, basis: null, labelWay: null });
        }}
        hint={draft.substance === null ? t('ingredientNote') : names(`${draft.substance}.plain`)}
        problem={problems.substance}
      />
      {facts === undefined ? null : (
        <>
          {facts.forms.length === 1 ? null : (
            <Segments
              label={t('form.label')}
              choices={facts.forms.map((form) => ({ value: form, label: t(`form.${form}`) }))}
              value={draft.form}
              onChange={(form) => change({ form })}
              problem={problems.form}
            />
          )}
          <ProductStrength draft={draft} change={change} problems={problems} />
          <ProductAmounts draft={draft} change={change} problems={problems} />
          {facts.asksLabelWay ? (
            <RadioRows
              label={t('way.label')}
              choices={labelWays.map((way) => ({
                value: way,
                label: t(`way.${way}.label`),
                detail: t(`way.${way}.detail`),
              }))}
              value={draft.labelWay}
              onChange={(labelWay) => change({ labelWay })}
              problem={problems.labelWay}
            />
          ) : null}
          {draft.substance === 'other' ? (
            <Callout severity="note" word={common('note')}>
              {t('otherNote')}
            </Callout>
          ) : null}
          <TextField
            label={t('name')}
            aside={common('optional')}
            name="name"
            autoComplete="off"
            maxLength={80}
            value={draft.name}
            onChange={(event) => change({ name: event.target.value })}
            problem={problems.name}
          />
        </>
      )}
      {save.error === null ? null : (
        <ProblemState title={t('notSaved')}>
          <p>{words(save.error)}</p>
          {save.error instanceof RequestProblem
            ? save.error.problems.map(({ path, message }) => <p key={path}>{message}</p>)
            : null}
        </ProblemState>
      )}
      <div className="flex flex-wrap gap-2.5">
        <Button variant="primary" onClick={keep} busy={save.isPending ? t('keeping') : undefined}>
          {t('keep')}
        </Button>
        <Button onClick={onLeave}>{t('leave')}</Button>
      </div>
    </section>
  );
}

/** Where each thing that is missing is said. */
const fieldOf = { labelWay: 'labelWay', basis: 'basis', stock: 'stock', tooStrong: 'strength' } as const;
