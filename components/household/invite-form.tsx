'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { PlainSelect } from '@/components/ui/plain-select';
import { Switch } from '@/components/ui/switch';
import { TextField } from '@/components/ui/text-field';
import { useInvite } from '@/lib/client/members';
import type { Role } from '@/lib/schemas/week-sheet';
import { InvitationLink } from './invitation-link';
import { useRefusalWords } from './use-refusal-words';

const roles = ['viewer', 'caretaker', 'owner'] as const;

/** Asks somebody to join: a name and a role in, a link out. */
export function InviteForm() {
  const t = useTranslations('household');
  const words = useRefusalWords();
  const invite = useInvite();
  const [name, setName] = useState('');
  const [role, setRole] = useState<Role>('viewer');
  const [adult, setAdult] = useState(false);
  const [empty, setEmpty] = useState(false);
  const send = () => {
    setEmpty(name.trim() === '');
    if (name.trim() === '') return;
    const chemicalsAllowed = role !== 'viewer' && adult;
    invite.mutate(
      { id: crypto.randomUUID(), name: name.trim(), role, chemicalsAllowed },
      { onSuccess: () => setName('') },
    );
  };
  return (
    <section aria-labelledby="invite">
      <h2 id="invite" className="font-display text-section">
        {t('inviteTitle')}
      </h2>
      <p className="mb-2.5 text-small text-ink-2">{t('inviteLead')}</p>
      <form
        noValidate
        className="grid gap-3"
        onSubmit={(event) => {
          event.preventDefault();
          send();
        }}
      >
        <TextField
          label={t('name')}
          value={name}
          maxLength={80}
          autoComplete="off"
          problem={empty ? t('nameEmpty') : undefined}
          onChange={({ target }) => {
            setName(target.value);
            setEmpty(false);
          }}
        />
        <PlainSelect
          label={t('asRole')}
          options={roles.map((value) => ({ value, label: t(`role.${value}`) }))}
          value={role}
          onChange={setRole}
        />
        {role === 'viewer' ? null : (
          <Switch label={<span className="text-small">{t('asAdult')}</span>} checked={adult} onChange={setAdult} />
        )}
        <Button type="submit" busy={invite.isPending ? t('inviting') : undefined}>
          {t('invite')}
        </Button>
      </form>
      {invite.error === null ? null : (
        <p role="alert" className="mt-1.5 text-small font-emphasis text-terra-ink">
          {words(invite.error)}
        </p>
      )}
      {invite.data === undefined ? null : <InvitationLink name={invite.variables.name} link={invite.data.link} />}
    </section>
  );
}
