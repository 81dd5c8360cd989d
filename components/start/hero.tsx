import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { textLink } from '@/components/ui/text-link';
import { buttonClass } from '@/components/ui/button-class';
import { LookRoundButton } from './look-round-button';

/** What it is in two lines and one sentence, and the three ways in. */
export function Hero() {
  const t = useTranslations('start.landing');
  return (
    <div className="grid md:border-t md:border-rule lg:grid-cols-[1fr_326px]">
      <div className="pt-5.5 lg:py-11 lg:pr-10">
        <h1 className="font-display text-landing">
          {t('headline')}
          <br />
          {t('headlineSecond')}
        </h1>
        <p className="mt-3 max-w-[880px] font-display text-sentence text-pretty md:mt-4.5">{t('sentence')}</p>
      </div>
      <div className="grid content-start gap-2.5 py-5 sm:grid-cols-2 lg:grid-cols-1 lg:border-l lg:border-rule lg:py-12 lg:pl-6.5">
        <p className="order-last text-small sm:col-span-2 lg:col-span-1 text-ink-2 lg:order-none lg:mb-1 lg:text-body">
          {t('need')}
        </p>
        <PageLink href="/sign-up" className={buttonClass({ variant: 'primary', size: 'large', wide: true })}>
          {t('start')}
        </PageLink>
        <LookRoundButton size="large" />
        <p className="hidden text-body lg:block">
          {t.rich('haveSheet', {
            link: (words) => (
              <PageLink href="/sign-in" className={textLink}>
                {words}
              </PageLink>
            ),
          })}
        </p>
      </div>
    </div>
  );
}
