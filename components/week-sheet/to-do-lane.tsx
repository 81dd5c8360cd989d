'use client';

import { Bell } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import { bold } from './bold';
import type { Check } from './checks';
import { DoneReading } from './done-reading';
import { nextDose } from './dose-state';
import { useSheet } from './sheet-context';
import { instantOf, type SheetDay } from './sheet-times';
import { keyOf, toDoOf, type ToDoItem } from './to-do-items';
import { ToDoDose } from './to-do-dose';
import { ToDoStep } from './to-do-step';
import { useCheckReason } from './use-check-reason';
import { useDoseWords } from './use-dose-words';
import { useTimes } from './use-times';

/** What to do, each day under its own hours. A box is drawn only round the dose that is next. */
export function ToDoLane() {
  const t = useTranslations('week.lane');
  const { picture } = useSheet();
  const columns = picture.days.map(({ from, to }) => `minmax(0,${to - from}fr)`).join(' ');
  return (
    <div className="relative grid min-h-58 grid-cols-[var(--gutter)_minmax(0,1fr)] border-t-todo border-b border-ink">
      <div className="sticky left-0 z-2 bg-paper pt-3.25 pr-1.5">
        <h2 className="font-display text-name">{t('toDo')}</h2>
        <p className="mt-1 text-fine text-ink-2">{t('toDoNote')}</p>
      </div>
      <div className="grid" style={{ gridTemplateColumns: columns }}>
        {picture.days.map((day) => (
          <DayToDo key={day.day} day={day} />
        ))}
      </div>
    </div>
  );
}

function DayToDo({ day }: { day: SheetDay }) {
  const { sheet } = useSheet();
  const items = toDoOf(day, sheet);
  const next = nextDose(sheet.doses);
  const holdsNext = items.some((item) => item.kind === 'dose' && item.dose.id === next?.id);
  return (
    <div
      className={`flex min-w-0 flex-col gap-2.25 px-2.25 pt-3 pb-2 text-small ${
        holdsNext ? 'z-1 -mt-[1.4px] -mr-px -mb-px -ml-px border-[1.8px] border-ink bg-paper-lift pt-2.75' : ''
      }`}
    >
      {holdsNext && next && <DueMark dose={next} />}
      {items.length === 0 ? <EmptyDay day={day} /> : items.map((item) => <Item key={keyOf(item)} item={item} />)}
    </div>
  );
}

function DueMark({ dose }: { dose: PlanDose }) {
  const words = useDoseWords();
  return (
    <p className="flex items-center gap-1 text-chart font-strong text-terra-ink">
      <Bell aria-hidden="true" className="size-4 shrink-0" />
      {words.dueOf(dose)}
    </p>
  );
}

function Item({ item }: { item: ToDoItem }) {
  switch (item.kind) {
    case 'dose':
      return <ToDoDose dose={item.dose} />;
    case 'check':
      return <ToDoCheck check={item.check} />;
    case 'reading':
      return <DoneReading reading={item.reading} />;
    case 'step':
      return <ToDoStep step={item.step} />;
  }
}

function ToDoCheck({ check }: { check: Check }) {
  const t = useTranslations('week');
  const times = useTimes();
  const time = times.clock(instantOf(check.at));
  const reason = useCheckReason(check);
  if (check.kind === 'quick')
    return (
      <p className="text-fine">
        {t.rich('check.by', { kind: t('check.quick'), time, b: bold })}
        <span className="block text-ink-2">{reason}</span>
      </p>
    );
  return (
    <div>
      <p className="text-fine text-ink-2">{t('check.byTime', { time })}</p>
      <p className="font-display text-[23px] leading-[27px] font-headline tracking-dose">{t('check.full')}</p>
      <p className="text-[13.5px] leading-[17px] font-strong">{t('check.fullNote')}</p>
      <p className="mt-1.25 text-fine text-ink-2">{reason}</p>
      <PageLink
        href="/test"
        className="inline-flex min-h-6 items-center font-emphasis underline decoration-1 underline-offset-3 pointer-coarse:min-h-11"
      >
        {t('next.enter')}
      </PageLink>
    </div>
  );
}

function EmptyDay({ day }: { day: SheetDay }) {
  const t = useTranslations('week.lane');
  const { picture } = useSheet();
  const ends = picture.planEndsAt;
  if (day.to <= picture.now) return <p className="text-ink-2">{t('nothingDone')}</p>;
  if (ends === undefined || day.from >= ends) return <p className="text-ink-2">{t('noPlanDay')}</p>;
  return <p className="text-body font-emphasis">{t('nothingToAdd')}</p>;
}
