'use client';

import { useTranslations } from 'next-intl';
import { useEffect, useRef, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Callout } from '@/components/ui/callout';
import { type SentTick, useTickDose } from '@/lib/client/doses';
import { RequestProblem } from '@/lib/client/fetch-json';
import { forgetTick, useUnsentTicks } from '@/lib/client/unsent-ticks';
import { useSheet } from './sheet-context';
import { useDoseWords } from './use-dose-words';
import { useTickProblem } from './use-tick-problem';

/** Ticks that did not reach the server: kept here, sent by themselves when the connection is back, never silently. */
export function UnsentNotice() {
  const { sheet } = useSheet();
  const unsent = useUnsentTicks(sheet.me.id);
  return unsent.map((sent) => <UnsentTick key={sent.tick.id} sent={sent} />);
}

function UnsentTick({ sent }: { sent: SentTick }) {
  const t = useTranslations('doses');
  const common = useTranslations('common');
  const { sheet, start } = useSheet();
  const words = useDoseWords();
  const problemWords = useTickProblem();
  const { mutateAsync } = useTickDose(start);
  const [sending, setSending] = useState(false);
  const [problem, setProblem] = useState<unknown>(undefined);
  const { tick, doseId } = sent;
  const dose = sheet.doses.find(({ id }) => id === doseId);
  const what = dose
    ? words.amountAndProduct(dose, tick.action === 'changed' ? tick.amount : dose.amount)
    : t('unsent.someDose');

  const send = async () => {
    setSending(true);
    setProblem(undefined);
    try {
      await mutateAsync(sent);
      await forgetTick(sheet.me.id, tick.id);
    } catch (cause) {
      setProblem(cause);
    } finally {
      setSending(false);
    }
  };
  useWhenOnline(() => void send());

  const refused = problem instanceof RequestProblem && problem.code !== 'no-connection';
  return (
    <Callout
      severity="take-care"
      word={common('takeCare')}
      title={t('unsent.title')}
      actions={
        <>
          <Button variant="primary" onClick={() => void send()} busy={sending ? t('action.sending') : undefined}>
            {t('action.send')}
          </Button>
          {refused && <Button onClick={() => void forgetTick(sheet.me.id, tick.id)}>{t('action.discard')}</Button>}
        </>
      }
    >
      <p role="status">{t(`unsent.${tick.action}`, { what })}</p>
      <p className="text-ink-2">{problem === undefined ? t('unsent.auto') : problemWords(problem)}</p>
    </Callout>
  );
}

/** Calls once at the start, and whenever the browser says that it has a connection again. */
function useWhenOnline(send: () => void) {
  const latest = useRef(send);
  useEffect(() => {
    latest.current = send;
  });
  useEffect(() => {
    const call = () => latest.current();
    if (navigator.onLine) call();
    window.addEventListener('online', call);
    return () => window.removeEventListener('online', call);
  }, []);
}
