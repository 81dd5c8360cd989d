'use client';

import { useQuery } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { HelpHead } from '@/components/help/help-head';
import { Button } from '@/components/ui/button';
import { ProblemState } from '@/components/ui/problem-state';
import { Skeleton } from '@/components/ui/skeleton';
import { handOversOptions } from '@/lib/client/hand-overs';
import { peopleOptions } from '@/lib/client/members';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import type { HandOvers } from '@/lib/schemas/hand-over';
import { Account } from './account';
import { AuditTrail } from './audit-trail';
import { Closing } from './closing';
import { DeleteAccount } from './delete-account';
import { Devices } from './devices';
import type { HouseholdSetting } from './household-setting';
import { InvitationRow } from './invitation-row';
import { InviteForm } from './invite-form';
import { Leaving } from './leaving';
import { MemberRow } from './member-row';
import { OnDuty } from './on-duty';
import { OtherHouseholds } from './other-households';
import { useDutyWords } from './use-duty-words';

type Props = { setting: HouseholdSetting; shortestPassword: number; initialDuty?: HandOvers | undefined };

/** Who belongs to the household, what each may do, and who is invited. */
export function HouseholdScreen({ setting, shortestPassword, initialDuty }: Props) {
  const t = useTranslations('household');
  const common = useTranslations('common');
  const problemWords = useProblemWords();
  const { data, isPending, error, refetch } = useQuery(peopleOptions());
  const { data: duty } = useQuery(handOversOptions(initialDuty));
  const head = useDutyWords(setting).head(duty);
  return (
    <div className="mx-auto max-w-sheet px-margin pb-10">
      <HelpHead headline={head?.headline ?? t('title')} lead={head?.lead ?? t('lead')} />
      <div className="grid gap-x-9 gap-y-5 pt-3 lg:grid-cols-[minmax(0,1fr)_326px]">
        <div className="min-w-0">
          <section aria-labelledby="people">
            <h2 id="people" className="pb-1.5 font-display text-section">
              {t('people')}
            </h2>
            {data !== undefined ? (
              <ul>
                {data.members.map((member) => (
                  <MemberRow key={member.id} member={member} setting={setting} />
                ))}
                {data.invitations.map((invitation) => (
                  <InvitationRow key={invitation.id} invitation={invitation} setting={setting} />
                ))}
              </ul>
            ) : isPending ? (
              <Skeleton label={t('loading')} className="mt-2 h-40" />
            ) : (
              <ProblemState
                title={t('notLoaded')}
                action={<Button onClick={() => void refetch()}>{common('tryAgain')}</Button>}
              >
                {problemWords(error)}
              </ProblemState>
            )}
          </section>
          {duty === undefined ? null : <OnDuty duty={duty} members={data?.members ?? []} setting={setting} />}
          {setting.mayReadAuditTrail ? <AuditTrail setting={setting} /> : null}
        </div>
        <div className="grid content-start gap-5">
          {setting.demo ? <p className="text-small text-ink-2">{t('demo')}</p> : null}
          {setting.mayInvite && !setting.demo && data !== undefined ? <InviteForm mailFrom={data.mailFrom} /> : null}
          {setting.mayInvite ? null : <p className="text-small text-ink-2">{t('onlyOwners')}</p>}
          <OtherHouseholds />
          {setting.demo ? null : <Account setting={setting} shortestPassword={shortestPassword} />}
          {setting.demo ? null : <Devices setting={setting} />}
          {setting.demo ? null : (
            <section aria-labelledby="leaving" className="grid gap-1">
              <h2 id="leaving" className="font-display text-section">
                {t('leavingTitle')}
              </h2>
              {data === undefined ? null : <Leaving members={data.members} />}
              {data === undefined ? null : <Closing members={data.members} />}
              <DeleteAccount />
            </section>
          )}
        </div>
      </div>
    </div>
  );
}
