import { Siren } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { BarLink } from './bar-link';
import { BrandMark } from './brand-mark';
import { Faces } from './faces';
import type { HouseholdFrame } from './member';
import { OpenSituations } from './open-situations';
import { PageLink } from './page-link';
import { emergencyCard } from './addresses';
import { barPlaces } from './places';
import { SignOutButton } from './sign-out-button';

/** One line of places on a desk, no menu: what is used every week at the left, what is set up once at the right. */
export function HouseholdBar({ frame }: { frame: HouseholdFrame }) {
  const t = useTranslations('navigation');
  const common = useTranslations('common');
  return (
    <header className="mx-auto hidden h-13.5 max-w-sheet items-center gap-3.5 px-margin md:flex lg:gap-7.5">
      <PageLink href="/week" className="inline-flex min-h-11 items-center gap-2.5 font-display text-brand">
        <BrandMark />
        <span className="sr-only lg:not-sr-only">{common('productName')}</span>
      </PageLink>
      <nav aria-label={t('places')} className="flex gap-3.5 lg:ml-6.5 lg:gap-6">
        {barPlaces.map(({ href, name }) => (
          <BarLink key={href} href={href}>
            {t(name)}
            {href === '/situations' && <OpenSituations />}
          </BarLink>
        ))}
      </nav>
      <nav aria-label={t('setUp')} className="ml-auto flex items-center gap-3.5 lg:gap-6">
        <BarLink href={emergencyCard} loud>
          <Siren aria-hidden="true" className="size-4.25" />
          {t('emergency')}
        </BarLink>
        <BarLink href="/rounds">{t('rounds')}</BarLink>
        <BarLink href="/pool">{t('pool')}</BarLink>
        <BarLink href="/help">{t('help')}</BarLink>
        <PageLink href="/household" className="flex min-h-11 items-center gap-2.25">
          <Faces people={frame.people} />
          <span className="text-fine">
            <b className="block max-w-44 truncate font-emphasis">{frame.householdName}</b>
            <span className="block max-w-44 truncate text-ink-2">
              {t('nameAndRole', { name: frame.you.name, role: t(`role.${frame.you.role}`) })}
            </span>
          </span>
        </PageLink>
        <SignOutButton className="text-[15px] leading-5" />
      </nav>
    </header>
  );
}
