'use client';

import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { useEffect, useRef, useState } from 'react';
import { triedLevels } from '@/components/charts/tried-levels';
import { Button } from '@/components/ui/button';
import { useHydrated } from '@/components/ui/use-hydrated';
import { useSheet } from '@/components/week-sheet/sheet-context';
import type { CourseAnswer } from '@/lib/client/try-it/messages';
import { useTryIt } from '@/lib/client/try-it/use-try-it';
import { tryOutStart } from '@/lib/client/try-out';
import type { TryOutChanges, TryOutStart } from '@/lib/schemas/try-out';
import { changesOf, type Draft, emptyDraft } from './draft';
import { TakenTryOuts } from './taken-try-outs';
import { TryControls } from './try-controls';
import { groundOf, type TryGround } from './try-ground';
import { TryResult } from './try-result';
import { showTriedLine } from './tried-line-store';
import { useWanted } from './use-wanted';
import { useTryProblemWords } from './use-try-problem-words';

/** Trying other swimmers, another sky, other tablets or evenings on the week ahead. */
export function TryIt() {
  const t = useTranslations('try-out');
  const { sheet, picture } = useSheet();
  const ground = groundOf(sheet, picture);
  const led = sheet.situation !== null && sheet.situation.procedure.lead !== 'follow';
  if (ground === undefined && !led) return null;
  return (
    <section className="pt-3.5 pb-3 md:pt-0 lg:pt-3.5">
      <h2 className="mb-1.5 font-display text-section">{t('title')}</h2>
      <TakenTryOuts />
      {led || ground === undefined ? <p className="text-body text-ink-2">{t('led')}</p> : <Trying ground={ground} />}
    </section>
  );
}

function Trying({ ground }: { ground: TryGround }) {
  const t = useTranslations('try-out');
  const common = useTranslations('common');
  const hydrated = useHydrated();
  const section = useRef<HTMLDivElement>(null);
  const wanted = useWanted(section);
  const { draft, setDraft, restarted } = useDraft(ground.planId);
  const known = { ...draft, moves: movesThatStand(draft, ground) };
  const problemWords = useTryProblemWords();
  const query = useQuery({ ...tryOutStart(ground.planId), enabled: wanted || hasTried(draft) });
  const { data: start, error: problem } = query;
  const planned = ground.tablets ?? 0;
  const mostTablets = Math.max(planned, start?.mostTablets ?? 0);
  const changes = changesOf(known, { days: ground.days, tablets: planned, mostTablets });
  return (
    <div ref={section} className="grid gap-3">
      <p className="text-small text-ink-2">{t('lead')}</p>
      {restarted && <p role="status">{t('restarted')}</p>}
      {/* Before React listens a press would be lost. */}
      <fieldset
        inert={!hydrated}
        aria-describedby={hydrated ? undefined : 'try-it-loading'}
        className="grid min-w-0 gap-3"
      >
        <legend className="sr-only">{t('title')}</legend>
        <TryControls
          ground={ground}
          start={start}
          draft={known}
          onChange={(next) => {
            performance.mark('try-it:input');
            setDraft(next);
          }}
        />
      </fieldset>
      {!hydrated && (
        <p id="try-it-loading" className="sr-only">
          {t('loading')}
        </p>
      )}
      {problem && !start && (
        <p role="status" className="text-small">
          {'code' in problem && problem.code === 'no-connection' ? t('offline') : problemWords(problem)}
          <Button variant="quiet" onClick={() => void query.refetch()}>
            {common('tryAgain')}
          </Button>
        </p>
      )}
      <TriedWeek
        start={start}
        failed={problem !== null}
        planId={ground.planId}
        changes={changes}
        onUsed={() => setDraft(emptyDraft)}
        onPutBack={() => setDraft({ ...emptyDraft, day: draft.day })}
      />
    </div>
  );
}

type TriedWeekProps = {
  start: TryOutStart | undefined;
  /** There is nothing to try on, and none is on its way. */
  failed: boolean;
  planId: string;
  changes: TryOutChanges | undefined;
  onUsed: () => void;
  onPutBack: () => void;
};

/** What comes of what is tried. An answer draws this and nothing else, so that its sentence does not wait for the controls. */
function TriedWeek({ start, failed, planId, changes, onUsed, onPutBack }: TriedWeekProps) {
  const { picture } = useSheet();
  const tried = useTryIt(start, changes);
  useShownLine(tried.course, picture.now);
  if (changes === undefined || (start === undefined && failed)) return null;
  return (
    <TryResult planId={start?.planId ?? planId} changes={changes} tried={tried} onUsed={onUsed} onPutBack={onPutBack} />
  );
}

type Held = { planId: string; draft: Draft; restarted: boolean };
const draftKey = ['try-out-draft'];

/**
 * What is being tried on a plan. It is kept beside the fetched sheet, because turning a tablet takes one form of the sheet
 * off the page and puts the other on it. Another plan begins anew, and says so where something was lost by it.
 */
function useDraft(planId: string) {
  const client = useQueryClient();
  const [held, hold] = useState<Held>(
    () => client.getQueryData<Held>(draftKey) ?? { planId, draft: emptyDraft, restarted: false },
  );
  if (held.planId !== planId)
    hold({ planId, draft: { ...emptyDraft, day: held.draft.day }, restarted: hasTried(held.draft) });
  useEffect(() => {
    client.setQueryData(draftKey, held);
  }, [client, held]);
  return {
    draft: held.draft,
    restarted: held.restarted,
    setDraft: (draft: Draft) => hold({ planId, draft, restarted: false }),
  };
}

function hasTried({ swimmers, sky, tablets, moves }: Draft): boolean {
  return tablets !== undefined || [swimmers, sky, moves].some((each) => Object.keys(each).length > 0);
}

/** A dose that went in meanwhile can no longer be moved. */
function movesThatStand({ moves }: Draft, { doses }: TryGround): Draft['moves'] {
  return Object.fromEntries(Object.entries(moves).filter(([id]) => doses.some((dose) => dose.id === id)));
}

/** Lays the newest course over the chlorine lane, and takes it away when nothing is tried. */
function useShownLine(course: CourseAnswer | undefined, now: number): void {
  const from = useRef(now);
  useEffect(() => {
    from.current = now;
  }, [now]);
  useEffect(() => {
    if (course === undefined) {
      showTriedLine(undefined);
      return;
    }
    const met = course.facts.find((fact) => fact.code === 'meets' && !fact.limit.startsWith('pH'));
    showTriedLine({
      levels: triedLevels(course.plan, course.tried, from.current),
      meets: met && 'level' in met ? { at: met.at, level: met.level } : undefined,
    });
  }, [course]);
  useEffect(() => () => showTriedLine(undefined), []);
}
