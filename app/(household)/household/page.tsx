import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { HouseholdScreen } from '@/components/household/household-screen';
import { requireHousehold } from '@/lib/auth/page-gate';
import { may } from '@/lib/auth/permissions';
import { shortestPassword } from '@/lib/schemas/account';
import { ClientMessages } from '@/lib/messages/client-messages';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('household');
  return { title: t('title') };
}

export default async function HouseholdPage() {
  const { access } = await requireHousehold();
  const { timeZone, locale, demo } = access;
  return (
    <ClientMessages namespaces={['household']} parts={{ start: ['signUp'], passkeys: ['account', 'problem'] }}>
      <HouseholdScreen
        setting={{ timeZone, locale, demo, mayInvite: may(access, 'invite') }}
        shortestPassword={shortestPassword}
      />
    </ClientMessages>
  );
}
