'use client';

import { useLocale, useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { ProblemState } from '@/components/ui/problem-state';
import { Segments } from '@/components/ui/segments';
import { TextField } from '@/components/ui/text-field';
import { browserTimeZone, makeHousehold } from '@/lib/client/session';
import type { SignUp } from '@/lib/schemas/account';
import { localeIn } from '@/lib/schemas/languages';
import { useEntryForm } from './use-entry-form';

const fields = ['name'] as const;

/** A household of one's own, for somebody who has an account and belongs nowhere. */
export function OwnHousehold({ likelyUnits }: { likelyUnits: SignUp['unitSystem'] }) {
  const t = useTranslations('start.signUp');
  const own = useTranslations('start.signIn');
  const form = useTranslations('start.form');
  const language = useLocale();
  const [unitSystem, setUnitSystem] = useState(likelyUnits);
  const { problems, failure, busy, forgive, submit } = useEntryForm(
    fields,
    ({ name }) => (name.trim() === '' ? { name: form('empty') } : {}),
    ({ name }) =>
      makeHousehold({
        name: name.trim(),
        timeZone: browserTimeZone(),
        unitSystem,
        locale: localeIn(language, navigator.language),
      }),
  );
  return (
    <section aria-labelledby="own" className="grid gap-4">
      <h2 id="own" className="font-display text-section">
        {own('ownTitle')}
      </h2>
      <form method="post" noValidate onSubmit={submit} className="grid gap-5">
        {failure === undefined ? null : <ProblemState title={failure} />}
        <TextField
          label={t('householdName')}
          hint={t('householdNameHint')}
          name="name"
          autoComplete="off"
          problem={problems.name}
          onChange={() => forgive('name')}
        />
        <Segments
          label={t('units')}
          choices={[
            { value: 'metric', label: t('metric'), detail: t('metricNote') },
            { value: 'us', label: t('us'), detail: t('usNote') },
          ]}
          value={unitSystem}
          onChange={setUnitSystem}
        />
        <Button type="submit" variant="primary" busy={busy ? t('busy') : undefined}>
          {own('ownSubmit')}
        </Button>
      </form>
    </section>
  );
}
