'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { looksLikeEmail } from '@/components/start/email-shape';
import { Button } from '@/components/ui/button';
import { PlainSelect } from '@/components/ui/plain-select';
import { Switch } from '@/components/ui/switch';
import { TextField } from '@/components/ui/text-field';
import { RequestProblem } from '@/lib/client/fetch-json';
import { useInvite } from '@/lib/client/members';
import type { HouseholdPeople } from '@/lib/schemas/member';
import type { Role } from '@/lib/schemas/week-sheet';
import { InvitationLink } from './invitation-link';
import { useRefusalWords } from './use-refusal-words';

const roles = ['viewer', 'caretaker', 'owner'] as const;

/** Asks somebody to join: a name and a role in, a link or a mail out. */
export function InviteForm({ mailFrom }: { mailFrom: HouseholdPeople['mailFrom'] }) {
  const t = useTranslations('household');
  const form = useTranslations('start.form');
  const words = useRefusalWords();
  const invite = useInvite();
  const refusedEmail = invite.error instanceof RequestProblem ? invite.error.at('email') : undefined;
  const [name, setName] = useState('');
  const [role, setRole] = useState<Role>('viewer');
  const [adult, setAdult] = useState(false);
  const [empty, setEmpty] = useState(false);
  const [email, setEmail] = useState('');
  const [misspelt, setMisspelt] = useState(false);
  const byMail = mailFrom === 'here' && email.trim() !== '';
  const send = () => {
    setEmpty(name.trim() === '');
    const wrong = byMail && !looksLikeEmail(email);
    setMisspelt(wrong);
    if (name.trim() === '' || wrong) return;
    const chemicalsAllowed = role !== 'viewer' && adult;
    invite.mutate(
      {
        id: crypto.randomUUID(),
        name: name.trim(),
        ...(byMail ? { email: email.trim() } : {}),
        role,
        chemicalsAllowed,
      },
      {
        onSuccess: () => {
          setName('');
          setEmail('');
        },
      },
    );
  };
  return (
    <section aria-labelledby="invite">
      <h2 id="invite" className="font-display text-section">
        {t('inviteTitle')}
      </h2>
      <p className="mb-2.5 text-small text-ink-2">{t(mailFrom === 'here' ? 'mail.lead' : 'inviteLead')}</p>
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
        {mailFrom === 'here' ? (
          <TextField
            label={t('mail.by')}
            hint={t('mail.byHint')}
            type="email"
            inputMode="email"
            autoComplete="off"
            value={email}
            problem={misspelt ? form('emailShape') : refusedEmail}
            onChange={({ target }) => {
              setEmail(target.value);
              setMisspelt(false);
            }}
          />
        ) : null}
        <PlainSelect
          label={t('asRole')}
          options={roles.map((value) => ({ value, label: t(`role.${value}`) }))}
          value={role}
          onChange={setRole}
        />
        {role === 'viewer' ? null : (
          <Switch label={<span className="text-small">{t('asAdult')}</span>} checked={adult} onChange={setAdult} />
        )}
        <Button type="submit" busy={invite.isPending ? t(byMail ? 'mail.againBusy' : 'inviting') : undefined}>
          {t(byMail ? 'mail.send' : 'invite')}
        </Button>
        {mailFrom === 'after-confirmation' ? <p className="text-small text-ink-2">{t('mail.confirmFirst')}</p> : null}
      </form>
      {invite.error === null || refusedEmail !== undefined ? null : (
        <p role="alert" className="mt-1.5 text-small font-emphasis text-terra-ink">
          {words(invite.error)}
        </p>
      )}
      {invite.data === undefined ? null : invite.data.link === null ? (
        <p role="status" className="mt-1.5 text-small">
          {t('mail.gone', { name: invite.variables.name, email: invite.variables.email ?? '' })}
        </p>
      ) : (
        <InvitationLink name={invite.variables.name} link={invite.data.link} />
      )}
    </section>
  );
}
