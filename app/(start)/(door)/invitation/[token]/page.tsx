import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { EntryPage } from '@/components/start/entry-page';
import { InvitationForm } from '@/components/start/invitation-form';
import { findHousehold, openPageVisit } from '@/lib/auth/page-gate';
import { ClientMessages } from '@/lib/messages/client-messages';
import { shortestPassword } from '@/lib/schemas/account';
import { seeInvitation } from '@/lib/services/join-household';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('invitation');
  // What stands in the address opens a household: nobody else is told it.
  return { title: t('closed'), referrer: 'no-referrer', robots: { index: false } };
}

export default async function InvitationPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const t = await getTranslations('invitation');
  const visit = await openPageVisit();
  const opened = await seeInvitation(visit, token);
  if (opened.state !== 'open')
    return (
      <EntryPage title={t(`over.${opened.state}`)} lead={t('overWords')}>
        {null}
      </EntryPage>
    );
  const { householdName, invitedBy, name, role } = opened;
  const lead = t('lead', {
    by: invitedBy === null ? 'none' : 'somebody',
    inviter: invitedBy ?? '',
    household: householdName,
    role,
  });
  return (
    <ClientMessages namespaces={['invitation']} parts={{ start: ['form', 'signUp'] }}>
      <EntryPage title={t('title')} lead={lead}>
        <InvitationForm
          token={token}
          name={name}
          signedIn={visit.signedIn !== null && (await findHousehold())?.access.demo !== true}
          shortestPassword={shortestPassword}
        />
      </EntryPage>
    </ClientMessages>
  );
}
