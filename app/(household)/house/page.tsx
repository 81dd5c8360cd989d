import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { HouseScreen } from '@/components/house/house-screen';
import { requireHousehold } from '@/lib/auth/page-gate';
import { may } from '@/lib/auth/permissions';
import { ClientMessages } from '@/lib/messages/client-messages';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('house');
  return { title: t('title') };
}

export default async function HousePage() {
  const { access } = await requireHousehold();
  const { timeZone, locale } = access;
  return (
    <ClientMessages namespaces={['house']}>
      <HouseScreen household={{ timeZone, locale, mayKeepHouseNotes: may(access, 'keep-house-notes') }} />
    </ClientMessages>
  );
}
