'use client';

import { useTranslations } from 'next-intl';
import { useRef } from 'react';
import { TickBox } from '@/components/ui/tick-box';
import { useTickStep } from '@/lib/client/situations';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import type { SituationStep } from '@/lib/schemas/situation';

type Props = {
  situationId: string;
  step: SituationStep;
  name: string;
  note: string | undefined;
  who: string | undefined;
  offReason: string | undefined;
};

/** A step to tick, and to take back. The box shows at once what was pressed, and the words below that it is being kept. */
export function TickStep({ situationId, step, name, note, who, offReason }: Props) {
  const t = useTranslations('situations.steps');
  const problemWords = useProblemWords();
  const tick = useTickStep();
  // The second press of a double click may come before the page shows what the first one did.
  const sending = useRef(false);
  const send = (done: boolean) => {
    if (sending.current) return;
    sending.current = true;
    tick.mutate(
      { id: situationId, step: step.id, done },
      {
        onSettled: () => {
          sending.current = false;
        },
      },
    );
  };
  return (
    <TickBox
      label={<b className="font-emphasis">{name}</b>}
      detail={
        <>
          {note}
          <span role="status" className="block">
            {tick.isPending ? t('ticking') : who}
          </span>
        </>
      }
      checked={tick.isPending ? tick.variables.done : step.doneAt !== null}
      onChange={send}
      offReason={offReason}
      problem={tick.error ? problemWords(tick.error) : undefined}
      className="py-2"
    />
  );
}
