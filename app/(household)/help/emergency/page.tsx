import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { headers } from 'next/headers';
import { EmergencyCard } from '@/components/help/emergency-card';
import { findHousehold } from '@/lib/auth/page-gate';
import { emergencyCountryOf, isEmergencyCountry } from '@/lib/standards/emergency-numbers';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('help.emergency');
  return { title: t('title') };
}

/** The country asked for, else the household's, else the first the browser names. */
export default async function EmergencyPage({
  searchParams,
}: {
  searchParams: Promise<{ country?: string | string[] }>;
}) {
  const { country } = await searchParams;
  const asked = typeof country === 'string' && isEmergencyCountry(country) ? country : undefined;
  return <EmergencyCard country={asked ?? emergencyCountryOf(await placeOfReader())} />;
}

async function placeOfReader(): Promise<string> {
  const visit = await findHousehold();
  return visit?.access.locale ?? (await headers()).get('accept-language') ?? '';
}
