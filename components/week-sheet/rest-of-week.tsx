'use client';

import { useTranslations } from 'next-intl';
import { sparkAxis, Spark } from '@/components/charts/spark';
import { Disclosure } from '@/components/ui/disclosure';
import { dayHeading } from '@/lib/calendar/format';
import { chartDoses } from './chart-input';
import { DayItems } from './day-items';
import { useSheet } from './sheet-context';
import type { SheetDay } from './sheet-times';
import { toDoOf } from './to-do-items';
import { useDayWords } from './use-day-words';
import { useDoseWords } from './use-dose-words';

/** The days ahead as rows with a small picture on one scale; the days behind below them. */
export function RestOfWeek() {
  const t = useTranslations('week.phone');
  const { picture } = useSheet();
  const ahead = picture.days.filter(({ from }) => from > picture.now);
  const behind = picture.days.filter(({ to }) => to <= picture.now);
  return (
    <>
      <Days title={t('rest')} days={ahead} />
      <Days title={t('past')} days={behind} />
    </>
  );
}

function Days({ title, days }: { title: string; days: readonly SheetDay[] }) {
  if (days.length === 0) return null;
  return (
    <section className="mt-5.5">
      <h2 className="mb-1.5 font-display text-section">{title}</h2>
      <div className="border-b border-rule">
        {days.map((day) => (
          <DayRow key={day.day} day={day} />
        ))}
      </div>
    </section>
  );
}

function DayRow({ day }: { day: SheetDay }) {
  const t = useTranslations('week.lane');
  const { sheet, picture } = useSheet();
  const { what, when } = useDayWords(day);
  const doses = chartDoses(sheet.doses, useDoseWords());
  const items = toDoOf(day, sheet);
  return (
    <Disclosure
      summary={
        <span className="grid grid-cols-[58px_minmax(0,1fr)] items-center gap-x-3 min-[360px]:grid-cols-[58px_96px_minmax(0,1fr)]">
          <span className="font-display text-name whitespace-nowrap">
            {dayHeading(day.day, sheet.household.locale)}
          </span>
          <span className="hidden min-[360px]:block">
            <Spark
              axis={{ from: day.from, to: day.to }}
              value={sparkAxis(picture.points, sheet.pool.swimLimit)}
              points={picture.points}
              nights={picture.nights}
              limit={sheet.pool.swimLimit}
              doses={doses}
            />
          </span>
          <span className="min-w-0 text-label">
            <b className="block">{what}</b>
            <span className="block text-[14px] leading-[19px] text-ink-2">{when}</span>
          </span>
        </span>
      }
    >
      {items.length === 0 ? <p>{day.to <= picture.now ? t('nothingDone') : what}</p> : <DayItems items={items} />}
    </Disclosure>
  );
}
