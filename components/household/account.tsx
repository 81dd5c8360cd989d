'use client';

import { useMutation } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { PasswordField } from '@/components/start/password-field';
import { Button } from '@/components/ui/button';
import { Disclosure } from '@/components/ui/disclosure';
import { RequestProblem } from '@/lib/client/fetch-json';
import { changePassword } from '@/lib/client/session';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import { AccountEmail } from './account-email';
import type { HouseholdSetting } from './household-setting';
import { Passkeys } from './passkeys';

/** What belongs to whoever is signed in and not to the household: the password, and the other ways in. */
export function Account({ setting, shortestPassword }: { setting: HouseholdSetting; shortestPassword: number }) {
  const t = useTranslations('household.account');
  return (
    <section aria-labelledby="account" className="grid gap-2">
      <h2 id="account" className="font-display text-section">
        {t('title')}
      </h2>
      <AccountEmail />
      <Disclosure summary={<span className="text-body">{t('change')}</span>}>
        <PasswordForm shortestPassword={shortestPassword} />
      </Disclosure>
      <Passkeys setting={setting} />
    </section>
  );
}

const nothingTyped = { current: '', password: '' };

function PasswordForm({ shortestPassword }: { shortestPassword: number }) {
  const t = useTranslations('household.account');
  const words = useProblemWords();
  const [typed, setTyped] = useState(nothingTyped);
  const [empty, setEmpty] = useState(false);
  const change = useMutation({
    networkMode: 'always',
    mutationFn: changePassword,
    onSuccess: () => setTyped(nothingTyped),
  });
  const refused = change.error instanceof RequestProblem ? change.error : undefined;
  const problemOf = (field: keyof typeof typed) => (empty && typed[field] === '' ? t('empty') : refused?.at(field));
  const atFields = (refused?.problems.length ?? 0) > 0;
  return (
    <form
      noValidate
      className="grid gap-3 pb-3"
      onSubmit={(event) => {
        event.preventDefault();
        const isEmpty = typed.current === '' || typed.password === '';
        setEmpty(isEmpty);
        if (!isEmpty && !change.isPending) change.mutate(typed);
      }}
    >
      <PasswordField
        label={t('current')}
        name="current"
        autoComplete="current-password"
        value={typed.current}
        problem={problemOf('current')}
        onChange={({ target }) => setTyped({ ...typed, current: target.value })}
      />
      <PasswordField
        label={t('next')}
        hint={t('hint', { count: shortestPassword })}
        name="password"
        autoComplete="new-password"
        value={typed.password}
        problem={problemOf('password')}
        onChange={({ target }) => setTyped({ ...typed, password: target.value })}
      />
      <Button type="submit" busy={change.isPending ? t('saving') : undefined}>
        {t('save')}
      </Button>
      <p role="status" className="text-small empty:hidden">
        {change.isSuccess ? t('saved') : null}
        {change.error === null || atFields ? null : words(change.error)}
      </p>
    </form>
  );
}
