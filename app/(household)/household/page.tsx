import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { HouseholdScreen } from '@/components/household/household-screen';
import { requireHousehold } from '@/lib/auth/page-gate';
import { may } from '@/lib/auth/permissions';
import { shortestPassword } from '@/lib/schemas/account';
import { ClientMessages } from '@/lib/messages/client-messages';
import { forPage } from '@/lib/services/for-page';
import { showHandOvers } from '@/lib/services/show-hand-overs';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('household');
  return { title: t('title') };
}

export default async function HouseholdPage() {
  const visit = await requireHousehold();
  const { access } = visit;
  const duty = await forPage(showHandOvers(visit));
  const { timeZone, locale, demo } = access;
  return (
    <ClientMessages namespaces={['household']} parts={{ start: ['form', 'signUp'], passkeys: ['account', 'problem'] }}>
      <HouseholdScreen
        setting={{
          ...{ timeZone, locale, demo, mayInvite: may(access, 'invite') },
          mayHandOver: may(access, 'hand-over'),
          mayReadAuditTrail: may(access, 'read-audit-trail'),
        }}
        initialDuty={duty}
        shortestPassword={shortestPassword}
      />
    </ClientMessages>
  );
}
