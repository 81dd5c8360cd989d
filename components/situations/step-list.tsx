'use client';

import { useTranslations } from 'next-intl';
import { Disclosure } from '@/components/ui/disclosure';
import type { OpenSituation } from '@/lib/schemas/situation';
import { useHousehold } from './situation-context';
import { daysWithSteps, type StepDay } from './step-days';
import { StepRow } from './step-row';
import { useSituationTimes } from './use-situation-times';

type Props = { open: OpenSituation; now: number };

/** Steps day by day, one below the other. Days that are over and all done fold away. */
export function StepList({ open, now }: Props) {
  const t = useTranslations('situations.steps');
  const { timeZone, mayOpen } = useHousehold();
  const times = useSituationTimes(now);
  const days = daysWithSteps(open.procedure.steps, timeZone);
  if (days.length === 0) return null;
  const isOver = ({ day, steps }: StepDay) => day < times.today && steps.every(({ doneAt }) => doneAt !== null);
  const [over, ahead] = [days.filter(isOver), days.filter((day) => !isOver(day))];
  return (
    <section aria-label={t('label')} className="border-t-todo border-ink pt-3">
      <h2 className="font-display text-section">{t('label')}</h2>
      <p className="text-small text-ink-2">{t(mayOpen ? 'note' : 'noteViewer')}</p>
      {over.length > 0 && (
        <Disclosure summary={<span className="text-small">{t('earlier')}</span>} className="mt-2">
          <Days days={over} open={open} now={now} />
        </Disclosure>
      )}
      <Days days={ahead} open={open} now={now} />
    </section>
  );
}

function Days({ days, open, now }: Props & { days: readonly StepDay[] }) {
  return (
    <div className="grid gap-x-8 md:grid-cols-2 lg:grid-cols-3">
      {days.map(({ day, steps }) => (
        <section key={day} className="mt-3">
          <StepDayName day={day} now={now} />
          <ul>
            {steps.map((step) => (
              <li key={step.id}>
                <StepRow open={open} step={step} now={now} />
              </li>
            ))}
          </ul>
        </section>
      ))}
    </div>
  );
}

/** A day's name; today on ink. */
export function StepDayName({ day, now, inColumn = false }: { day: string; now: number; inColumn?: boolean }) {
  const t = useTranslations('situations.steps');
  const times = useSituationTimes(now);
  const isToday = day === times.today;
  // Over the lanes they come first, in a list below the name of the steps.
  const Heading = inColumn ? 'h2' : 'h3';
  return (
    <Heading
      aria-label={times.longDay(day)}
      aria-current={isToday ? 'date' : undefined}
      className={`flex h-6.5 items-center justify-between gap-2 text-name ${isToday ? 'bg-ink text-on-ink' : inColumn ? '' : 'border-b border-rule'} ${isToday || inColumn ? 'px-2.25' : ''}`}
    >
      <span className="font-display whitespace-nowrap">{times.heading(day)}</span>
      {isToday && <span className="text-chart font-emphasis">{t('today')}</span>}
    </Heading>
  );
}
