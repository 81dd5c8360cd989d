'use client';

import { ArrowLeft } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { BrandMark } from '@/components/navigation/brand-mark';
import { PageLink } from '@/components/navigation/page-link';
import { SirenLink } from '@/components/navigation/siren-link';
import { ProgressRuler } from '@/components/ui/progress-ruler';
import type { SetupStep } from '@/lib/schemas/pool-profile';
import { usePoolSetting } from './setting';
import { addressOf } from './step-address';
import { rulerPart, rulerParts, stepBefore } from './step-order';

/** Where one is and the way back. */
export function StepHeader({ step }: { step: SetupStep }) {
  const { place } = usePoolSetting();
  return place === 'profile' ? <BackToProfile /> : <FirstRunHeader step={step} />;
}

/** In the first run there is nothing else on the page; on a phone the ruler of five parts stands below. */
function FirstRunHeader({ step }: { step: SetupStep }) {
  const t = useTranslations('first-run');
  const common = useTranslations('common');
  const { name } = usePoolSetting();
  const part = rulerPart[step];
  const before = stepBefore(step);
  const first = part === 0;
  const count = first ? t('scopeCount') : t('partOf', { part, parts: rulerParts });
  return (
    <header>
      <div className="grid min-h-14.5 grid-cols-[48px_1fr_auto] items-center pr-2 pl-1 md:hidden">
        <PageLink
          href={before === undefined ? '/' : addressOf(before, 'first-run')}
          aria-label={t('back')}
          className="flex size-12 items-center justify-center"
        >
          <ArrowLeft aria-hidden="true" className="size-5.5" />
        </PageLink>
        <span className="truncate font-display text-name">{first ? t('beforeYouStart') : t('setUp')}</span>
        <span className="flex items-center gap-1">
          <span className="text-small text-ink-2">{count}</span>
          <SirenLink />
        </span>
      </div>
      <div className="px-margin md:hidden">
        <ProgressRuler
          parts={rulerParts}
          current={part}
          label={first ? t('scopeCount') : t('progress', { part, parts: rulerParts })}
        />
      </div>
      <div className="hidden h-13.5 items-center gap-6.5 px-margin md:flex">
        <span className="inline-flex items-center gap-2.5 font-display text-brand">
          <BrandMark />
          {common('productName')}
        </span>
        <span className="min-w-0 truncate text-[15px] leading-5 text-ink-2">{t('settingUp', { name })}</span>
        <span className="ml-auto flex items-center gap-3">
          <SirenLink />
          <PageLink
            href="/"
            className="inline-flex min-h-11 items-center text-[15px] leading-5 underline decoration-1 underline-offset-[3px]"
          >
            {t('goOnLater')}
          </PageLink>
        </span>
      </div>
    </header>
  );
}

function BackToProfile() {
  const t = useTranslations('first-run');
  return (
    <p className="px-margin">
      <PageLink
        href="/pool"
        className="inline-flex min-h-12 items-center gap-2 text-body underline decoration-1 underline-offset-[3px]"
      >
        <ArrowLeft aria-hidden="true" className="size-5" />
        {t('leaveProfile')}
      </PageLink>
    </p>
  );
}
