'use client';

import { useTranslations } from 'next-intl';
import { Button } from '@/components/ui/button';
import { Callout } from '@/components/ui/callout';
import { parseInstant } from '@/lib/calendar/wall-time';
import { useSendUnsentReadings } from '@/lib/client/readings';
import { forgetReading } from '@/lib/client/unsent-readings';
import { useReadingSetting } from './reading-setting';
import { useTimeWords } from './use-time-words';

/** Tests that wait on this device: said in words, sent by themselves, never lost without somebody saying so. */
export function UnsentTests() {
  const t = useTranslations('readings.unsent');
  const common = useTranslations('common');
  const owner = useReadingSetting();
  const times = useTimeWords();
  const { unsent, send, busy } = useSendUnsentReadings(owner);
  return unsent.map(({ reading, refusal }) => (
    <Callout
      key={reading.id}
      severity={refusal === null ? 'note' : 'take-care'}
      word={refusal === null ? common('note') : common('takeCare')}
      title={t(refusal === null ? 'waiting' : 'refused', {
        when: times.dayAndTime(parseInstant(reading.takenAt) ?? 0),
      })}
      className="mb-3"
      actions={
        refusal === null ? (
          <Button onClick={send} busy={busy ? t('sending') : undefined}>
            {t('send')}
          </Button>
        ) : (
          <Button onClick={() => void forgetReading(owner, reading.id)}>{t('forget')}</Button>
        )
      }
    >
      <p role="status">{refusal ?? t('words')}</p>
    </Callout>
  ));
}
