'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { FieldWordsBelow } from '@/components/ui/field';
import { NumberTextField } from '@/components/ui/number-text-field';
import { TickBox } from '@/components/ui/tick-box';
import { type SetupState, waterAndEquipmentSchema } from '@/lib/schemas/pool-profile';
import { readingMethods } from '@/lib/schemas/reading-kinds';
import { FeederFields } from './feeder-fields';
import { checkAnswers, focusFirstProblem, noProblems } from './field-problems';
import { PumpTimes } from './pump-times';
import { useSaveStep } from './save-step';
import { usePoolSetting } from './setting';
import { StepFrame } from './step-frame';
import { hoursText } from './sun-hours';
import { useStepDraft } from './use-step-draft';
import { emptyWater, pumpHours, waterAnswersOf, waterDraftOf, waterDraftSchema, waterInSystem } from './water-draft';

/** Pump, feeder, fill water, how the water is tested. What is not known is left out, and the usual figure taken. */
export function WaterStep({ state }: { state: SetupState }) {
  const t = useTranslations('pool.water');
  const { system, locale } = usePoolSetting();
  const { water } = state.profile;
  const kept = useStepDraft('water', waterDraftSchema, water, () =>
    water ? waterDraftOf(water, system, locale) : emptyWater(system),
  );
  const draft = waterInSystem(kept.draft, system, locale);
  const change = (part: Partial<typeof draft>) => kept.change({ ...draft, ...part });
  const [problems, setProblems] = useState(noProblems);
  const { send, busy, problem } = useSaveStep((saved) => kept.settle(saved.profile.water));

  const next = () => {
    const checked = checkAnswers(waterAndEquipmentSchema, waterAnswersOf(draft));
    setProblems(checked.problems);
    if (checked.answers) send({ step: 'water', answers: checked.answers });
    else focusFirstProblem();
  };

  const hours = pumpHours(draft.pump);
  const fill = (name: 'calciumHardness' | 'totalAlkalinity' | 'pH') => (
    <NumberTextField
      key={name}
      label={t(`fill.${name}`)}
      name={`fill-${name}`}
      {...(name === 'pH' ? {} : { unit: t('fill.unit', { system }) })}
      value={draft[name]}
      onChange={(event) => change({ [name]: event.target.value })}
      hint={t(`fill.usual.${name}`)}
      problem={problems[`fillWater.${name}`]}
    />
  );

  return (
    <StepFrame
      step="water"
      title={t('title')}
      lead={t('lead')}
      result={{ figure: t('pump.hours', { hours: hoursText({ from: 0, to: hours }) }), words: t('result') }}
      next={t('next')}
      onNext={next}
      busy={busy}
      problem={problem}
    >
      <PumpTimes pump={draft.pump} onChange={(pump) => change({ pump })} />
      <div className="mt-4 border-t border-rule pt-3">
        <FeederFields draft={draft} change={change} problems={problems} />
      </div>
      <fieldset className="mt-4 border-t border-rule pt-3">
        <legend className="sr-only">{t('fill.label')}</legend>
        <p aria-hidden="true" className="mb-1.5 flex justify-between gap-3 text-label font-strong">
          {t('fill.label')}
          <span className="text-small font-text text-ink-2">{t('fill.aside')}</span>
        </p>
        <div className="grid grid-cols-2 gap-x-3 gap-y-3 sm:grid-cols-3">
          {fill('calciumHardness')}
          {fill('totalAlkalinity')}
          {fill('pH')}
        </div>
      </fieldset>
      <fieldset
        className="mt-4 border-t border-rule pt-3"
        aria-describedby={problems.testMethods === undefined ? undefined : 'test-methods-problem'}
        data-problem={problems.testMethods === undefined ? undefined : true}
      >
        <legend className="sr-only">{t('methods.label')}</legend>
        <p aria-hidden="true" className="flex justify-between gap-3 text-label font-strong">
          {t('methods.label')}
          <span className="text-small font-text text-ink-2">{t('methods.aside')}</span>
        </p>
        <div className="grid grid-cols-3 gap-x-3">
          {readingMethods.map((method) => (
            <TickBox
              key={method}
              name={`method-${method}`}
              label={t(`methods.${method}`)}
              checked={draft.methods.includes(method)}
              onChange={(checked) =>
                change({
                  methods: checked ? [...draft.methods, method] : draft.methods.filter((other) => other !== method),
                })
              }
            />
          ))}
        </div>
        {problems.testMethods === undefined ? null : (
          <FieldWordsBelow id="test-methods-problem" problem={problems.testMethods} />
        )}
      </fieldset>
    </StepFrame>
  );
}
