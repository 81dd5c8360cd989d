import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { headers } from 'next/headers';
import { Hero } from '@/components/start/hero';
import { LandingFoot } from '@/components/start/landing-foot';
import { likelyUnits } from '@/components/start/likely-units';
import { SampleWeek } from '@/components/start/sample-week/sample-week';
import { ScopeList } from '@/components/start/scope-list';
import { ThreeReasons } from '@/components/start/three-reasons';
import { DoubleRule } from '@/components/ui/double-rule';
import { ClientMessages } from '@/lib/messages/client-messages';
import { forPage } from '@/lib/services/for-page';
import { showSampleWeek } from '@/lib/services/show-sample-week';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('start.landing');
  return { title: { absolute: t('title') } };
}

export default async function LandingPage() {
  const week = await forPage(showSampleWeek());
  const unitSystem = likelyUnits((await headers()).get('accept-language'));
  return (
    <div className="mx-auto max-w-sheet px-margin">
      <Hero />
      <DoubleRule className="hidden md:block" />
      <ClientMessages namespaces={['units']} parts={{ start: ['sample'] }}>
        <SampleWeek week={week} unitSystem={unitSystem} />
      </ClientMessages>
      <ThreeReasons />
      <ScopeList />
      <LandingFoot />
    </div>
  );
}
