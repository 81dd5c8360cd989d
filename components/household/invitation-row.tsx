'use client';

import { useTranslations } from 'next-intl';
import { Avatar } from '@/components/ui/avatar';
import { Button } from '@/components/ui/button';
import { useInviteAgain, useUninvite } from '@/lib/client/members';
import type { Invitation } from '@/lib/schemas/member';
import { dayIn, timeIn } from './day-in';
import type { HouseholdSetting } from './household-setting';
import { InvitationLink } from './invitation-link';
import { useRefusalWords } from './use-refusal-words';

/** Somebody who was asked and has not come yet. */
export function InvitationRow({ invitation, setting }: { invitation: Invitation; setting: HouseholdSetting }) {
  const t = useTranslations('household');
  const words = useRefusalWords();
  const again = useInviteAgain();
  const withdraw = useUninvite();
  const { id, name, email, mail, role, expired } = invitation;
  const when = dayIn(setting, invitation.expiresAt);
  const problem = again.error ?? withdraw.error;
  return (
    <li className="grid grid-cols-[44px_minmax(0,1fr)] gap-x-2 border-t border-rule py-3.5 md:grid-cols-[44px_minmax(0,11rem)_minmax(0,1fr)]">
      <Avatar name={name} ring="dashed" className="mt-0.5" />
      <p className="min-w-0">
        <b className="block font-display text-name break-words">{name}</b>
        <span className="block text-small text-ink-2">{t('invited', { role: t(`role.${role}`) })}</span>
      </p>
      <div className="col-start-2 min-w-0 md:col-start-3">
        <p className="text-body">{t(expired ? 'over' : 'until', { when })}</p>
        {email === null || mail === null ? null : (
          <p className="text-small break-words text-ink-2">
            {t(`mail.${mail.state}`, {
              email,
              when: mail.nextTryAt === null ? '' : timeIn(setting, mail.nextTryAt),
            })}
            {mail.refusal === null ? null : <span className="block">{t('mail.said', { refusal: mail.refusal })}</span>}
          </p>
        )}
        <div className="flex flex-wrap gap-x-3">
          <Button
            variant="quiet"
            className="-ml-1.5"
            busy={again.isPending ? t(email === null ? 'againBusy' : 'mail.againBusy') : undefined}
            onClick={() => again.mutate(id)}
          >
            {t(email === null ? 'again' : 'mail.again')}
          </Button>
          <Button
            variant="quiet"
            busy={withdraw.isPending ? t('withdrawing') : undefined}
            onClick={() => withdraw.mutate(id)}
          >
            {t('withdraw')}
          </Button>
        </div>
        {again.data === undefined || again.data.link === null ? null : (
          <InvitationLink name={name} link={again.data.link} />
        )}
        {problem === null ? null : (
          <p role="alert" className="text-small font-emphasis text-terra-ink">
            {words(problem)}
          </p>
        )}
      </div>
    </li>
  );
}
