'use client';

import { useMutation } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { classNames } from '@/components/ui/class-names';
import { useToast } from '@/components/ui/toast';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import { leaveFor, signOut } from '@/lib/client/session';

export function SignOutButton({ className }: { className?: string }) {
  const t = useTranslations('navigation');
  const words = useProblemWords();
  const showToast = useToast();
  const leaving = useMutation({
    mutationFn: signOut,
    onSuccess: () => leaveFor('/'),
    onError: (problem) => showToast({ title: words(problem) }),
  });
  // Once it went through, the next page is on its way: the button stays busy until then.
  const busy = leaving.isPending || leaving.isSuccess;
  return (
    <button
      type="button"
      aria-disabled={busy || undefined}
      className={classNames(
        'min-h-11 cursor-pointer whitespace-nowrap underline decoration-1 underline-offset-[3px]',
        className,
      )}
      onClick={() => {
        if (!busy) leaving.mutate();
      }}
    >
      {busy ? t('signingOut') : t('signOut')}
    </button>
  );
}
