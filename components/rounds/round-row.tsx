'use client';

import {
  ArchiveIcon,
  Brush,
  CircleDot,
  DoorClosed,
  Droplet,
  Gauge,
  Lock,
  type LucideIcon,
  MoveVertical,
  ShoppingBasket,
  Waves,
} from 'lucide-react';
import { useTranslations } from 'next-intl';
import { ProfessionalCall } from '@/components/house/professional-call';
import { PageLink } from '@/components/navigation/page-link';
import { emergencyCard } from '@/components/navigation/addresses';
import { buttonClass } from '@/components/ui/button-class';
import { Callout } from '@/components/ui/callout';
import { classNames } from '@/components/ui/class-names';
import { UNHEARD } from '@/components/ui/early-presses';
import { useEarlyPress } from '@/components/ui/use-early-press';
import type { RoundItem } from '@/lib/schemas/round-items';
import { filterPressureRise } from '@/lib/standards/filter';
import { BucketTest } from './bucket-test';
import { writePressure } from './pressures';
import type { RoundHousehold } from './round-household';

const icons: Record<RoundItem, LucideIcon> = {
  baskets: ShoppingBasket,
  'water-level': Waves,
  'filter-pressure': Gauge,
  brushed: Brush,
  'pump-seal': Droplet,
  'feeder-lid': ArchiveIcon,
  'drain-cover': CircleDot,
  'gate-latch': DoorClosed,
  ladder: MoveVertical,
  lockers: Lock,
};

/** What asks for a test of the water today. */
const acidSigns: readonly RoundItem[] = ['pump-seal', 'brushed'];
/** What may end with a call for a technician. */
const forTechnician: readonly RoundItem[] = ['pump-seal', 'brushed', 'feeder-lid', 'water-level'];

type Props = {
  item: RoundItem;
  off: boolean;
  onToggle: () => void;
  household: RoundHousehold;
  /** Of the clean filter [bar]; null when nobody wrote it down. */
  cleanPressure: number | null;
  children?: React.ReactNode;
};

/** One thing to look at. Where it is not fine, what to do about it stands below. */
export function RoundRow({ item, off, onToggle, household, cleanPressure, children }: Props) {
  const t = useTranslations('rounds');
  const common = useTranslations('common');
  const navigation = useTranslations('navigation');
  const pressed = useEarlyPress(undefined);
  const Icon = icons[item];
  const pressure = (bar: number) => writePressure(bar, household.unitSystem, household.locale);
  const fine =
    item === 'filter-pressure' && cleanPressure !== null
      ? t('item.filter-pressure.fineUpTo', {
          clean: pressure(cleanPressure),
          most: pressure(cleanPressure + filterPressureRise.from),
        })
      : t(`item.${item}.fine`);
  const stop = item === 'drain-cover';
  return (
    <li
      className={classNames(
        'border-t border-rule py-3',
        off && '-mx-margin border-y-due border-ink bg-paper-lift px-margin md:mx-0',
      )}
    >
      <div className="flex min-h-11 items-center gap-4">
        <Icon aria-hidden="true" className="size-5.5 shrink-0" />
        <p className="min-w-0 flex-1">
          <span className="block text-field font-strong">{t(off ? `item.${item}.off` : `item.${item}.name`)}</span>
          {!off && <span className="block text-small text-ink-2">{fine}</span>}
        </p>
        <button
          {...{ [UNHEARD]: '' }}
          ref={pressed}
          type="button"
          aria-pressed={off}
          aria-label={t(off ? 'fineAfterAllOf' : 'notFineOf', { name: t(`item.${item}.name`) })}
          className="min-h-11 shrink-0 cursor-pointer text-body underline decoration-1 underline-offset-[3px]"
          onClick={onToggle}
        >
          {t(off ? 'fineAfterAll' : 'notFine')}
        </button>
      </div>
      {off && (
        <div className="mt-2 grid gap-2.5">
          <Callout severity={stop ? 'stop' : 'take-care'} word={common(stop ? 'stop' : 'takeCare')}>
            <p>
              {t(`advice.${item}`, {
                from: pressure(filterPressureRise.from),
                latest: pressure(filterPressureRise.latest),
              })}
            </p>
          </Callout>
          {children}
          {acidSigns.includes(item) && (
            <PageLink href="/test" className={buttonClass({ variant: 'outline' })}>
              {t('testNow')}
            </PageLink>
          )}
          {item === 'water-level' && <BucketTest household={household} />}
          {forTechnician.includes(item) && <ProfessionalCall />}
          {item === 'lockers' && (
            <PageLink href={emergencyCard} className={buttonClass({ variant: 'terra' })}>
              {navigation('emergencyCard')}
            </PageLink>
          )}
        </div>
      )}
    </li>
  );
}
