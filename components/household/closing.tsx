'use client';

import { useMutation, useQuery } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { useId, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { TextField } from '@/components/ui/text-field';
import { RequestProblem } from '@/lib/client/fetch-json';
import { closeHousehold, householdsOptions } from '@/lib/client/members';
import { leaveFor } from '@/lib/client/session';
import type { Member } from '@/lib/schemas/member';
import { PasswordQuestion } from './password-question';
import { useRefusalWords } from './use-refusal-words';

/** The end of a household, for its owners: everybody loses it, and nothing of it comes back. */
export function Closing({ members }: { members: readonly Member[] }) {
  const t = useTranslations('household.closing');
  const { data } = useQuery(householdsOptions());
  const [asked, setAsked] = useState(false);
  const household = data?.find(({ current }) => current);
  if (household === undefined || !members.some(({ you, role }) => you && role === 'owner')) return null;
  return (
    <div>
      <Button variant="quiet" className="-ml-1.5" onClick={() => setAsked(true)}>
        {t('open')}
      </Button>
      {asked ? (
        <ClosingDialog name={household.name} others={members.length - 1} onClose={() => setAsked(false)} />
      ) : null}
    </div>
  );
}

type Props = { name: string; others: number; onClose: () => void };

function ClosingDialog({ name, others, onClose }: Props) {
  const t = useTranslations('household.closing');
  const account = useTranslations('household.account');
  const common = useTranslations('common');
  const words = useRefusalWords();
  const form = useId();
  const [typed, setTyped] = useState({ name: '', password: '' });
  const [empty, setEmpty] = useState(false);
  const close = useMutation({
    networkMode: 'always',
    mutationFn: closeHousehold,
    onSuccess: () => leaveFor('/week'),
  });
  const refused = close.error instanceof RequestProblem ? close.error : undefined;
  const problemOf = (field: keyof typeof typed) =>
    empty && typed[field].trim() === '' ? account('empty') : refused?.at(field);
  const send = () => {
    const isEmpty = typed.name.trim() === '' || typed.password === '';
    setEmpty(isEmpty);
    if (!isEmpty && !close.isPending) close.mutate(typed);
  };
  return (
    <Dialog
      open
      onOpenChange={(open) => {
        if (!open) onClose();
      }}
      title={t('title', { name })}
      description={t('words', { others })}
      closeLabel={common('close')}
      actions={
        <>
          <Button
            type="submit"
            form={form}
            variant="primary"
            busy={close.isPending || close.isSuccess ? t('busy') : undefined}
          >
            {t('yes')}
          </Button>
          <Button onClick={onClose}>{common('cancel')}</Button>
        </>
      }
    >
      <form
        id={form}
        noValidate
        className="grid gap-3"
        onSubmit={(event) => {
          event.preventDefault();
          send();
        }}
      >
        <p className="text-body">{t('copy')}</p>
        <TextField
          label={t('name')}
          name="name"
          autoComplete="off"
          value={typed.name}
          problem={problemOf('name')}
          onChange={({ target }) => setTyped({ ...typed, name: target.value })}
        />
        <PasswordQuestion
          value={typed.password}
          problem={problemOf('password')}
          onChange={(password) => setTyped({ ...typed, password })}
        />
        {close.error === null || (refused?.problems.length ?? 0) > 0 ? null : <p role="alert">{words(close.error)}</p>}
      </form>
    </Dialog>
  );
}
