'use client';

import { Plus, X } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { Button } from '@/components/ui/button';
import { hoursText } from './sun-hours';
import { hourText } from './hours';
import { usePoolSetting } from './setting';
import { Span } from './span';
import type { WaterDraft } from './water-draft';

type Times = WaterDraft['pump'];
const most = 4;

/** When the pump runs, one bar for each running time of the day. */
export function PumpTimes({ pump, onChange }: { pump: Times; onChange: (pump: Times) => void }) {
  const t = useTranslations('pool.water.pump');
  const { locale } = usePoolSetting();
  const set = (index: number, part: Partial<Times[number]>) =>
    onChange(pump.map((time, at) => (at === index ? { ...time, ...part } : time)));
  return (
    <fieldset>
      <legend className="sr-only">{t('label')}</legend>
      <p aria-hidden="true" className="mb-1.5 text-label font-strong">
        {t('label')}
      </p>
      {pump.length === 0 ? <p className="mb-2 text-body text-ink-2">{t('never')}</p> : null}
      {pump.map((time, index) => (
        <div key={index} className="flex items-start gap-2">
          <div className="min-w-0 flex-1">
            <Span
              from={time.from}
              to={time.to}
              onChange={(end, hour) => {
                const next = { ...time, [end]: hour };
                // Equal ends would mean all day round.
                if (next.from !== next.to) set(index, next);
              }}
              labels={{ from: t('starts', { number: index + 1 }), to: t('stops', { number: index + 1 }) }}
              write={(hour) => hourText(hour, locale)}
              words={t('hours', {
                hours: hoursText({ from: time.from, to: time.to + (time.to < time.from ? 24 : 0) }),
              })}
              midnight={t('midnight')}
            />
          </div>
          <Button
            variant="quiet"
            className="-mr-1.5 size-11"
            aria-label={t('remove', { number: index + 1 })}
            onClick={() => onChange(pump.filter((_, at) => at !== index))}
          >
            <X aria-hidden="true" className="size-5 shrink-0" />
          </Button>
        </div>
      ))}
      {pump.length < most ? (
        <Button variant="quiet" onClick={() => onChange([...pump, freeTime(pump)])}>
          <Plus aria-hidden="true" className="size-4.5" />
          {pump.length === 0 ? t('add') : t('addAnother')}
        </Button>
      ) : null}
    </fieldset>
  );
}

/** Two hours after the last running time. */
function freeTime(pump: Times): Times[number] {
  const last = pump.at(-1);
  if (!last) return { from: 8, to: 16 };
  const from = Math.min(21, last.to + 1);
  return { from, to: Math.min(24, from + 2) };
}
