import { useTranslations } from 'next-intl';
import { DoubleRule } from '@/components/ui/double-rule';
import { BrandMark } from './brand-mark';
import { Faces } from './faces';
import type { HouseholdFrame } from './member';
import { PageLink } from './page-link';
import { SirenLink } from './siren-link';

/** The head of a phone page: whose pool it is, the siren, the faces. */
export function PhoneTop({ frame }: { frame: HouseholdFrame }) {
  const t = useTranslations('navigation');
  return (
    <header className="px-margin md:hidden">
      <div className="flex h-15 items-center gap-2.75">
        <PageLink href="/week" className="flex min-h-11 min-w-0 flex-1 items-center gap-2.75">
          <BrandMark className="size-7" />
          <span className="min-w-0">
            <b className="block truncate font-display text-brand font-section">{frame.householdName}</b>
            <span className="block truncate text-[13.5px] leading-[17px] text-ink-2">
              {t('nameAndRole', { name: frame.you.name, role: t(`role.${frame.you.role}`) })}
            </span>
          </span>
        </PageLink>
        <SirenLink />
        <Faces people={frame.people} />
      </div>
      <DoubleRule />
    </header>
  );
}
