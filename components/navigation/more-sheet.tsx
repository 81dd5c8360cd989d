'use client';

import {
  ChevronRight,
  CircleQuestionMark,
  Footprints,
  House,
  LifeBuoy,
  type LucideIcon,
  UsersRound,
  Waves,
} from 'lucide-react';
import { useTranslations } from 'next-intl';
import { Avatar } from '@/components/ui/avatar';
import { Sheet } from '@/components/ui/sheet';
import { ringOf } from './faces';
import { LanguageButton } from './language-button';
import type { HouseholdFrame } from './member';
import { PageLink } from './page-link';
import { emergencyCard } from './addresses';
import { SignOutButton } from './sign-out-button';

export type MoreSheetProps = { frame: HouseholdFrame; open: boolean; onOpenChange: (open: boolean) => void };

/** Everything that has no tab of its own: trouble first, then the places, then who you are. */
export function MoreSheet({ frame, open, onOpenChange }: MoreSheetProps) {
  const t = useTranslations('navigation');
  return (
    <Sheet open={open} onOpenChange={onOpenChange} title={t('moreTitle')} closeLabel={t('closeMore')} aboveTabs>
      <div className="mx-4 border-t border-rule pt-2.25 pb-1">
        <p className="text-[14.5px] leading-[19px] text-ink-2">{t('trouble')}</p>
        <div className="flex flex-wrap gap-x-5">
          <TroubleLink href={emergencyCard}>{t('emergencyCard')}</TroubleLink>
          <TroubleLink href="/help/safety">{t('keepingSafe')}</TroubleLink>
        </div>
      </div>
      <MorePlace href="/situations" Icon={LifeBuoy} name={t('situations')} fact={t('situationsFact')} />
      <MorePlace href="/rounds" Icon={Footprints} name={t('rounds')} fact={t('roundsFact')} />
      <MorePlace href="/house" Icon={House} name={t('house')} fact={t('houseFact')} />
      <MorePlace href="/pool" Icon={Waves} name={t('pool')} fact={t('poolFact')} />
      <MorePlace href="/household" Icon={UsersRound} name={t('household')} fact={t('householdFact')} />
      <MorePlace href="/help" Icon={CircleQuestionMark} name={t('help')} fact={t('helpFact')} />
      <div className="mx-4 flex min-h-14 items-center justify-between gap-3 border-t border-ink text-[15px] leading-5">
        <span className="inline-flex min-w-0 items-center gap-2.25">
          <Avatar name={frame.you.name} ring={ringOf[frame.you.role]} />
          <span className="min-w-0 truncate">
            {t('youAre', { name: frame.you.name, role: t(`role.${frame.you.role}`) })}
          </span>
        </span>
        <span className="flex items-center gap-4">
          <LanguageButton problem="above" />
          <SignOutButton problem="above" />
        </span>
      </div>
    </Sheet>
  );
}

type MorePlaceProps = { href: string; Icon: LucideIcon; name: string; fact: string };

function MorePlace({ href, Icon, name, fact }: MorePlaceProps) {
  return (
    <PageLink href={href} className="mx-4 flex min-h-17 items-center gap-3 border-t border-rule">
      <Icon aria-hidden="true" className="size-5.75 shrink-0" />
      <span className="min-w-0 flex-1">
        <b className="block font-display text-[19px] leading-[23px] font-section">{name}</b>
        <span className="block text-[14.5px] leading-[19px] text-ink-2">{fact}</span>
      </span>
      <ChevronRight aria-hidden="true" className="size-5 shrink-0 text-ink-3" />
    </PageLink>
  );
}

function TroubleLink({ href, children }: { href: string; children: React.ReactNode }) {
  return (
    <PageLink
      href={href}
      className="inline-flex min-h-11 items-center text-[15.5px] leading-5 font-emphasis underline decoration-1 underline-offset-[3px]"
    >
      {children}
    </PageLink>
  );
}
