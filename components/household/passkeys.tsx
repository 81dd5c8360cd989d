'use client';

import { useQuery } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { useId, useState } from 'react';
import { PasswordField } from '@/components/start/password-field';
import { usePasskeyWords } from '@/components/start/use-passkey-words';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Disclosure } from '@/components/ui/disclosure';
import { Skeleton } from '@/components/ui/skeleton';
import { TextField } from '@/components/ui/text-field';
import { RequestProblem } from '@/lib/client/fetch-json';
import { passkeysOptions, useAddPasskey, useForgetPasskey } from '@/lib/client/passkeys';
import { MOST_NAME_LENGTH, MOST_PASSKEYS } from '@/lib/schemas/passkey-limits';
import type { Passkey } from '@/lib/schemas/passkey';
import { dayIn } from './day-in';
import type { HouseholdSetting } from './household-setting';

/** The passkeys of whoever is signed in: which there are, another one, and the way to forget one. */
export function Passkeys({ setting }: { setting: HouseholdSetting }) {
  const t = useTranslations('passkeys.account');
  const common = useTranslations('common');
  const words = usePasskeyWords();
  const { data, isPending, error, refetch } = useQuery(passkeysOptions());
  return (
    <section aria-labelledby="passkeys" className="grid gap-1.5 border-t border-rule pt-3">
      <h3 id="passkeys" className="font-display text-name">
        {t('title')}
      </h3>
      <p className="text-small text-ink-2">{t('lead')}</p>
      {isPending ? <Skeleton label={t('loading')} className="h-14" /> : null}
      {error === null || data !== undefined ? null : (
        <div role="alert" className="grid justify-items-start gap-1.5 text-small">
          {words(error)}
          <Button size="small" onClick={() => void refetch()}>
            {common('tryAgain')}
          </Button>
        </div>
      )}
      {data === undefined ? null : (
        <>
          {data.passkeys.length === 0 ? null : (
            <ul>
              {data.passkeys.map((passkey) => (
                <PasskeyRow key={passkey.id} passkey={passkey} setting={setting} />
              ))}
            </ul>
          )}
          {data.obstacle !== null ? (
            <p className="text-small">{t(`obstacle.${data.obstacle}`)}</p>
          ) : data.passkeys.length >= MOST_PASSKEYS ? (
            <p className="text-small">{t('full', { count: MOST_PASSKEYS })}</p>
          ) : (
            <Disclosure summary={<span className="text-body">{t('add')}</span>}>
              <AddForm />
            </Disclosure>
          )}
        </>
      )}
    </section>
  );
}

function PasskeyRow({ passkey, setting }: { passkey: Passkey; setting: HouseholdSetting }) {
  const t = useTranslations('passkeys.account');
  const [asked, setAsked] = useState(false);
  const nameId = useId();
  const { name, createdAt, lastUsedAt } = passkey;
  return (
    <li className="grid justify-items-start border-t border-rule py-2.5">
      <b id={nameId} className="max-w-full text-body break-words">
        {name}
      </b>
      <span className="text-small text-ink-2">{t('made', { day: dayIn(setting, createdAt) })}</span>
      <span className="text-small text-ink-2">
        {lastUsedAt === null ? t('notUsed') : t('lastUsed', { day: dayIn(setting, lastUsedAt) })}
      </span>
      <Button variant="quiet" className="-ml-1.5" aria-describedby={nameId} onClick={() => setAsked(true)}>
        {t('forget')}
      </Button>
      {asked ? <ForgetDialog passkey={passkey} onClose={() => setAsked(false)} /> : null}
    </li>
  );
}

function ForgetDialog({ passkey: { id, name }, onClose }: { passkey: Passkey; onClose: () => void }) {
  const t = useTranslations('passkeys.account');
  const common = useTranslations('common');
  const words = usePasskeyWords();
  const forget = useForgetPasskey();
  return (
    <Dialog
      open
      onOpenChange={(open) => {
        if (!open) onClose();
      }}
      title={t('forgetTitle', { name })}
      description={t('forgetWords')}
      closeLabel={common('close')}
      actions={
        <>
          <Button
            variant="primary"
            busy={forget.isPending ? t('forgetting') : undefined}
            onClick={() => forget.mutate(id, { onSuccess: onClose })}
          >
            {t('forgetYes')}
          </Button>
          <Button onClick={onClose}>{common('cancel')}</Button>
        </>
      }
    >
      {forget.error === null ? null : <p role="alert">{words(forget.error)}</p>}
    </Dialog>
  );
}

const nothingTyped = { name: '', password: '' };

function AddForm() {
  const t = useTranslations('passkeys.account');
  const words = usePasskeyWords();
  const [typed, setTyped] = useState(nothingTyped);
  const [empty, setEmpty] = useState(false);
  const add = useAddPasskey();
  const refused = add.error instanceof RequestProblem ? add.error : undefined;
  const isEmpty = (field: keyof typeof typed) => typed[field].trim() === '';
  const problemOf = (field: keyof typeof typed) => (empty && isEmpty(field) ? t('empty') : refused?.at(field));
  const atFields = refused?.at('name') !== undefined || refused?.at('password') !== undefined;
  return (
    <form
      noValidate
      className="grid gap-3 pb-3"
      onSubmit={(event) => {
        event.preventDefault();
        const incomplete = isEmpty('name') || typed.password === '';
        setEmpty(incomplete);
        if (!incomplete && !add.isPending) add.mutate(typed, { onSuccess: () => setTyped(nothingTyped) });
      }}
    >
      <TextField
        label={t('name')}
        hint={t('nameHint')}
        name="passkey-name"
        autoComplete="off"
        maxLength={MOST_NAME_LENGTH}
        value={typed.name}
        problem={problemOf('name')}
        onChange={({ target }) => setTyped({ ...typed, name: target.value })}
      />
      <PasswordField
        label={t('password')}
        name="passkey-password"
        autoComplete="current-password"
        value={typed.password}
        problem={problemOf('password')}
        onChange={({ target }) => setTyped({ ...typed, password: target.value })}
      />
      <Button type="submit" busy={add.isPending ? t('saving') : undefined}>
        {t('save')}
      </Button>
      <p role="status" className="text-small empty:hidden">
        {add.isSuccess ? t('saved') : null}
        {add.error === null || atFields ? null : words(add.error)}
      </p>
    </form>
  );
}
