'use client';

import { useQuery } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { RadioRows } from '@/components/ui/radio-rows';
import { shelfOptions } from '@/lib/client/shelf-products';
import { labelAnswersSchema, type SetupState } from '@/lib/schemas/pool-profile';
import { limits } from '@/lib/standards/limits';
import { formatNumber } from '@/lib/units/format';
import { checkAnswers, focusFirstProblem, noProblems } from './field-problems';
import { hourText } from './hours';
import { factsOf } from './ingredients';
import { emptyLabel, labelAnswersOf, labelDraftOf, labelDraftSchema, swimLimitAnswers } from './label-draft';
import { LabelWay } from './label-way';
import { useSaveStep } from './save-step';
import { usePoolSetting } from './setting';
import { Span } from './span';
import { StepFrame } from './step-frame';
import { hoursText } from './sun-hours';
import { useStepDraft } from './use-step-draft';

/** What the label of the chlorine says: from which level on people may swim again, and how it goes in. */
export function LabelStep({ state }: { state: SetupState }) {
  const t = useTranslations('pool.label');
  const { locale, personName } = usePoolSetting();
  const { label, swimLimitSetBy } = state.profile;
  const { draft, change, settle } = useStepDraft('label', labelDraftSchema, label, () =>
    label ? labelDraftOf(label) : emptyLabel,
  );
  const [problems, setProblems] = useState(noProblems);
  const { send, busy, problem } = useSaveStep((saved) => settle(saved.profile.label));
  const { data: shelf = [] } = useQuery(shelfOptions());
  const dry = shelf.filter(({ substance }) => factsOf(substance).asksLabelWay);
  const figure = (value: number) => formatNumber(value, { decimals: 0, locale });
  const usual = limits.swimLimitDefault.value;

  const next = () => {
    const checked = checkAnswers(labelAnswersSchema, labelAnswersOf(draft));
    setProblems(checked.problems);
    if (checked.answers) send({ step: 'label', answers: checked.answers });
    else focusFirstProblem();
  };

  const result = () => {
    if (draft.swimLimit === null) return { words: t('noResult') };
    if (draft.swimLimit === 'not-said') return { figure: figure(usual), words: t('resultUsual') };
    const unchanged = label?.swimLimit === draft.swimLimit;
    return {
      figure: figure(draft.swimLimit),
      words: t('result', { name: (unchanged ? swimLimitSetBy : null) ?? personName }),
    };
  };

  return (
    <StepFrame
      step="label"
      title={t('title')}
      lead={t('lead')}
      result={result()}
      next={t('next')}
      onNext={next}
      busy={busy}
      problem={problem}
    >
      <RadioRows
        hideLabel
        label={t('title')}
        choices={swimLimitAnswers.map((limit) => ({
          value: `${limit}`,
          label: limit === 'not-said' ? t('limit.notSaid') : t('limit.at', { limit: figure(limit) }),
          detail: limit === 'not-said' ? t('limit.notSaidNote', { limit: figure(usual) }) : undefined,
        }))}
        value={draft.swimLimit === null ? null : `${draft.swimLimit}`}
        onChange={(chosen) => {
          const limit = swimLimitAnswers.find((answer) => `${answer}` === chosen);
          if (limit !== undefined) change({ swimLimit: limit });
        }}
        problem={problems.swimLimit}
      />
      <fieldset className="border-t border-rule pt-3">
        <legend className="sr-only">{t('swimHours')}</legend>
        <p aria-hidden="true" className="mb-1.5 flex justify-between gap-3 text-label font-strong">
          {t('swimHours')}
          <span className="text-small font-text text-ink-2">{t('swimHoursAside')}</span>
        </p>
        <Span
          from={draft.from}
          to={draft.to}
          step={0.5}
          onChange={(end, hour) => {
            const hours = { from: draft.from, to: draft.to, [end]: hour };
            if (hours.from < hours.to) change(hours);
          }}
          labels={{ from: t('swimFrom'), to: t('swimTo') }}
          write={(hour) => hourText(hour, locale)}
          words={t('hours', { hours: hoursText(draft) })}
          midnight={t('midnight')}
          problem={problems['swimHours.to']}
        />
      </fieldset>
      {dry.length === 0 ? null : (
        <fieldset className="mt-3 grid gap-4 border-t border-rule pt-3">
          <legend className="sr-only">{t('ways')}</legend>
          {dry.map((product) => (
            <LabelWay key={product.id} product={product} />
          ))}
        </fieldset>
      )}
    </StepFrame>
  );
}
