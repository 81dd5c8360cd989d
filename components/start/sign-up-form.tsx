'use client';

import { useLocale, useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { textLink } from '@/components/ui/text-link';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { ProblemState } from '@/components/ui/problem-state';
import { Segments } from '@/components/ui/segments';
import { TextField } from '@/components/ui/text-field';
import { useLeftAlone } from '@/components/ui/use-left-alone';
import { browserTimeZone, signUp } from '@/lib/client/session';
import { localeIn } from '@/lib/schemas/languages';
import type { SignUp } from '@/lib/schemas/account';
import { EmailField } from './email-field';
import { looksLikeEmail } from './email-shape';
import { PasswordField } from './password-field';
import { useEntryForm } from './use-entry-form';

const fields = ['name', 'email', 'password', 'householdName'] as const;

export type SignUpFormProps = { likelyUnits: SignUp['unitSystem']; shortestPassword: number };

export function SignUpForm({ likelyUnits, shortestPassword }: SignUpFormProps) {
  const t = useTranslations('start.signUp');
  const form = useTranslations('start.form');
  const [unitSystem, setUnitSystem] = useState(likelyUnits);
  const language = useLocale();
  const alone = useLeftAlone();
  const { problems, failure, busy, forgive, submit } = useEntryForm(
    fields,
    ({ name, email, password, householdName }) => ({
      ...(name.trim() === '' ? { name: form('empty') } : {}),
      ...(looksLikeEmail(email) ? {} : { email: email.trim() === '' ? form('empty') : form('emailShape') }),
      ...(password === '' ? { password: form('empty') } : {}),
      ...(householdName.trim() === '' ? { householdName: form('empty') } : {}),
    }),
    ({ name, email, password, householdName }) =>
      signUp({
        name: name.trim(),
        email: email.trim(),
        password,
        householdName: householdName.trim(),
        timeZone: browserTimeZone(),
        unitSystem,
        locale: localeIn(language, navigator.language),
      }),
  );
  return (
    <form method="post" noValidate onSubmit={submit} className="grid gap-5">
      {failure === undefined ? null : <ProblemState title={failure} />}
      <TextField
        label={t('name')}
        hint={t('nameHint')}
        name="name"
        autoComplete="given-name"
        problem={problems.name}
        onChange={() => forgive('name')}
      />
      <EmailField label={t('email')} hint={t('emailHint')} problem={problems.email} onChange={() => forgive('email')} />
      <PasswordField
        label={t('password')}
        hint={t('passwordHint', { count: shortestPassword })}
        name="password"
        autoComplete="new-password"
        problem={problems.password}
        onChange={() => forgive('password')}
      />
      <TextField
        label={t('householdName')}
        hint={t('householdNameHint')}
        name="householdName"
        autoComplete="off"
        problem={problems.householdName}
        onChange={() => forgive('householdName')}
      />
      <Segments
        label={t('units')}
        // A phone takes as long to find its time zone as to bring the whole form to life; the line is kept free for it.
        hint={alone ? t('timeZone', { zone: browserTimeZone().replaceAll('_', ' ') }) : '\u00a0'}
        choices={[
          { value: 'metric', label: t('metric'), detail: t('metricNote') },
          { value: 'us', label: t('us'), detail: t('usNote') },
        ]}
        value={unitSystem}
        onChange={setUnitSystem}
      />
      <Button type="submit" variant="primary" size="large" wide busy={busy ? t('busy') : undefined}>
        {t('submit')}
      </Button>
      <p className="text-body">
        {t.rich('haveSheet', {
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
