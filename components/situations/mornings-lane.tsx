'use client';

import { Check, CircleDashed, type LucideIcon, X } from 'lucide-react';
import { useTranslations } from 'next-intl';
import type { Morning, OpenSituation } from '@/lib/schemas/situation';
import { LaneGrid } from './lane-grid';
import type { StepDay } from './step-days';
import { useHousehold } from './situation-context';
import { useSituationFigures } from './use-situation-figures';
import { instantOf } from './use-situation-times';
import { dayOf } from '@/lib/calendar/household-day';

/** Each morning after a treatment evening: whether the drain was plain to see, and where the reading lay. */
export function MorningsLane({ open, days }: { open: OpenSituation; days: readonly StepDay[] }) {
  const t = useTranslations('situations.mornings');
  const { timeZone } = useHousehold();
  const { mornings } = open.procedure;
  if (mornings.length === 0) return null;
  const openedOn = dayOf(instantOf(open.openedAt), timeZone);
  const withDrain = open.situation.kind === 'clearing';
  return (
    <section aria-label={t('label')} className="border-t border-rule-2 text-small">
      <LaneGrid days={days} name={<h2 className="pt-2 font-display text-name">{t('label')}</h2>}>
        {({ day }) => <MorningName morning={mornings.find((each) => each.day === day)} first={day === openedOn} />}
      </LaneGrid>
      {withDrain && (
        <LaneGrid
          days={days}
          name={<p className="py-1 text-fine text-ink-2">{t('drain')}</p>}
          className="border-t border-rule"
        >
          {({ day }) => <DrainMark morning={mornings.find((each) => each.day === day)} />}
        </LaneGrid>
      )}
      <LaneGrid
        days={days}
        name={<p className="py-1 text-fine text-ink-2">{t('band')}</p>}
        className="border-t border-rule"
      >
        {({ day }) => <BandMark morning={mornings.find((each) => each.day === day)} />}
      </LaneGrid>
    </section>
  );
}

type MorningProps = { morning: Morning | undefined };

function MorningName({ morning, first }: MorningProps & { first: boolean }) {
  const t = useTranslations('situations.mornings');
  const name = (words: string, bold = false) => (
    <p className={`px-2.25 pt-2 pb-1 font-display text-name ${bold ? 'font-headline' : ''}`}>{words}</p>
  );
  if (morning === undefined) return first ? name(t('before')) : null;
  const { takenAt, inARow } = morning;
  if (takenAt === null) return name(t(inARow >= 2 ? 'aheadSecond' : 'ahead'), inARow >= 2);
  if (inARow === 0) return name(t('notYet'));
  return name(t(inARow === 1 ? 'first' : 'second'), true);
}

function DrainMark({ morning }: MorningProps) {
  const t = useTranslations('situations.mornings');
  if (morning === undefined) return null;
  const { takenAt, drainSeen } = morning;
  if (takenAt === null) return <Mark Icon={CircleDashed} words={t('inTheMorning')} />;
  if (drainSeen === null) return <Mark Icon={CircleDashed} words={t('notSaid')} />;
  return <Mark Icon={drainSeen ? Check : X} words={t(drainSeen ? 'yes' : 'no')} bold={drainSeen} />;
}

function BandMark({ morning }: MorningProps) {
  const t = useTranslations('situations.mornings');
  const units = useSituationFigures();
  if (morning === undefined) return null;
  const { takenAt, freeChlorine, low, high, inside } = morning;
  if (takenAt === null || freeChlorine === null) return <Mark Icon={CircleDashed} words={t('inTheMorning')} />;
  if (low === null || high === null) return <Mark Icon={CircleDashed} words={t('noBand')} />;
  const by = (distance: number) => units.figure(distance, 'freeChlorine');
  if (freeChlorine < low) return <Mark Icon={X} words={t('below', { value: by(low - freeChlorine) })} />;
  const words = freeChlorine > high ? t('above', { value: by(freeChlorine - high) }) : t('inside');
  return <Mark Icon={inside === false ? X : Check} words={words} bold={inside !== false} />;
}

function Mark({ Icon, words, bold = false }: { Icon: LucideIcon; words: string; bold?: boolean }) {
  return (
    <p className={`flex items-center gap-1.5 px-2.25 py-1 ${bold ? 'font-emphasis' : ''}`}>
      <Icon aria-hidden="true" className={`size-4 shrink-0 ${bold ? '[stroke-width:2.6]' : 'text-ink-2'}`} />
      {words}
    </p>
  );
}
