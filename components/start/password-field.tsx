'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { TextField, type TextFieldProps } from '@/components/ui/text-field';

/** A password that can be looked at while it is typed. */
export function PasswordField(props: Omit<TextFieldProps, 'type' | 'unit'>) {
  const t = useTranslations('start.signUp');
  const [shown, setShown] = useState(false);
  return (
    <TextField
      {...props}
      type={shown ? 'text' : 'password'}
      autoCapitalize="none"
      spellCheck={false}
      unit={
        <button
          type="button"
          aria-pressed={shown}
          aria-label={t('showPassword')}
          className="-mr-2 min-h-11 cursor-pointer px-2 text-small text-ink underline decoration-1 underline-offset-[3px]"
          onClick={() => setShown(!shown)}
        >
          {shown ? t('hide') : t('show')}
        </button>
      }
    />
  );
}
