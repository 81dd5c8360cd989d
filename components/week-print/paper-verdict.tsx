'use client';

import { useTranslations } from 'next-intl';
import { bold } from '@/components/week-sheet/bold';
import { useSheet } from '@/components/week-sheet/sheet-context';
import { useDosingBar } from '@/components/week-sheet/use-dosing-bar';
import { useVerdictWords } from '@/components/week-sheet/use-verdict-words';
import { useAsks } from './use-asks';
import { useMoment } from './use-moment';

/** What the week asks, and the swim verdict of the moment in which the page was made, with its standing line. */
export function PaperVerdict() {
  const t = useTranslations('week-print');
  const verdictWords = useTranslations('verdict');
  const { picture } = useSheet();
  const moment = useMoment();
  const asks = useAsks();
  const barred = useDosingBar();
  const { headline, reasons } = useVerdictWords();
  return (
    <section>
      <h2 className="font-display text-[20px] leading-[23px] font-headline">{asks}</h2>
      {barred !== undefined && <p className="mt-1 border-due border-ink px-2 py-1 text-small font-strong">{barred}</p>}
      <LedBySituation />
      <p className="mt-1 text-small">
        {t.rich('verdict', { headline, when: moment(picture.now), b: bold })}
        {reasons[0] !== undefined && <> {reasons[0].words}</>}
      </p>
      <p className="mt-1 border-l-stop border-ink pl-2 text-small">{verdictWords.rich('standing', { b: bold })}</p>
    </section>
  );
}

function LedBySituation() {
  const t = useTranslations('week.situation');
  const names = useTranslations('situations.kind');
  const { situation } = useSheet().sheet;
  if (situation === null) return null;
  const name = names(`${situation.situation.kind}.name`);
  return (
    <p className="mt-1 text-small">
      {t.rich(situation.procedure.lead === 'follow' ? 'beside' : 'leads', { name, b: bold })}
    </p>
  );
}
