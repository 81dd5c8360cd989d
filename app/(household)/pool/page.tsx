import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { PoolProfile } from '@/components/pool/pool-profile';
import { requireHousehold } from '@/lib/auth/page-gate';
import { may } from '@/lib/auth/permissions';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('pool');
  return { title: t('profile.title') };
}

export default async function PoolPage() {
  const { access } = await requireHousehold();
  const { householdId, householdName, timeZone, locale, unitSystem, personName } = access;
  const household = { id: householdId, name: householdName, timeZone, locale, unitSystem, personName };
  return (
    <PoolProfile
      household={{ ...household, mayChange: may(access, 'change-pool') }}
      mayForget={may(access, 'reset-learning')}
    />
  );
}
