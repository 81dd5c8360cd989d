'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Callout } from '@/components/ui/callout';
import { Segments } from '@/components/ui/segments';
import type { SetupState } from '@/lib/schemas/pool-profile';
import { poolSizeSchema, waterOf } from '@/lib/schemas/pool-size';
import { scopeOf } from '@/lib/schemas/pool-scope';
import { formatQuantityIn } from '@/lib/units/format';
import { EnteredSize } from './entered-size';
import { checkAnswers, type FieldProblems, focusFirstProblem, noProblems } from './field-problems';
import { sizeDraftSchema } from './kept-size';
import { MeasureFields } from './measure-fields';
import { useSaveStep } from './save-step';
import { usePoolSetting } from './setting';
import { FloorChoice, ShapeChoice } from './shape-choice';
import { emptySize, inSystem, lengthUnit, sizeAnswersOf, sizeDraftOf, unitQuestionOf } from './size-draft';
import { SizeDrawing } from './size-drawing';
import { StepFrame } from './step-frame';
import { useStepDraft } from './use-step-draft';
import { useVolumeWords } from './volume-words';

/** How much water it holds: from paper, or from a tape measure with a drawing that follows. */
export function SizeStep({ state }: { state: SetupState }) {
  const t = useTranslations('pool');
  const units = useTranslations('units');
  const { system, locale } = usePoolSetting();
  const words = useVolumeWords();
  const { size } = state.profile;
  const kept = useStepDraft('size', sizeDraftSchema, size, () =>
    size === null ? emptySize(system) : sizeDraftOf(size, system, locale),
  );
  const draft = inSystem(kept.draft, system, locale);
  const change = (part: Partial<typeof draft>) => kept.change({ ...draft, ...part });
  const [tried, setTried] = useState(false);
  const { send, busy, problem } = useSaveStep((saved) => kept.settle(saved.profile.size));

  const { answers, problems: all } = checkAnswers(poolSizeSchema, sizeAnswersOf(draft));
  const question = unitQuestionOf(draft);
  // Shown as soon as it is known, also while it is not said yet whether it is a guess.
  const known = checkAnswers(poolSizeSchema, sizeAnswersOf({ ...draft, sure: draft.sure ?? false })).answers;
  const water = known && waterOf(known);
  // "Yes, that is the unit" about what no pool can hold is answered at once, not only on Next.
  const problems: FieldProblems = tried
    ? all
    : draft.confirmed !== '' && all.volume
      ? { volume: all.volume }
      : noProblems;

  const next = () => {
    setTried(true);
    if (answers) send({ step: 'size', answers });
    else focusFirstProblem();
  };

  const metres = (value: number) => formatQuantityIn(value, 'length', lengthUnit(system), locale).value;
  const average =
    water?.meanDepth === undefined || draft.how === 'entered'
      ? undefined
      : t('drawing.average', { depth: units(lengthUnit(system), { value: metres(water.meanDepth) }) });

  const reasons = water === undefined ? [] : scopeOf(null, water.volume).reasons;

  const how = (
    <Segments
      hideLabel
      label={t('size.how.label')}
      choices={[
        { value: 'entered', label: t('size.how.entered') },
        { value: 'measured', label: t('size.how.measured') },
      ]}
      value={draft.how}
      onChange={(value) => change({ how: value })}
    />
  );

  return (
    <StepFrame
      step="size"
      title={t('size.title')}
      lead={draft.how === 'entered' ? t('size.leadEntered') : t('size.leadMeasured')}
      result={
        water === undefined
          ? { words: t('size.noResult') }
          : {
              figure: words.inSystem(water.volume, system),
              words: t('size.result', {
                other: words.inSystem(water.volume, system === 'metric' ? 'us' : 'metric'),
              }),
            }
      }
      next={t('size.next')}
      onNext={next}
      busy={busy}
      offReason={question === undefined ? undefined : t('step.answerAbove')}
      problem={problem}
      wide
    >
      {draft.how === 'entered' ? (
        <div className="max-w-form">
          {how}
          <EnteredSize draft={draft} change={change} problems={problems} />
          <p className="mt-4 text-small text-ink-2">{t('size.enteredNote')}</p>
        </div>
      ) : (
        <div className="grid gap-x-6.5 lg:grid-cols-[minmax(0,1fr)_300px] lg:grid-rows-[auto_1fr]">
          <div className="grid gap-3 lg:col-start-2 lg:border-l lg:border-rule lg:pl-6.5">
            {how}
            <ShapeChoice value={draft.shape} onChange={(shape) => change({ shape })} />
          </div>
          <div className="py-2 lg:col-start-1 lg:row-span-2 lg:row-start-1 lg:py-0">
            <SizeDrawing draft={draft} change={change} words={average} />
          </div>
          <div className="grid content-start gap-3 lg:col-start-2 lg:border-l lg:border-rule lg:pt-3 lg:pl-6.5">
            <MeasureFields draft={draft} change={change} problems={problems} />
            {problems.outline === undefined ? null : (
              <p role="alert" className="text-small font-emphasis text-terra-ink">
                {problems.outline}
              </p>
            )}
            <FloorChoice value={draft.floor} onChange={(floor) => change({ floor })} />
            <p className="text-small text-ink-2">{t('size.measuredNote')}</p>
          </div>
        </div>
      )}
      {question !== undefined || reasons.length === 0 ? null : (
        <SmallPool tiny={reasons.includes('under-2-cubic-metres')} />
      )}
    </StepFrame>
  );
}

/** What a small pool means, said before it is saved (care rules, part 1). */
function SmallPool({ tiny }: { tiny: boolean }) {
  const t = useTranslations('pool.size');
  const common = useTranslations('common');
  return (
    <Callout severity={tiny ? 'stop' : 'note'} word={common(tiny ? 'stop' : 'note')} className="mt-4 max-w-form">
      {t(tiny ? 'tinyNote' : 'smallNote')}
    </Callout>
  );
}
