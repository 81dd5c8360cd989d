'use client';

import { useTranslations } from 'next-intl';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/text-field';
import { dayOf } from '@/lib/calendar/household-day';
import { wallTimeOf } from '@/lib/calendar/wall-time';
import { useReadingSetting } from './reading-setting';
import type { TestDraft } from './test-draft-schema';
import type { TestTime } from './test-time';

/** Day and hour of a test that was not taken just now. */
export function TimeFields({
  time,
  now,
  problem,
  onChange,
}: {
  time: TestDraft['time'];
  now: number;
  problem: TestTime['problem'];
  onChange: (time: TestDraft['time']) => void;
}) {
  const t = useTranslations('readings.time');
  const { timeZone } = useReadingSetting();
  const shown = time ?? { day: dayOf(now, timeZone), time: wallTimeOf(now, timeZone) };
  return (
    <div className="mb-3 border-b border-rule pb-3">
      <div className="grid grid-cols-2 gap-x-3">
        <TextField
          type="date"
          label={t('day')}
          name="day"
          max={dayOf(now, timeZone)}
          value={shown.day}
          onChange={(event) => onChange({ ...shown, day: event.target.value })}
        />
        <TextField
          type="time"
          label={t('time')}
          name="time"
          value={shown.time}
          onChange={(event) => onChange({ ...shown, time: event.target.value })}
        />
      </div>
      {problem === undefined ? null : (
        <p role="alert" className="mt-1.5 text-small font-emphasis text-terra-ink">
          {t(`problem.${problem}`)}
        </p>
      )}
      <Button variant="quiet" onClick={() => onChange(null)}>
        {t('now')}
      </Button>
    </div>
  );
}
