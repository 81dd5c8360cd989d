'use client';

import { useMutation } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { Button } from '@/components/ui/button';
import { signInWithPasskey } from '@/lib/client/passkeys';
import { leaveFor } from '@/lib/client/session';
import { usePasskeyWords } from './use-passkey-words';

/** The other way in: no e-mail, no password, the device knows who it is. */
export function PasskeySignIn() {
  const t = useTranslations('passkeys.signIn');
  const words = usePasskeyWords();
  const entering = useMutation({
    networkMode: 'always',
    mutationFn: signInWithPasskey,
    onSuccess: ({ next }) => leaveFor(next),
  });
  // Stays busy when it went well: the next page is already loading.
  const busy = entering.isPending || entering.isSuccess;
  return (
    <div className="[@media(scripting:none)]:hidden">
      <Button size="large" wide busy={busy ? t('busy') : undefined} onClick={() => entering.mutate()}>
        {t('submit')}
      </Button>
      {entering.error === null ? null : (
        <p role="alert" className="mt-1.5 text-small font-emphasis text-terra-ink">
          {words(entering.error)}
        </p>
      )}
    </div>
  );
}
