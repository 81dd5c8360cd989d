'use client';

import { useTranslations } from 'next-intl';
import type { CourseSummary } from '@/components/charts/course-summary';
import type { CurveQuantity } from '@/components/charts/water-curve';
import { useSheet } from './sheet-context';
import { useTimes } from './use-times';
import { useUnits } from './use-units';

/** How a curve runs, in words: how far down and up it goes and when, and whether it stays where it belongs. */
export function useCourseWords() {
  const t = useTranslations('week.course');
  const { now } = useSheet().picture;
  const times = useTimes();
  const units = useUnits();

  return {
    /** "down to 2.5 by Thursday morning and up to 3.4 by Friday evening", in the order of time; "staying near 3.0". */
    moves: ({ start, lowest, highest }: CourseSummary, quantity: CurveQuantity): string => {
      const level = (value: number) => units.figure(value, quantity);
      const ends = [
        { to: lowest, words: 'down' as const },
        { to: highest, words: 'up' as const },
      ]
        .filter(({ to }) => level(to.value) !== level(start.value))
        .sort((one, other) => one.to.at - other.to.at)
        .map(({ to, words }) => t(words, { value: level(to.value), when: times.partAt(to.at) }));
      return ends.length === 0 ? t('level', { value: level(start.value) }) : ends.join(t('then'));
    },
    /** Where a curve leaves its range: `low` and `high` are the ends that hold while it does not. */
    stays: (
      { start, below, above }: CourseSummary,
      quantity: 'freeChlorine' | 'other',
      ends: { low: string; high: string; lowFigure: (value: number) => string; highFigure: (value: number) => string },
    ): string => {
      const state = (moment: typeof below) => {
        if (moment === undefined) return 'never';
        if (moment.at > start.at) return moment.at > now ? 'later' : 'earlier';
        return start.at > now ? 'later' : start.at < now ? 'earlier' : 'already';
      };
      const of = (moment: typeof below, end: string, figure: (value: number) => string) => ({
        state: state(moment),
        level: moment ? figure(moment.value) : end,
        when: moment ? times.partAt(moment.at) : '',
      });
      const low = of(below, ends.low, ends.lowFigure);
      const high = of(above, ends.high, ends.highFigure);
      if (quantity === 'other' && below === undefined && above === undefined)
        return t('within', { low: ends.low, high: ends.high });
      const sides =
        quantity === 'freeChlorine'
          ? [t('lowestLevel', low), t('swimLimit', high)]
          : [below && t('under', low), above && t('over', high)];
      return sides.filter((words) => words !== undefined).join(t('listJoiner'));
    },
  };
}
