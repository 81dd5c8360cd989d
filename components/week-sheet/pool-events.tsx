'use client';

import dynamic from 'next/dynamic';
import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { untilFetched } from '@/components/ui/until-fetched';
import { useIdleFetch } from '@/components/ui/use-idle-fetch';
import { useSheet } from './sheet-context';
import { instantOf } from './sheet-times';
import { useTimes } from './use-times';

const EndEvent = dynamic(() => untilFetched(() => import('./end-event')).then((part) => part.EndEvent));
const fetchReport = () => import('./report-event');
const ReportEvent = dynamic(() => untilFetched(() => import('./report-event')).then((part) => part.ReportEvent), {
  ssr: false,
});

const SIX_DAYS = 6 * 86_400_000;

/** What happened since the test and is not over, and the question whether something did. It stands with the verdict. */
export function PoolEvents() {
  const t = useTranslations('events');
  const { sheet } = useSheet();
  const times = useTimes();
  const [asking, setAsking] = useState(false);
  useIdleFetch(fetchReport);
  // A weekday says nothing of what happened weeks ago.
  const whenOf = (instant: number) =>
    instantOf(sheet.now) - instant > SIX_DAYS ? times.heading(instant) : times.partAt(instant);
  const mayReport = sheet.me.role !== 'viewer';
  if (!mayReport && sheet.events.length === 0) return null;
  return (
    <section aria-label={t('label')} className="mt-2 grid gap-1 print:hidden">
      {sheet.events.length > 0 && (
        <ul className="grid gap-2">
          {sheet.events.map((event) => (
            <li key={event.id} className="grid gap-1 text-small">
              <span className="font-emphasis">
                {t(`said.${event.kind}`, {
                  when: whenOf(instantOf(event.happenedAt)),
                  by: event.reportedBy ?? 'none',
                })}
              </span>
              <span className="text-pretty">{t(`kind.${event.kind}.advice`)}</span>
              {mayReport && <EndEvent event={event} />}
            </li>
          ))}
        </ul>
      )}
      {mayReport && (
        <Button variant="quiet" size="small" className="-ml-1.5 justify-self-start" onClick={() => setAsking(true)}>
          {t('ask')}
        </Button>
      )}
      {asking && <ReportEvent onClose={() => setAsking(false)} />}
    </section>
  );
}
