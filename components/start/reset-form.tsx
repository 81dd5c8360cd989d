'use client';

import { useTranslations } from 'next-intl';
import { Button } from '@/components/ui/button';
import { ProblemState } from '@/components/ui/problem-state';
import { resetPassword } from '@/lib/client/session';
import { PasswordField } from './password-field';
import { useEntryForm } from './use-entry-form';

/** Chooses another password, for whoever holds the link that was sent to them. */
export function ResetForm({ token, shortestPassword }: { token: string; shortestPassword: number }) {
  const t = useTranslations('start.reset');
  const signUp = useTranslations('start.signUp');
  const form = useTranslations('start.form');
  const { problems, failure, busy, forgive, submit } = useEntryForm(
    ['password'],
    ({ password }) => (password === '' ? { password: form('empty') } : {}),
    async ({ password }) => {
      await resetPassword({ token, password });
      return { next: '/sign-in?changed=1' };
    },
  );
  return (
    <form method="post" noValidate onSubmit={submit} className="grid gap-5">
      {failure === undefined ? null : <ProblemState title={failure} />}
      <PasswordField
        label={signUp('password')}
        hint={signUp('passwordHint', { count: shortestPassword })}
        name="password"
        autoComplete="new-password"
        problem={problems.password}
        onChange={() => forgive('password')}
      />
      <Button type="submit" variant="primary" size="large" wide busy={busy ? t('choosing') : undefined}>
        {t('choose')}
      </Button>
    </form>
  );
}
