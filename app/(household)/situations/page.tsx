import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { SituationIndexScreen } from '@/components/situations/situation-index-screen';
import { requireHousehold } from '@/lib/auth/page-gate';
import { may } from '@/lib/auth/permissions';
import { ClientMessages } from '@/lib/messages/client-messages';
import { forPage } from '@/lib/services/for-page';
import { showSituations } from '@/lib/services/show-situations';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('situations');
  return { title: t('title') };
}

export default async function SituationsPage() {
  const visit = await requireHousehold();
  const { access } = visit;
  const { timeZone, locale, unitSystem } = access;
  const initial = await forPage(showSituations(visit));
  return (
    <ClientMessages namespaces={['situations', 'doses', 'units']} parts={{ house: ['visits'] }}>
      <SituationIndexScreen
        household={{ timeZone, locale, unitSystem, mayOpen: may(access, 'open-situations') }}
        initial={initial}
      />
    </ClientMessages>
  );
}
