'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { z } from 'zod';
import { RadioRows } from '@/components/ui/radio-rows';
import { liningSchema, type SetupState, surfaceAnswers } from '@/lib/schemas/pool-profile';
import { surfaceRanges } from '@/lib/standards/surface-ranges';
import { formatNumber } from '@/lib/units/format';
import { checkAnswers, focusFirstProblem, noProblems } from './field-problems';
import { LiningSwatch } from './lining-swatch';
import { useSaveStep } from './save-step';
import { usePoolSetting } from './setting';
import { StepFrame } from './step-frame';
import { useStepDraft } from './use-step-draft';

const draftSchema = z.object({ surface: z.enum(surfaceAnswers).nullable() });
const order = [
  'plaster',
  'tile',
  'vinyl',
  'fibreglass',
  'painted',
  'unsure',
] as const satisfies (typeof surfaceAnswers)[number][];

/** What the walls are made of: it decides how much calcium the water should hold. */
export function LiningStep({ state }: { state: SetupState }) {
  const t = useTranslations('pool.lining');
  const { locale } = usePoolSetting();
  const { lining } = state.profile;
  const { draft, change, settle } = useStepDraft('lining', draftSchema, lining, () => lining ?? { surface: null });
  const [problems, setProblems] = useState(noProblems);
  const { send, busy, problem } = useSaveStep((saved) => settle(saved.profile.lining));
  const { surface } = draft;

  const next = () => {
    const checked = checkAnswers(liningSchema, draft);
    setProblems(checked.problems);
    if (checked.answers) send({ step: 'lining', answers: checked.answers });
    else focusFirstProblem();
  };

  const figure = (value: number) => formatNumber(value, { decimals: 0, locale });
  const result = () => {
    if (surface === null) return { words: t('noResult') };
    const [low, high] = surfaceRanges[surface === 'unsure' ? 'plaster' : surface].calciumHardness;
    return { figure: t('range', { low: figure(low), high: figure(high) }), words: t(`result.${surface}`) };
  };

  return (
    <StepFrame
      step="lining"
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
        choices={order.map((value) => ({
          value,
          label: t(`surface.${value}.label`),
          detail: t(`surface.${value}.detail`),
          picture: <LiningSwatch surface={value} />,
        }))}
        value={surface}
        onChange={(value) => change({ surface: value })}
        problem={problems.surface}
      />
    </StepFrame>
  );
}
