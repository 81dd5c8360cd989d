'use client';

import { useTranslations } from 'next-intl';
import type { Learnt, LearntRow as Row } from '@/lib/schemas/learnt';
import { LearntBars } from './learnt-bars';
import { useFigures } from './use-figures';
import type { useLearntWords } from './use-learnt-words';
import { WhyWeThinkSo } from './why-we-think-so';

/** One thing that the pool has taught: its name, both bars, and what they say. */
export function LearntRow({
  row,
  learnt,
  words,
}: {
  row: Row;
  learnt: Learnt;
  words: ReturnType<typeof useLearntWords>;
}) {
  const t = useTranslations('learnt');
  const { figure, about, inShown, tick, lastTick } = useFigures(row);
  const range = ({ p10, p90 }: Row['before']) => ({ low: figure(p10), high: figure(p90) });
  const name = words.name(row.thing);
  return (
    <section className="grid gap-x-4 border-t border-rule sm:grid-cols-[minmax(0,1fr)_250px] lg:grid-cols-[118px_minmax(0,1fr)_250px]">
      <div className="pt-3.5 sm:col-span-2 lg:col-span-1 lg:pb-3">
        <h3 className="font-display text-name">{name}</h3>
        <p className="text-chart text-ink-2">{words.note(row.thing)}</p>
      </div>
      <div className="min-w-0 py-2.5">
        <LearntBars
          before={inShown(row.before)}
          learnt={inShown(row.learnt)}
          beforeWords={t('before', range(row.before))}
          learntWords={t('learnt', range(row.learnt))}
          tick={tick}
          lastTick={lastTick}
        />
      </div>
      <div className="pb-3 text-body sm:border-l sm:border-rule sm:py-3.5 sm:pl-6">
        <p className="font-display text-section">{words.headingOf(row, about)}</p>
        <p>{words.sentenceOf(row)}</p>
        <WhyWeThinkSo row={row} learnt={learnt} name={name} />
      </div>
    </section>
  );
}
