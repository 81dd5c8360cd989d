'use client';

import { useTranslations } from 'next-intl';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { useEndSituation } from '@/lib/client/situations';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import type { SituationEnding } from '@/lib/schemas/situation';

/** Ends before the rule is met. */
export type EarlyEnding = Exclude<SituationEnding, 'done' | 'set-aside'>;

type Props = { id: string; ending: EarlyEnding; onClose: () => void; onEnded: () => void };

/** Asks once more, and says what it means for the water, before a procedure ends early. */
export function EndDialog({ id, ending, onClose, onEnded }: Props) {
  const t = useTranslations('situations.ends');
  const common = useTranslations('common');
  const problemWords = useProblemWords();
  const end = useEndSituation();
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title={t(`${ending}.title`)}
      description={t(`${ending}.text`)}
      closeLabel={common('close')}
      actions={
        <>
          <Button
            variant="primary"
            busy={end.isPending ? t('ending') : undefined}
            onClick={() => end.mutate({ id, ending }, { onSuccess: onEnded })}
          >
            {t(`${ending}.yes`)}
          </Button>
          <Button variant="quiet" onClick={onClose}>
            {t('keep')}
          </Button>
        </>
      }
    >
      {end.error && (
        <p role="alert" className="text-small font-emphasis text-terra-ink">
          {problemWords(end.error)}
        </p>
      )}
    </Dialog>
  );
}
