import { Siren } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { buttonClass } from '@/components/ui/button-class';
import { DoubleRule } from '@/components/ui/double-rule';
import { textLink } from '@/components/ui/text-link';
import { BarLink } from './bar-link';
import { BrandMark } from './brand-mark';
import { PageLink } from './page-link';
import { emergencyCard } from './addresses';
import { SignOutButton } from './sign-out-button';
import { SirenLink } from './siren-link';

const doorLink = 'inline-flex min-h-11 items-center text-[16px] leading-5 whitespace-nowrap md:text-[15px]';

/**
 * The bar before the door: words only on a desk, mark and siren on a phone. Whoever is signed in already, but not inside a
 * household's pages, finds the way to the sheet and out.
 */
export function SignedOutBar({ signedIn = false }: { signedIn?: boolean }) {
  const t = useTranslations('navigation');
  const common = useTranslations('common');
  return (
    <header className="print:hidden">
      <div className="mx-auto flex h-15 max-w-sheet items-center gap-5 px-margin md:h-13.5 lg:gap-7.5">
        <PageLink href="/" className="inline-flex min-h-11 items-center gap-2.5 font-display text-brand">
          <BrandMark />
          {common('productName')}
        </PageLink>
        <nav aria-label={t('places')} className="ml-3 hidden gap-6 md:flex">
          <BarLink href="/help/safety">{t('keepingSafe')}</BarLink>
          <BarLink href="/#for-your-pool">{t('forYourPool')}</BarLink>
          <BarLink href="/help" exact>
            {t('help')}
          </BarLink>
        </nav>
        <nav aria-label={t('setUp')} className="ml-auto flex items-center gap-3 md:gap-6">
          <span className="hidden md:inline">
            <BarLink href={emergencyCard} loud>
              <Siren aria-hidden="true" className="size-4.25" />
              {t('emergency')}
            </BarLink>
          </span>
          <span className="md:hidden">
            <SirenLink />
          </span>
          <PageLink href={signedIn ? '/week' : '/sign-in'} className={`${doorLink} ${textLink}`}>
            {signedIn ? t('toYourSheet') : t('signIn')}
          </PageLink>
          <span className="hidden md:inline">
            {signedIn ? (
              <SignOutButton className="text-[15px] leading-5" />
            ) : (
              <PageLink href="/sign-up" className={buttonClass({ size: 'small' })}>
                {t('signUp')}
              </PageLink>
            )}
          </span>
        </nav>
      </div>
      <DoubleRule className="mx-margin md:hidden" />
    </header>
  );
}
