'use client';

import { useTranslations } from 'next-intl';
import { nextDose } from '@/components/week-sheet/dose-state';
import { useSheet } from '@/components/week-sheet/sheet-context';
import type { SheetDay } from '@/components/week-sheet/sheet-times';
import { keyOf, toDoOf } from '@/components/week-sheet/to-do-items';
import { usePaper } from './paper-context';
import { PaperItem } from './paper-item';
import { GUTTER } from './paper-size';

/** What to do, each day under its own hours, with boxes to tick and lines to write on. A frame is round the next dose's day. */
export function PaperToDo() {
  const t = useTranslations('week.lane');
  const { picture } = useSheet();
  const columns = picture.days.map(({ from, to }) => `minmax(0,${to - from}fr)`).join(' ');
  return (
    <section
      className="grid min-h-[128px] border-t-todo border-b border-ink"
      style={{ gridTemplateColumns: `${GUTTER}px minmax(0,1fr)` }}
    >
      <div className="pt-1.5 pr-1.5">
        <h2 className="font-display text-name">{t('toDo')}</h2>
        <p>{t('toDoNote')}</p>
      </div>
      <div className="grid" style={{ gridTemplateColumns: columns }}>
        {picture.days.map((day) => (
          <PaperDayToDo key={day.day} day={day} />
        ))}
      </div>
    </section>
  );
}

function PaperDayToDo({ day }: { day: SheetDay }) {
  const t = useTranslations('week-print.toDo');
  const { sheet } = useSheet();
  const { mayAdd } = usePaper();
  const all = toDoOf(day, sheet);
  const next = mayAdd ? nextDose(sheet.doses) : undefined;
  const holdsNext = all.some((item) => item.kind === 'dose' && item.dose.id === next?.id);
  // Where nothing may be added from the page it names no amount that could be.
  const items = all.filter((item) => mayAdd || item.kind !== 'dose' || item.dose.status !== 'planned');
  return (
    <div
      className={`flex min-w-0 flex-col gap-1.5 border-l border-ink pt-1.5 pr-1 pb-1.5 pl-1.25 ${holdsNext ? 'outline-[2.2px] -outline-offset-[1.1px] outline-ink' : ''}`}
    >
      {items.length < all.length && <p className="font-strong">{t('barred')}</p>}
      {all.length === 0 && <EmptyDay day={day} />}
      {items.map((item) => (
        <PaperItem key={keyOf(item)} item={item} />
      ))}
    </div>
  );
}

function EmptyDay({ day }: { day: SheetDay }) {
  const t = useTranslations('week.lane');
  const { picture } = useSheet();
  const { mayAdd } = usePaper();
  const ends = picture.planEndsAt;
  if (day.to <= picture.now) return <p>{t('nothingDone')}</p>;
  if (ends === undefined || day.from >= ends) return <p>{t('noPlanDay')}</p>;
  return mayAdd ? <p className="font-emphasis">{t('nothingToAdd')}</p> : null;
}
