import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { HouseholdPhotos } from '@/components/photos/household-photos';
import { PoolProfile } from '@/components/pool/pool-profile';
import { requireHousehold } from '@/lib/auth/page-gate';
import { may } from '@/lib/auth/permissions';
import { ClientMessages } from '@/lib/messages/client-messages';
import { forPage } from '@/lib/services/for-page';
import { listShelfProducts } from '@/lib/services/list-shelf-products';
import { readPool } from '@/lib/services/read-pool';
import { showLearnt } from '@/lib/services/show-learnt';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('pool');
  return { title: t('profile.title') };
}

/** The words of a pool that is described; those of the questions come with the steps. */
const described = ['profile', 'scope', 'size', 'drawing', 'lining', 'sun', 'water', 'ingredient', 'product'];

/** What is known of the pool comes with the page. */
export default async function PoolPage() {
  const visit = await requireHousehold();
  const { access } = visit;
  const { householdId, householdName, timeZone, locale, unitSystem, personName } = access;
  const household = { id: householdId, name: householdName, timeZone, locale, unitSystem, personName };
  const [setup, shelf, learnt] = await Promise.all([
    forPage(readPool(visit)),
    forPage(listShelfProducts(visit)),
    forPage(showLearnt(visit)),
  ]);
  return (
    <ClientMessages namespaces={['learnt', 'photos', 'units']} parts={{ 'first-run': ['notLoaded'], pool: described }}>
      <PoolProfile
        household={{ ...household, mayChange: may(access, 'change-pool') }}
        mayForget={may(access, 'reset-learning')}
        initial={{ setup, shelf, learnt }}
      />
      <HouseholdPhotos setting={{ timeZone, locale }} mayAdd={may(access, 'add-photos')} />
    </ClientMessages>
  );
}
