'use client';

import { useMutation } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { classNames } from '@/components/ui/class-names';
import { textLink } from '@/components/ui/text-link';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import { somethingWaits } from '@/lib/client/forget-device';
import { leaveFor, signOut } from '@/lib/client/session';
import { DoorProblem, type ProblemSide } from './door-problem';

export type SignOutButtonProps = { className?: string; problem?: ProblemSide };

export function SignOutButton({ className, problem = 'below' }: SignOutButtonProps) {
  const t = useTranslations('navigation');
  const words = useProblemWords();
  const leaving = useMutation({ mutationFn: signOut, onSuccess: () => leaveFor('/') });
  const [warned, setWarned] = useState(false);
  const warns = warned && !leaving.isError;
  // Once it went through, the next page is on its way: the button stays busy until then.
  const busy = leaving.isPending || leaving.isSuccess;
  return (
    <span className={classNames('relative', className)}>
      <button
        type="button"
        aria-disabled={busy || undefined}
        className={`min-h-11 cursor-pointer whitespace-nowrap ${textLink}`}
        onClick={() => {
          if (busy) return;
          // What could not be sent is forgotten with the rest: that is said once, and pressing again goes.
          if (!warned && somethingWaits()) setWarned(true);
          else leaving.mutate();
        }}
      >
        {busy ? t('signingOut') : t('signOut')}
      </button>
      {warns && !busy ? <DoorProblem side={problem}>{t('signOutLoses')}</DoorProblem> : null}
      {leaving.isError ? <DoorProblem side={problem}>{words(leaving.error)}</DoorProblem> : null}
    </span>
  );
}
