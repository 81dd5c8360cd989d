import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { RoundScreen } from '@/components/rounds/round-screen';
import { requireHousehold } from '@/lib/auth/page-gate';
import { may } from '@/lib/auth/permissions';
import { ClientMessages } from '@/lib/messages/client-messages';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('rounds');
  return { title: t('title') };
}

export default async function RoundsPage() {
  const { access, now } = await requireHousehold();
  const { timeZone, locale, unitSystem, personName } = access;
  return (
    <ClientMessages namespaces={['rounds', 'house', 'units']}>
      <RoundScreen
        household={{
          ...{ timeZone, locale, unitSystem, personName },
          mayDoRounds: may(access, 'do-rounds'),
          mayKeepHouseNotes: may(access, 'keep-house-notes'),
        }}
        serverNow={now.getTime()}
      />
    </ClientMessages>
  );
}
