import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { SituationsScreen } from '@/components/situations/situations-screen';
import { requireHousehold } from '@/lib/auth/page-gate';
import { may } from '@/lib/auth/permissions';
import { ClientMessages } from '@/lib/messages/client-messages';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('situations');
  return { title: t('title') };
}

export default async function SituationsPage() {
  const { access } = await requireHousehold();
  const { timeZone, locale, unitSystem } = access;
  return (
    <ClientMessages namespaces={['situations', 'doses', 'units']} parts={{ house: ['visits'] }}>
      <SituationsScreen household={{ timeZone, locale, unitSystem, mayOpen: may(access, 'open-situations') }} />
    </ClientMessages>
  );
}
