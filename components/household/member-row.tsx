'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { ringOf } from '@/components/navigation/faces';
import { PageLink } from '@/components/navigation/page-link';
import { Avatar } from '@/components/ui/avatar';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { PlainSelect } from '@/components/ui/plain-select';
import { Switch } from '@/components/ui/switch';
import { textLink } from '@/components/ui/text-link';
import { useChangeMember, useConfirmCard, useEndMember } from '@/lib/client/members';
import { leaveFor } from '@/lib/client/session';
import type { Member } from '@/lib/schemas/member';
import { dayIn } from './day-in';
import type { HouseholdSetting } from './household-setting';
import { useRefusalWords } from './use-refusal-words';

const roles = ['owner', 'caretaker', 'viewer'] as const;

/** A member: who, what they may do, and for owners the way to change it. */
export function MemberRow({ member, setting }: { member: Member; setting: HouseholdSetting }) {
  const t = useTranslations('household');
  const words = useRefusalWords();
  const change = useChangeMember();
  const [removing, setRemoving] = useState(false);
  const { id, name, role, you, chemicalsAllowed } = member;
  const wanted = change.isPending ? change.variables : member;
  const changes = setting.mayInvite && !setting.demo;
  return (
    <li className="grid grid-cols-[44px_minmax(0,1fr)] gap-x-2 border-t border-rule py-3.5 md:grid-cols-[44px_minmax(0,11rem)_minmax(0,1fr)_minmax(0,11rem)]">
      <Avatar name={name} ring={ringOf[role]} className="mt-0.5" />
      <p className="min-w-0">
        <b className="block font-display text-name break-words">{name}</b>
        <span className="block text-small text-ink-2">
          {you ? t('you', { role: t(`role.${role}`) }) : t(`role.${role}`)}
        </span>
      </p>
      <div className="col-start-2 min-w-0 md:col-start-3">
        <p className="text-body">{t(`does.${role}`)}</p>
        <p className="text-small text-ink-2">
          {member.handlesChemicals && member.cardReadAt !== null
            ? t('card.handles', { when: dayIn(setting, member.cardReadAt) })
            : t(chemicalsAllowed && role !== 'viewer' ? 'card.waits' : 'card.none')}
        </p>
        {you && role !== 'viewer' && chemicalsAllowed && !member.handlesChemicals ? <ConfirmCard /> : null}
        {changes && role !== 'viewer' ? (
          <Switch
            label={<span className="text-small">{t('allow', { name })}</span>}
            checked={wanted.chemicalsAllowed}
            onChange={(allowed) => change.mutate({ id, role, chemicalsAllowed: allowed })}
          />
        ) : null}
        {change.error === null ? null : (
          <p role="alert" className="mt-1 text-small font-emphasis text-terra-ink">
            {words(change.error)}
          </p>
        )}
      </div>
      {changes ? (
        <div className="col-start-2 mt-2 grid content-start gap-1.5 md:col-start-4 md:mt-0">
          <PlainSelect
            label={<span className="sr-only">{t('changeRole', { name })}</span>}
            options={roles.map((value) => ({ value, label: t(`role.${value}`) }))}
            value={wanted.role}
            onChange={(next) =>
              change.mutate(
                { id, role: next, chemicalsAllowed: next !== 'viewer' && chemicalsAllowed },
                // What the page shows hangs on one's own role.
                { onSuccess: () => you && leaveFor('/household') },
              )
            }
          />
          {you ? null : (
            <Button variant="quiet" className="justify-self-start" onClick={() => setRemoving(true)}>
              {t('remove')}
            </Button>
          )}
        </div>
      ) : null}
      {removing ? <RemoveDialog member={member} onClose={() => setRemoving(false)} /> : null}
    </li>
  );
}

function RemoveDialog({ member: { id, name }, onClose }: { member: Member; onClose: () => void }) {
  const t = useTranslations('household');
  const common = useTranslations('common');
  const words = useRefusalWords();
  const end = useEndMember();
  return (
    <Dialog
      open
      onOpenChange={(open) => {
        if (!open) onClose();
      }}
      title={t('removeTitle', { name })}
      description={t('removeWords')}
      closeLabel={common('close')}
      actions={
        <>
          <Button
            variant="primary"
            busy={end.isPending ? t('removing') : undefined}
            onClick={() => end.mutate(id, { onSuccess: onClose })}
          >
            {t('removeYes')}
          </Button>
          <Button onClick={onClose}>{common('cancel')}</Button>
        </>
      }
    >
      {end.error === null ? null : <p role="alert">{words(end.error)}</p>}
    </Dialog>
  );
}

/** The safety card is read again each season, by whoever handles chemicals. */
function ConfirmCard() {
  const t = useTranslations('household.card');
  const words = useRefusalWords();
  const confirm = useConfirmCard();
  return (
    <div className="my-2 grid justify-items-start gap-1">
      <PageLink href="/help/safety" className={`inline-flex min-h-11 items-center text-body ${textLink}`}>
        {t('read')}
      </PageLink>
      <Button busy={confirm.isPending ? t('confirming') : undefined} onClick={() => confirm.mutate()}>
        {t('confirm')}
      </Button>
      {confirm.error === null ? null : <p role="alert">{words(confirm.error)}</p>}
    </div>
  );
}
