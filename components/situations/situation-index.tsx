'use client';

import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { classNames } from '@/components/ui/class-names';
import { daysBetween, dayOf } from '@/lib/calendar/household-day';
import type { SituationKind, Situations } from '@/lib/schemas/situation';
import { groups } from './groups';
import { useHousehold } from './situation-context';
import { instantOf } from './use-situation-times';

type Props = { situations: Situations | undefined; current: SituationKind | undefined };

/** All situations, grouped by when they have to be seen to. The open one is on ink. */
export function SituationIndex({ situations, current }: Props) {
  const t = useTranslations('situations');
  const open = situations?.open ?? null;
  return (
    <nav aria-label={t('index')}>
      {groups.map(({ name, kinds }) => (
        <section key={name} aria-label={t(`group.${name}`)} className="mt-5 first:mt-3">
          <h2 className="mb-1.5 font-display text-name text-ink-2">{t(`group.${name}`)}</h2>
          <ul>
            {kinds.map((kind) => (
              <li key={kind}>
                <IndexRow
                  kind={kind}
                  current={kind === current}
                  openDay={open?.situation.kind === kind ? <OpenDay situations={situations} /> : null}
                />
              </li>
            ))}
          </ul>
        </section>
      ))}
      <p className="mt-5 border-t border-ink pt-3 text-small text-ink-2">{t('onlyOne')}</p>
    </nav>
  );
}

function OpenDay({ situations }: { situations: Situations | undefined }) {
  const t = useTranslations('situations');
  const { timeZone } = useHousehold();
  if (!situations?.open) return null;
  const [from, to] = [situations.open.openedAt, situations.now].map((iso) => dayOf(instantOf(iso), timeZone));
  return t('mark.open', { day: daysBetween(from!, to!) + 1 });
}

type RowProps = { kind: SituationKind; current: boolean; openDay: React.ReactNode };

function IndexRow({ kind, current, openDay }: RowProps) {
  const t = useTranslations('situations');
  const isOpen = openDay !== null;
  return (
    <PageLink
      href={`/situations/${kind}`}
      aria-current={current ? 'page' : undefined}
      className={classNames(
        '-mx-margin grid min-h-[66px] grid-cols-[1fr_auto] items-center gap-2.5 border-t px-margin py-2 md:-mr-3 md:min-h-14 md:pr-3',
        isOpen ? 'border-transparent bg-ink text-on-ink' : 'border-rule',
        current && !isOpen && 'bg-paper-lift',
      )}
    >
      <span className="min-w-0">
        <b className="block text-field font-emphasis">{t(`kind.${kind}.name`)}</b>
        <span className={classNames('block text-small', !isOpen && 'text-ink-2')}>{t(`kind.${kind}.hint`)}</span>
      </span>
      <span className={classNames('text-small', !isOpen && 'text-ink-2')}>{openDay ?? t(`kind.${kind}.lasts`)}</span>
    </PageLink>
  );
}
