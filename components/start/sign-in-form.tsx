'use client';

import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { textLink } from '@/components/ui/text-link';
import { Button } from '@/components/ui/button';
import { ProblemState } from '@/components/ui/problem-state';
import { signIn } from '@/lib/client/session';
import { EmailField } from './email-field';
import { looksLikeEmail } from './email-shape';
import { PasswordField } from './password-field';
import { useEntryForm } from './use-entry-form';

const fields = ['email', 'password'] as const;

/** @param beside another way in, under the button */
export function SignInForm({ beside }: { beside?: React.ReactNode }) {
  const t = useTranslations('start.signIn');
  const form = useTranslations('start.form');
  const { problems, failure, busy, forgive, submit } = useEntryForm(
    fields,
    ({ email, password }) => ({
      ...(looksLikeEmail(email) ? {} : { email: email.trim() === '' ? form('empty') : form('emailShape') }),
      ...(password === '' ? { password: form('empty') } : {}),
    }),
    ({ email, password }) => signIn({ email: email.trim(), password }),
  );
  return (
    <form method="post" noValidate onSubmit={submit} className="grid gap-5">
      {failure === undefined ? null : <ProblemState title={failure} />}
      <EmailField label={t('email')} problem={problems.email} onChange={() => forgive('email')} />
      <PasswordField
        label={t('password')}
        name="password"
        autoComplete="current-password"
        problem={problems.password}
        onChange={() => forgive('password')}
      />
      <Button type="submit" variant="primary" size="large" wide busy={busy ? t('busy') : undefined}>
        {t('submit')}
      </Button>
      {beside}
      <p className="text-body">
        {t.rich('forgotten', {
          link: (words) => (
            <PageLink href="/reset" className={textLink}>
              {words}
            </PageLink>
          ),
        })}
      </p>
      <p className="text-body">
        {t.rich('noSheet', {
          link: (words) => (
            <PageLink href="/sign-up" className={textLink}>
              {words}
            </PageLink>
          ),
        })}
      </p>
    </form>
  );
}
