import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { DrawnSheet } from '@/components/start/drawn-sheet';
import { Hero } from '@/components/start/hero';
import { LandingFoot } from '@/components/start/landing-foot';
import { ScopeList } from '@/components/start/scope-list';
import { ThreeReasons } from '@/components/start/three-reasons';
import { YourWeek } from '@/components/start/your-week';
import { DoubleRule } from '@/components/ui/double-rule';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('start.landing');
  return { title: { absolute: t('title') } };
}

export default function LandingPage() {
  return (
    <div className="mx-auto max-w-sheet px-margin">
      <Hero />
      <DoubleRule className="hidden md:block" />
      <div className="grid gap-x-7.5 border-t-todo border-ink md:border-t-0 lg:grid-cols-[1fr_326px]">
        <DrawnSheet />
        <YourWeek />
      </div>
      <ThreeReasons />
      <ScopeList />
      <LandingFoot />
    </div>
  );
}
