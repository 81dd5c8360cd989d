'use client';

import { useTranslations } from 'next-intl';
import { PasswordField } from '@/components/start/password-field';

type Props = { value: string; problem: string | undefined; onChange: (typed: string) => void };

/** Asks for the password once more, before what cannot be taken back. */
export function PasswordQuestion({ value, problem, onChange }: Props) {
  const t = useTranslations('household.deleting');
  return (
    <PasswordField
      label={t('password')}
      name="password"
      autoComplete="current-password"
      value={value}
      problem={problem}
      onChange={({ target }) => onChange(target.value)}
    />
  );
}
