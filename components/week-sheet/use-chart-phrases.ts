'use client';

import { useTranslations } from 'next-intl';
import type { ChlorineLaneProps } from '@/components/charts/chlorine-lane';
import type { QuantityLaneProps } from '@/components/charts/quantity-lane';
import { type ChartRow, waterOf } from '@/components/charts/chart-rows';
import { chlorineRange, courseSummary } from '@/components/charts/course-summary';
import type { Reading } from '@/components/charts/lane-cursor';
import { isOn, type TimeAxis } from '@/components/charts/time-axis';
import { type CurveQuantity, waterAt, type WaterPoint } from '@/components/charts/water-curve';
import { wallTimeText } from '@/lib/calendar/format';
import { capitalised } from './capitalised';
import { useSheet } from './sheet-context';
import { instantOf } from './sheet-times';
import { useCourseWords } from './use-course-words';
import { useTimes } from './use-times';
import { useUnits } from './use-units';

const DAY = 86_400_000;

/** From now on where a curve is drawn ahead, else all of it: what is behind now is over. */
function stillToCome(points: readonly WaterPoint[], now: number, axis?: TimeAxis): WaterPoint[] {
  const shown = points.filter(({ at }) => axis === undefined || isOn(axis, at));
  const ahead = shown.filter(({ at }) => at >= now);
  return ahead.length > 0 ? ahead : shown;
}

/** What is written into the chlorine lane, and its sentence about the week or about the day of an axis. */
export function useChlorinePhrases(axis?: TimeAxis): Pick<ChlorineLaneProps, 'phrases' | 'label' | 'reading'> {
  const t = useTranslations('week.chart');
  const names = useTranslations('week.lane');
  const course = useCourseWords();
  const { sheet, picture } = useSheet();
  const times = useTimes();
  const units = useUnits();
  const testWords = useTestWords();
  const reading = useReading('freeChlorine', names('chlorine'));
  const { pool, household } = sheet;
  const { points, now, meeting } = picture;
  const water = waterAt(points, now);
  const shown = water ?? points.at(-1);
  const limit = units.number(pool.swimLimit);
  const swimHours = {
    from: wallTimeText(pool.swimHours.from, household.locale),
    to: wallTimeText(pool.swimHours.to, household.locale),
  };
  const lowest = units.figure(shown?.lowestLevel ?? 0, 'freeChlorine');
  const level = (value: number) => units.figure(value, 'freeChlorine');
  const summary = courseSummary(stillToCome(points, now, axis), 'freeChlorine', chlorineRange);
  const label =
    shown && summary
      ? t('chlorineLabel', {
          now: water ? level(water.freeChlorine.middle) : 'none',
          from: level(summary.start.value),
          low: level(shown.freeChlorine.low),
          high: level(shown.freeChlorine.high),
          moves: course.moves(summary, 'freeChlorine'),
          stays: course.stays(summary, 'freeChlorine', {
            low: lowest,
            high: limit,
            lowFigure: level,
            highFigure: (value) => units.number(value),
          }),
        })
      : t('chlorineEmpty', { limit });
  const which = meeting?.limit === 'swim-limit' ? 'meetsHigh' : 'meetsLow';
  return {
    label,
    reading,
    phrases: {
      limit: [
        pool.swimLimitSetBy === null ? t('limit', { limit }) : t('limitPerson', { limit, name: pool.swimLimitSetBy }),
        t('brackets', swimHours),
      ],
      limitShort: t('limitShort', { limit }),
      swimHoursShort: t('swimHoursShort', swimHours),
      lowest: t('lowest', { lowest }),
      lowestParts: [t('lowestShort', { lowest }), t('lowestWhy')],
      goodRange: t('goodRange'),
      likely: [t('likely1'), t('likely2')],
      now: water && { words: t('now', { time: times.clock(now) }), figure: level(water.freeChlorine.middle) },
      promised: t('promised'),
      planEnds: [t('planEnds1'), t('planEnds2')],
      meets: meeting && {
        at: meeting.at,
        value: meeting.value,
        words: [t(`${which}1`, { when: capitalised(times.partAt(meeting.at)) }), t(`${which}2`)],
      },
      tests: testWords,
    },
  };
}

/** Words beside each test in the chlorine lane: its method and what it read. */
function useTestWords(): Record<string, string[]> {
  const t = useTranslations('week');
  const { sheet } = useSheet();
  const units = useUnits();
  const words = sheet.readings.flatMap(({ id, method, values: { freeChlorine } }): [string, string[]][] => {
    if (freeChlorine === undefined) return [];
    const name = capitalised(t(`method.${method}`));
    if (typeof freeChlorine === 'number' || freeChlorine.low === freeChlorine.high) {
      const value = typeof freeChlorine === 'number' ? freeChlorine : freeChlorine.low;
      return [[id, [t('chart.testDot', { method: name, value: units.figure(value, 'freeChlorine') })]]];
    }
    const between = { low: units.number(freeChlorine.low), high: units.number(freeChlorine.high) };
    return [[id, [t('chart.testBetween1', { method: name }), t('chart.testBetween2', between)]]];
  });
  return Object.fromEntries(words);
}

/** What is said of the hour that is read: its part of the day, and the clock that the table has too. */
function useReading(quantity: CurveQuantity, name: string): Reading<ChartRow> {
  const t = useTranslations('week.chart');
  const times = useTimes();
  const units = useUnits();
  return {
    name: t('readName', { name }),
    level: (row) => waterOf(row)?.[quantity].middle,
    words: (row) => {
      const likely = waterOf(row)?.[quantity];
      if (likely === undefined) return '';
      return t(row.behind ? 'readoutBehind' : 'readout', {
        when: capitalised(times.partAt(row.at)),
        time: times.clock(row.at),
        value: units.quantity(likely.middle, quantity),
        low: units.figure(likely.low, quantity),
        high: units.figure(likely.high, quantity),
      });
    },
  };
}

/** What is written into the lane of pH or stabilizer, and its sentence. */
export function useQuantityPhrases(
  quantity: 'pH' | 'cyanuricAcid',
  keep: readonly [number, number],
): Pick<QuantityLaneProps, 'phrases' | 'label' | 'reading'> {
  const t = useTranslations('week');
  const { sheet, picture } = useSheet();
  const times = useTimes();
  const units = useUnits();
  const name = t(quantity === 'pH' ? 'lane.pH' : 'lane.stabilizer');
  const level = (value: number) => units.figure(value, quantity);
  const range = { low: level(keep[0]), high: level(keep[1]) };
  const reading = useReading(quantity, name);
  const course = useCourseWords();
  const [first, last] = [picture.points[0], picture.points.at(-1)];
  if (first === undefined || last === undefined)
    return {
      label: t('chart.quantityEmpty', { name, ...range }),
      reading,
      phrases: { now: undefined, end: undefined, tests: {} },
    };
  const [from, to] = [first[quantity].middle, last[quantity].middle];
  const summary = courseSummary(stillToCome(picture.points, picture.now), quantity, () => keep);
  // What was promised before now may have been set right by a test: the rate is that of what is ahead.
  const since = waterAt(picture.points, picture.now) ?? first;
  const perDay = last.at > since.at ? ((to - since[quantity].middle) / (last.at - since.at)) * DAY : 0;
  const end = { value: level(to), day: times.weekday(last.at - 1) };
  const water = waterAt(picture.points, picture.now);
  const isStabilizer = quantity === 'cyanuricAcid';
  const rising = isStabilizer && Math.abs(perDay) >= 0.05;
  const rate = units.signed(perDay, 1);
  const tests = sheet.readings.flatMap(({ id, values }): [string, string][] => {
    const value = values[quantity];
    return typeof value === 'number' ? [[id, level(value)]] : [];
  });
  return {
    label: t('chart.quantityLabel', {
      name,
      from: level(from),
      to: level(to),
      stays: summary ? course.stays(summary, 'other', { ...range, lowFigure: level, highFigure: level }) : '',
    }),
    reading,
    phrases: {
      now: water && isStabilizer ? t('chart.valueNow', { value: level(water[quantity].middle) }) : undefined,
      end:
        last.at > instantOf(sheet.now)
          ? rising
            ? t('chart.endRate', { ...end, rate })
            : t('chart.endOn', end)
          : undefined,
      tests: Object.fromEntries(tests),
    },
  };
}
