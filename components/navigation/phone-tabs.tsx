'use client';

import { Ellipsis } from 'lucide-react';
import dynamic from 'next/dynamic';
import { usePathname } from 'next/navigation';
import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { classNames } from '@/components/ui/class-names';
import { untilFetched } from '@/components/ui/until-fetched';
import { useIdleFetch } from '@/components/ui/use-idle-fetch';
import { useOpenedOnce } from '@/components/ui/use-opened-once';
import type { HouseholdFrame } from './member';
import { PageLink } from './page-link';
import { isCurrent } from './addresses';
import { weeklyPlaces } from './places';

const fetchMore = () => import('./more-sheet');
const MoreSheet = dynamic(() => untilFetched(() => import('./more-sheet')).then((part) => part.MoreSheet), {
  ssr: false,
});

const tab =
  'relative -mt-px flex h-tabs cursor-pointer flex-col items-center justify-center gap-1 border-t-[3px] text-[13.5px] leading-4';

/** The bar at the foot of a phone. More stays marked in every place it led to. */
export function PhoneTabs({ frame }: { frame: HouseholdFrame }) {
  const t = useTranslations('navigation');
  const path = usePathname();
  // Open for one address only, so that going somewhere closes it.
  const [openAt, setOpenAt] = useState<string | null>(null);
  const open = openAt === path;
  useIdleFetch(fetchMore);
  const opened = useOpenedOnce(open);
  const elsewhere = !weeklyPlaces.some(({ href }) => isCurrent(href, path));
  const look = (current: boolean) =>
    classNames(tab, current ? 'border-ink font-strong text-ink' : 'border-transparent text-ink-2');

  return (
    <>
      {opened && <MoreSheet frame={frame} open={open} onOpenChange={(next) => setOpenAt(next ? path : null)} />}
      <nav
        aria-label={t('places')}
        className="fixed inset-x-0 bottom-0 z-25 grid auto-cols-fr grid-flow-col border-t border-ink bg-paper-lift md:hidden print:hidden"
      >
        {weeklyPlaces.map(({ href, shortName, Icon }) => {
          const current = !open && isCurrent(href, path);
          return (
            <PageLink
              key={href}
              href={href}
              aria-current={isCurrent(href, path) ? 'page' : undefined}
              className={look(current)}
            >
              <Icon aria-hidden="true" className="size-5.75" />
              {t(shortName)}
            </PageLink>
          );
        })}
        <button
          type="button"
          aria-haspopup="dialog"
          aria-expanded={open}
          className={look(open || elsewhere)}
          onClick={() => setOpenAt(open ? null : path)}
        >
          <Ellipsis aria-hidden="true" className="size-5.75" />
          {t('more')}
        </button>
      </nav>
    </>
  );
}
