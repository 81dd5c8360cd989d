'use client';

import { useQuery } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { EmailField } from '@/components/start/email-field';
import { looksLikeEmail } from '@/components/start/email-shape';
import { PasswordField } from '@/components/start/password-field';
import { Button } from '@/components/ui/button';
import { Disclosure } from '@/components/ui/disclosure';
import { accountOptions, useAskForConfirmation, useChangeEmail } from '@/lib/client/account';
import { RequestProblem } from '@/lib/client/fetch-json';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import type { ShownAccount } from '@/lib/schemas/account';

/** The address somebody signs in with: whether it is confirmed, whether mail reaches it, and another one. */
export function AccountEmail() {
  const t = useTranslations('household.account');
  const { data } = useQuery(accountOptions());
  if (data === undefined || data.email === null) return null;
  return (
    <div className="grid gap-1">
      <p className="text-body break-words">{t('address', { email: data.email })}</p>
      {data.sendsMail ? <Confirmation account={data} /> : null}
      {data.awaited === null ? null : (
        <p className="text-small break-words text-ink-2">{t('awaited', { email: data.awaited })}</p>
      )}
      {data.mail === null || data.mail.refusal === null ? null : (
        <p className="text-small font-emphasis break-words text-terra-ink">
          {t('mailRefused', { refusal: data.mail.refusal })}
        </p>
      )}
      <Disclosure summary={<span className="text-body">{t('changeEmail')}</span>}>
        <EmailForm />
      </Disclosure>
    </div>
  );
}

function Confirmation({ account }: { account: ShownAccount }) {
  const t = useTranslations('household.account');
  const words = useProblemWords();
  const ask = useAskForConfirmation();
  if (account.confirmed) return <p className="text-small text-ink-2">{t('confirmed')}</p>;
  return (
    <div className="grid justify-items-start gap-1.5">
      <p className="text-small text-ink-2">{t('unconfirmed')}</p>
      <Button size="small" busy={ask.isPending ? t('asking') : undefined} onClick={() => ask.mutate()}>
        {t('askAgain')}
      </Button>
      <p role="status" className="text-small empty:hidden">
        {ask.isSuccess ? t('asked') : null}
        {ask.error === null ? null : words(ask.error)}
      </p>
    </div>
  );
}

const nothingTyped = { email: '', current: '' };

function EmailForm() {
  const t = useTranslations('household.account');
  const form = useTranslations('start.form');
  const words = useProblemWords();
  const [typed, setTyped] = useState(nothingTyped);
  const [wrong, setWrong] = useState<Partial<typeof nothingTyped>>({});
  const change = useChangeEmail();
  const refused = change.error instanceof RequestProblem ? change.error : undefined;
  const atFields = (refused?.problems.length ?? 0) > 0;
  return (
    <form
      noValidate
      className="grid gap-3 pb-3"
      onSubmit={(event) => {
        event.preventDefault();
        const found = {
          ...(looksLikeEmail(typed.email) ? {} : { email: form('emailShape') }),
          ...(typed.current === '' ? { current: t('empty') } : {}),
        };
        setWrong(found);
        if (Object.keys(found).length === 0 && !change.isPending)
          change.mutate(
            { email: typed.email.trim(), current: typed.current },
            { onSuccess: () => setTyped(nothingTyped) },
          );
      }}
    >
      <EmailField
        label={t('newEmail')}
        value={typed.email}
        problem={wrong.email ?? refused?.at('email')}
        onChange={({ target }) => setTyped({ ...typed, email: target.value })}
      />
      <PasswordField
        label={t('current')}
        name="current"
        autoComplete="current-password"
        value={typed.current}
        problem={wrong.current ?? refused?.at('current')}
        onChange={({ target }) => setTyped({ ...typed, current: target.value })}
      />
      <Button type="submit" busy={change.isPending ? t('saving') : undefined}>
        {t('saveEmail')}
      </Button>
      <p role="status" className="text-small empty:hidden">
        {change.isSuccess ? t('savedEmail') : null}
        {change.error === null || atFields ? null : words(change.error)}
      </p>
    </form>
  );
}
