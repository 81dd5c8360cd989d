import { useFormatter, useTranslations } from 'next-intl';
import { dayRange, longDay } from '@/lib/calendar/format';
import type { DutyMember, HandOver, HandOvers } from '@/lib/schemas/hand-over';
import type { HouseholdSetting } from './household-setting';

/** Who looks after the pool, in words. */
export function useDutyWords({ locale }: HouseholdSetting) {
  const t = useTranslations('household.duty');
  const format = useFormatter();
  const listed = (members: readonly DutyMember[]) => format.list(members.map(({ name }) => name));
  const whoOf = ({ you, name }: HandOver) => ({ who: you ? 'you' : 'other', name });
  const daysOf = ({ fromDay, untilDay }: Pick<HandOver, 'fromDay' | 'untilDay'>) =>
    dayRange(fromDay, untilDay, locale, t('joiner'));
  return {
    daysOf,
    whoOf,
    longDay: (day: string) => longDay(day, locale),
    /** 'Odile, with the help of Bram': owners first, others as help. */
    names: (members: readonly DutyMember[]) => {
      const owners = members.filter(({ role }) => role === 'owner');
      const helpers = members.filter(({ role }) => role !== 'owner');
      if (owners.length === 0 || helpers.length === 0) return listed(members);
      return t('helped', { names: listed(owners), helpers: listed(helpers) });
    },
    /** What the page says first of all, while somebody stands in or is going to. */
    head: (duty: HandOvers | undefined): { headline: string; lead: string } | null => {
      const next = duty?.handOvers.find(({ agreedAt }) => agreedAt !== null);
      if (next === undefined) return null;
      const { fromDay, untilDay, inForce } = next;
      const count = fromDay === untilDay ? 1 : 2;
      return {
        headline: t('headline', { ...whoOf(next), days: daysOf(next), count }),
        lead: inForce
          ? t('leadNow', { ...whoOf(next), until: longDay(untilDay, locale) })
          : t('leadComing', { ...whoOf(next), from: longDay(fromDay, locale) }),
      };
    },
  };
}
