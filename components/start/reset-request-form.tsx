'use client';

import { useTranslations } from 'next-intl';
import { Button } from '@/components/ui/button';
import { ProblemState } from '@/components/ui/problem-state';
import { requestReset } from '@/lib/client/session';
import { EmailField } from './email-field';
import { looksLikeEmail } from './email-shape';
import { useEntryForm } from './use-entry-form';

/** Asks for a link to another password. The answer does not say whether the address is known. */
export function ResetRequestForm() {
  const t = useTranslations('start.reset');
  const signIn = useTranslations('start.signIn');
  const form = useTranslations('start.form');
  const { problems, failure, busy, forgive, submit } = useEntryForm(
    ['email'],
    ({ email }) => (looksLikeEmail(email) ? {} : { email: email.trim() === '' ? form('empty') : form('emailShape') }),
    async ({ email }) => {
      await requestReset({ email: email.trim() });
      return { next: '/reset?sent=1' };
    },
  );
  return (
    <form method="post" noValidate onSubmit={submit} className="grid gap-5">
      {failure === undefined ? null : <ProblemState title={failure} />}
      <EmailField label={signIn('email')} problem={problems.email} onChange={() => forgive('email')} />
      <Button type="submit" variant="primary" size="large" wide busy={busy ? t('busy') : undefined}>
        {t('submit')}
      </Button>
    </form>
  );
}
