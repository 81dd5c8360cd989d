'use client';

import { useMutation } from '@tanstack/react-query';
import { useLocale, useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { Button } from '@/components/ui/button';
import { ProblemState } from '@/components/ui/problem-state';
import { TextField } from '@/components/ui/text-field';
import { textLink } from '@/components/ui/text-link';
import { RequestProblem } from '@/lib/client/fetch-json';
import { acceptInvitation, leaveFor, signUpInvited } from '@/lib/client/session';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import { localeIn } from '@/lib/schemas/languages';
import { EmailField } from './email-field';
import { looksLikeEmail } from './email-shape';
import { PasswordField } from './password-field';
import { useEntryForm } from './use-entry-form';

type Props = { token: string; name: string; signedIn: boolean; shortestPassword: number };

/** Joining a household by a link: with the account one is signed in with, or with one made on the way. */
export function InvitationForm({ signedIn, ...props }: Props) {
  return signedIn ? <JoinButton token={props.token} /> : <SignUpAndJoin {...props} />;
}

function JoinButton({ token }: { token: string }) {
  const t = useTranslations('invitation');
  const words = useProblemWords();
  const join = useMutation({ mutationFn: acceptInvitation, onSuccess: ({ next }) => leaveFor(next) });
  const refused = join.error instanceof RequestProblem && ['conflict', 'not-found'].includes(join.error.code);
  return (
    <div className="grid gap-3">
      <p className="text-body">{t('signedInAs')}</p>
      <Button
        variant="primary"
        size="large"
        wide
        busy={join.isPending || join.isSuccess ? t('joining') : undefined}
        onClick={() => join.mutate({ token })}
      >
        {t('join')}
      </Button>
      {join.error === null ? null : <ProblemState title={refused ? join.error.message : words(join.error)} />}
    </div>
  );
}

const fields = ['name', 'email', 'password'] as const;

function SignUpAndJoin({ token, name: called, shortestPassword }: Omit<Props, 'signedIn'>) {
  const t = useTranslations('invitation');
  const form = useTranslations('start.form');
  const language = useLocale();
  const { problems, failure, busy, forgive, submit } = useEntryForm(
    fields,
    ({ name, email, password }) => ({
      ...(name.trim() === '' ? { name: form('empty') } : {}),
      ...(looksLikeEmail(email) ? {} : { email: email.trim() === '' ? form('empty') : form('emailShape') }),
      ...(password === '' ? { password: form('empty') } : {}),
    }),
    ({ name, email, password }) =>
      signUpInvited({
        token,
        name: name.trim(),
        email: email.trim(),
        password,
        locale: localeIn(language, navigator.language),
      }),
  );
  return (
    <form method="post" noValidate onSubmit={submit} className="grid gap-5">
      {failure === undefined ? null : <ProblemState title={failure} />}
      <TextField
        label={t('name')}
        name="name"
        defaultValue={called}
        autoComplete="given-name"
        problem={problems.name}
        onChange={() => forgive('name')}
      />
      <EmailField label={t('email')} problem={problems.email} onChange={() => forgive('email')} />
      <PasswordField
        label={t('password')}
        name="password"
        hint={t('passwordHint', { count: shortestPassword })}
        autoComplete="new-password"
        problem={problems.password}
        onChange={() => forgive('password')}
      />
      <Button type="submit" variant="primary" size="large" wide busy={busy ? t('busy') : undefined}>
        {t('submit')}
      </Button>
      <p className="text-body">
        {t.rich('have', {
          link: (words) => (
            <PageLink href="/sign-in" className={textLink}>
              {words}
            </PageLink>
          ),
        })}
      </p>
    </form>
  );
}
