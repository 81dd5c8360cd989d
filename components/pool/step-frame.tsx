'use client';

import { ArrowRight } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { useId } from 'react';
import { Button } from '@/components/ui/button';
import { classNames } from '@/components/ui/class-names';
import { contentId, SkipLink } from '@/components/navigation/skip-link';
import { DoubleRule } from '@/components/ui/double-rule';
import { ProblemState } from '@/components/ui/problem-state';
import type { SetupStep } from '@/lib/schemas/pool-profile';
import { StepHeader } from './step-header';
import { StepList } from './step-list';
import { usePoolSetting } from './setting';
import { UnitSwitch } from './unit-switch';

/** What the answers so far come to: a figure and what it is, above the one main button. */
type RunningResult = { figure?: string | undefined; words: string };

export type StepFrameProps = {
  step: SetupStep;
  title: string;
  lead: string;
  result: RunningResult;
  /** The label of the one main button. */
  next: string;
  onNext: () => void;
  busy: boolean;
  /** Why the main button is off: a question above is not answered yet. */
  offReason?: string | undefined;
  /** Why it could not be saved. */
  problem?: { title: string; lines: readonly string[] } | undefined;
  /** The step lays out a drawing and its fields over the whole width. */
  wide?: boolean;
  children: React.ReactNode;
};

/** One step: a question, what it changes, one main button. */
export function StepFrame(props: StepFrameProps) {
  const { step, title, lead, result, next, onNext, busy, offReason, problem, wide = false, children } = props;
  const t = useTranslations('pool');
  const reasonId = useId();
  const { place } = usePoolSetting();
  // Opened again for correction, the step stands inside the household's own page.
  const Content = place === 'profile' ? 'div' : 'main';
  return (
    <form
      noValidate
      className={classNames(
        'mx-auto flex w-full max-w-[1280px] flex-col',
        place === 'profile' ? 'min-h-[70dvh]' : 'min-h-dvh',
      )}
      onSubmit={(event) => {
        event.preventDefault();
        if (offReason === undefined && !busy) onNext();
      }}
    >
      {place === 'profile' ? null : <SkipLink />}
      <StepHeader step={step} />
      <Content id={place === 'profile' ? undefined : contentId} className="flex-1">
        <div className="grid px-margin md:grid-cols-[1fr_330px] md:border-t md:border-rule">
          <div className="pt-3.5 md:py-3.5 md:pr-10">
            <h1 className="font-display text-board md:text-headline">{title}</h1>
            <p className="mt-0.5 text-body text-pretty text-ink-2 md:font-display md:text-lead md:text-ink">{lead}</p>
          </div>
          <div className="hidden border-l border-rule py-3.5 pl-6.5 md:block">
            <ResultWords result={result} large />
          </div>
        </div>
        <DoubleRule className="mx-margin hidden md:block" />
        <div
          className={classNames(
            'grid content-start px-margin pt-3 pb-6 md:pt-0',
            wide ? 'md:grid-cols-[180px_minmax(0,1fr)]' : 'md:grid-cols-[180px_minmax(0,640px)]',
          )}
        >
          <StepList step={step} />
          <div className="min-w-0 md:pt-6 md:pl-6">
            {children}
            {problem === undefined ? null : (
              <ProblemState className="mt-5" title={problem.title}>
                {problem.lines.map((line) => (
                  <p key={line}>{line}</p>
                ))}
              </ProblemState>
            )}
            <UnitSwitch className="mt-6 border-t border-rule pt-3 md:hidden" />
          </div>
        </div>
      </Content>
      <footer
        className={classNames(
          'sticky z-10 border-t border-ink bg-paper-lift px-margin pt-2.5 pb-3.5 md:mx-margin md:flex md:min-h-18.5 md:items-center md:gap-4.5 md:bg-paper md:px-0 md:py-2.5',
          place === 'profile' ? 'bottom-tabs md:bottom-0' : 'bottom-0',
        )}
      >
        <div aria-live="polite" className="mb-2 md:hidden">
          <ResultWords result={offReason === undefined ? result : { words: offReason }} />
        </div>
        <div className="mb-2 hidden md:mb-0 md:block">
          <UnitSwitch />
        </div>
        <p id={reasonId} className="hidden text-small text-ink-2 md:ml-auto md:block">
          {offReason}
        </p>
        <Button
          type="submit"
          variant="primary"
          size="large"
          className="w-full md:min-h-11 md:w-auto"
          busy={busy ? t('step.saving') : undefined}
          {...(offReason === undefined ? {} : { offReasonId: reasonId })}
        >
          {place === 'profile' ? t('step.save') : next}
          <ArrowRight aria-hidden="true" className="hidden size-4.5 md:block" />
        </Button>
      </footer>
    </form>
  );
}

function ResultWords({ result, large = false }: { result: RunningResult; large?: boolean }) {
  const { figure, words } = result;
  return (
    <p className={classNames(large ? '' : 'flex min-h-6.5 flex-wrap items-baseline gap-x-2.5')}>
      {figure === undefined ? null : (
        <b
          className={classNames(
            'font-display whitespace-nowrap',
            large ? 'block text-headline' : 'text-[22px] leading-6.5 font-headline',
          )}
        >
          {figure}
        </b>
      )}
      <span className="text-small text-ink-2">{words}</span>
    </p>
  );
}
