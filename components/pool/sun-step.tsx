'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Segments } from '@/components/ui/segments';
import { TickBox } from '@/components/ui/tick-box';
import { isTimeZone } from '@/lib/calendar/zone-offset';
import { covers } from '@/lib/schemas/pool';
import { type SetupState, sunAndPlaceSchema } from '@/lib/schemas/pool-profile';
import { checkAnswers, focusFirstProblem, noProblems } from './field-problems';
import { PlaceFields } from './place-fields';
import { useSaveStep } from './save-step';
import { usePoolSetting } from './setting';
import { StepFrame } from './step-frame';
import { clearDayOf, emptySun, sunAnswersOf, sunDraftOf, sunDraftSchema, sunSpan } from './sun-draft';
import { hoursText, SunHours } from './sun-hours';
import { useStepDraft } from './use-step-draft';

/** Where the pool lies and when the sun reaches it: nothing takes more chlorine than the sun. */
export function SunStep({ state }: { state: SetupState }) {
  const t = useTranslations('pool.sun');
  const { locale, timeZone } = usePoolSetting();
  const { sun } = state.profile;
  const { draft, change, settle } = useStepDraft('sun', sunDraftSchema, sun, () =>
    sun ? sunDraftOf(sun, locale) : emptySun(timeZone),
  );
  const [problems, setProblems] = useState(noProblems);
  const { send, busy, problem } = useSaveStep((saved) => settle(saved.profile.sun));
  const day = clearDayOf(draft);
  const span = sunSpan(draft, day, sun);
  const south = draft.latitude !== '' && !draft.north;

  const next = () => {
    const checked = checkAnswers(sunAndPlaceSchema, sunAnswersOf(draft, sun));
    const zone = isTimeZone(draft.timeZone.trim()) ? noProblems : { timeZone: t('place.noSuchZone') };
    const all = { ...checked.problems, ...zone };
    setProblems(all);
    if (checked.answers && Object.keys(all).length === 0) send({ step: 'sun', answers: checked.answers });
    else focusFirstProblem();
  };

  return (
    <StepFrame
      step="sun"
      title={t('title')}
      lead={t('lead')}
      result={
        day === undefined
          ? { words: t('noResult') }
          : { figure: t('hours', { hours: hoursText(span) }), words: south ? t('resultSouth') : t('result') }
      }
      next={t('next')}
      onNext={next}
      busy={busy}
      problem={problem}
    >
      <PlaceFields draft={draft} change={change} problems={problems} />
      <fieldset className="mt-4 border-t border-rule pt-3">
        <legend className="sr-only">{t('directSun')}</legend>
        <p aria-hidden="true" className="mb-1.5 flex justify-between text-label font-strong">
          {t('directSun')}
          <span className="text-small font-text text-ink-2">{t('hours', { hours: hoursText(span) })}</span>
        </p>
        <SunHours day={day} span={span} onChange={(next) => change({ span: next })} />
        <p className="mt-1 text-small text-ink-2">{day === undefined ? t('sunNeedsPlace') : t('sunNote')}</p>
      </fieldset>
      <div className="mt-4 border-t border-rule pt-3">
        <Segments
          label={t('cover.label')}
          choices={covers.map((cover) => ({ value: cover, label: t(`cover.${cover}`) }))}
          value={draft.cover}
          onChange={(cover) => change({ cover })}
          hint={t('cover.note')}
          problem={problems.cover}
        />
      </div>
      <div className="mt-4 border-t border-rule pt-1.5">
        <TickBox
          name="waterFeatures"
          label={t('waterFeatures.label')}
          detail={t('waterFeatures.detail')}
          checked={draft.waterFeatures}
          onChange={(waterFeatures) => change({ waterFeatures })}
        />
      </div>
    </StepFrame>
  );
}
