'use client';

import { useMutation } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { Button, type ButtonProps } from '@/components/ui/button';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import { leaveFor, lookRound } from '@/lib/client/session';

/** Opens a private copy of the demo household and goes to its week. */
export function LookRoundButton({ size = 'normal' }: Pick<ButtonProps, 'size'>) {
  const t = useTranslations('start.landing');
  const words = useProblemWords();
  const looking = useMutation({ mutationFn: lookRound, onSuccess: () => leaveFor('/week') });
  const busy = looking.isPending || looking.isSuccess;
  return (
    <div className="[@media(scripting:none)]:hidden">
      <Button size={size} wide busy={busy ? t('lookingRound') : undefined} onClick={() => looking.mutate()}>
        {t('lookRound')}
      </Button>
      {looking.isError ? (
        <p role="alert" className="mt-1.5 text-small font-emphasis text-terra-ink">
          {words(looking.error)}
        </p>
      ) : null}
    </div>
  );
}
