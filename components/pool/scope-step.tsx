'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import type { z } from 'zod';
import { PageLink } from '@/components/navigation/page-link';
import { Callout, InlineStop, StopWord } from '@/components/ui/callout';
import { RadioRows } from '@/components/ui/radio-rows';
import { Segments } from '@/components/ui/segments';
import { TickBox } from '@/components/ui/tick-box';
import { poolKinds, scopeAnswersSchema, type SetupState, waterSystems } from '@/lib/schemas/pool-profile';
import { checkAnswers, focusFirstProblem, noProblems } from './field-problems';
import { useSaveStep } from './save-step';
import { StepFrame } from './step-frame';
import { useStepDraft } from './use-step-draft';

const draftSchema = scopeAnswersSchema.extend({
  system: scopeAnswersSchema.shape.system.nullable(),
  kind: scopeAnswersSchema.shape.kind.nullable(),
});
type ScopeDraft = z.infer<typeof draftSchema>;

/** Questions whose answer is a tick; no tick means no. */
const limits = ['roofed', 'newSurface', 'openToPublic', 'planted'] as const;
const extras = ['ultravioletOrOzone', 'wellWater', 'copperHeater'] as const;

const untouched: ScopeDraft = {
  system: null,
  kind: null,
  roofed: false,
  newSurface: false,
  openToPublic: false,
  planted: false,
  ultravioletOrOzone: false,
  wellWater: false,
  copperHeater: false,
  handlesChemicals: false,
};

/** Before anything else: whether Wadewell can help with this pool at all. */
export function ScopeStep({ state }: { state: SetupState }) {
  const t = useTranslations('pool.scope');
  const common = useTranslations('common');
  const { scope } = state.profile;
  const { draft, change, settle } = useStepDraft('scope', draftSchema, scope, () => scope ?? untouched);
  const [problems, setProblems] = useState(noProblems);
  const { send, busy, problem } = useSaveStep((saved) => settle(saved.profile.scope));

  const next = () => {
    const checked = checkAnswers(scopeAnswersSchema, draft);
    setProblems(checked.problems);
    if (checked.answers) send({ step: 'scope', answers: checked.answers });
    else focusFirstProblem();
  };

  const ticks = (names: typeof limits | typeof extras) => (
    <div className="grid gap-x-6 md:grid-cols-2">
      {names.map((name) => (
        <TickBox
          key={name}
          name={name}
          label={t(`fact.${name}.label`)}
          detail={t(`fact.${name}.detail`)}
          checked={draft[name]}
          onChange={(checked) => change({ [name]: checked })}
        />
      ))}
    </div>
  );

  return (
    <StepFrame
      step="scope"
      title={t('title')}
      lead={t('lead')}
      result={{ words: t('result') }}
      next={t('next')}
      onNext={next}
      busy={busy}
      problem={problem}
    >
      <RadioRows
        hideLabel
        label={t('title')}
        choices={waterSystems.map((system) => ({
          value: system,
          label: t(`system.${system}.label`),
          detail: t(`system.${system}.detail`),
        }))}
        value={draft.system}
        onChange={(system) => change({ system })}
        problem={problems.system}
      />
      <InlineStop className="border-t border-ink py-3">
        {t.rich('stop', { stop: (words) => <StopWord>{words}</StopWord> })}
      </InlineStop>
      <div className="border-t border-rule pt-3 pb-4">
        <Segments
          label={t('kind.question')}
          choices={poolKinds.map((kind) => ({ value: kind, label: t(`kind.${kind}`) }))}
          value={draft.kind}
          onChange={(kind) => change({ kind })}
          hint={t('kind.note')}
          problem={problems.kind}
        />
      </div>
      <fieldset className="border-t border-rule pt-3 pb-2">
        <legend className="sr-only">{t('limits')}</legend>
        <p aria-hidden="true" className="text-label font-strong">
          {t('limits')}
        </p>
        {ticks(limits)}
      </fieldset>
      <fieldset className="border-t border-rule pt-3 pb-2">
        <legend className="sr-only">{t('extras')}</legend>
        <p aria-hidden="true" className="text-label font-strong">
          {t('extras')}
        </p>
        {ticks(extras)}
        {draft.wellWater ? (
          <Callout severity="take-care" word={common('takeCare')} className="mt-2 mb-2">
            {t('wellNote')}
          </Callout>
        ) : null}
      </fieldset>
      <div className="border-t border-rule pt-3">
        <p className="text-label font-strong">{t('chemicals.title')}</p>
        <TickBox
          name="handlesChemicals"
          label={t('chemicals.label')}
          detail={t('chemicals.detail')}
          checked={draft.handlesChemicals}
          onChange={(handlesChemicals) => change({ handlesChemicals })}
        />
        <PageLink
          href="/help/safety"
          target="_blank"
          className="inline-flex min-h-11 items-center text-body underline decoration-1 underline-offset-[3px]"
        >
          {t('chemicals.card')}
        </PageLink>
      </div>
    </StepFrame>
  );
}
