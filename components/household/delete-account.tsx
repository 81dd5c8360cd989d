'use client';

import { useMutation, useQuery } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { useId, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Skeleton } from '@/components/ui/skeleton';
import { RequestProblem } from '@/lib/client/fetch-json';
import { deletionOptions } from '@/lib/client/members';
import { deleteAccount, leaveFor } from '@/lib/client/session';
import type { DeletionPreview } from '@/lib/schemas/account';
import { PasswordQuestion } from './password-question';
import { useRefusalWords } from './use-refusal-words';

/** The way out of Wadewell. It says first what becomes of each household. */
export function DeleteAccount() {
  const t = useTranslations('household.deleting');
  const [asked, setAsked] = useState(false);
  return (
    <div>
      <Button variant="quiet" className="-ml-1.5" onClick={() => setAsked(true)}>
        {t('open')}
      </Button>
      {asked ? <DeletionDialog onClose={() => setAsked(false)} /> : null}
    </div>
  );
}

function DeletionDialog({ onClose }: { onClose: () => void }) {
  const t = useTranslations('household.deleting');
  const common = useTranslations('common');
  const words = useRefusalWords();
  const form = useId();
  const preview = useQuery(deletionOptions());
  const [password, setPassword] = useState('');
  const [empty, setEmpty] = useState(false);
  const remove = useMutation({
    networkMode: 'always',
    mutationFn: deleteAccount,
    onSuccess: () => leaveFor('/'),
    // Somebody may have come or gone meanwhile: what was said is said anew.
    onError: () => void preview.refetch(),
  });
  const households = preview.data?.households;
  const ready = households?.every(({ fate }) => fate !== 'blocked') === true;
  const refused = remove.error instanceof RequestProblem ? remove.error : undefined;
  const atField = refused?.at('password');
  const problem = empty && password === '' ? t('empty') : atField;
  const failure = remove.error !== null && atField === undefined ? remove.error : preview.error;
  const send = () => {
    setEmpty(password === '');
    if (password === '' || remove.isPending || !households) return;
    remove.mutate({ password, deletes: households.filter(({ fate }) => fate === 'deleted').map(({ id }) => id) });
  };
  return (
    <Dialog
      open
      onOpenChange={(open) => {
        if (!open) onClose();
      }}
      title={t('title')}
      description={t('words')}
      closeLabel={common('close')}
      actions={
        <>
          {ready ? (
            <Button
              type="submit"
              form={form}
              variant="primary"
              busy={remove.isPending || remove.isSuccess ? t('busy') : undefined}
            >
              {t('yes')}
            </Button>
          ) : null}
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
        {households === undefined ? (
          preview.isPending ? (
            <Skeleton label={t('title')} className="h-16" />
          ) : null
        ) : (
          <Fates households={households} />
        )}
        {ready ? <PasswordQuestion value={password} problem={problem} onChange={setPassword} /> : null}
        {failure === null ? null : <p role="alert">{words(failure)}</p>}
      </form>
    </Dialog>
  );
}

function Fates({ households }: Pick<DeletionPreview, 'households'>) {
  const t = useTranslations('household.deleting');
  if (households.length === 0) return <p>{t('none')}</p>;
  return (
    <ul className="grid gap-2">
      {households.map(({ id, name, fate, others }) => (
        <li key={id} className="border-t border-rule pt-2">
          {t.rich(`fate.${fate}`, { name, others, b: (text) => <b className="font-emphasis break-words">{text}</b> })}
        </li>
      ))}
    </ul>
  );
}
