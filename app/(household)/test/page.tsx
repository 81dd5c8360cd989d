import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { TestEntry } from '@/components/readings/test-entry';
import { requireHousehold } from '@/lib/auth/page-gate';
import { ClientMessages } from '@/lib/messages/client-messages';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('readings');
  return { title: t('title') };
}

export default async function TestPage({ searchParams }: { searchParams: Promise<{ kind?: string | string[] }> }) {
  const { access, now } = await requireHousehold();
  const { householdId, personId, personName, role, handlesChemicals, timeZone, locale, unitSystem } = access;
  const { kind } = await searchParams;
  return (
    <ClientMessages namespaces={['photos', 'readings', 'units', 'verdict', 'week', 'doses', 'house']}>
      <TestEntry
        household={{ householdId, personId, personName, role, handlesChemicals, timeZone, locale, unitSystem }}
        kind={kind === 'quick' ? 'quick' : 'full'}
        serverNow={now.getTime()}
      />
    </ClientMessages>
  );
}
