'use client';

import { useTranslations } from 'next-intl';
import type { ChlorineLaneProps } from '@/components/charts/chlorine-lane';
import type { QuantityLaneProps } from '@/components/charts/quantity-lane';
import type { ChartRow } from '@/components/charts/chart-rows';
import { type CurveQuantity, waterAt } from '@/components/charts/water-curve';
import { wallTimeText } from '@/lib/calendar/format';
import { capitalised } from './capitalised';
import { useSheet } from './sheet-context';
import { instantOf } from './sheet-times';
import { useTimes } from './use-times';
import { useUnits } from './use-units';

const DAY = 86_400_000;

/** What is written into the chlorine lane, and its sentence. */
export function useChlorinePhrases(): Pick<ChlorineLaneProps, 'phrases' | 'label' | 'readout'> {
  const t = useTranslations('week.chart');
  const { sheet, picture } = useSheet();
  const times = useTimes();
  const units = useUnits();
  const testWords = useTestWords();
  const readout = useReadout('freeChlorine');
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
  const label = shown
    ? t('chlorineLabel', {
        now: water ? level(water.freeChlorine.middle) : 'none',
        low: level(shown.freeChlorine.low),
        high: level(shown.freeChlorine.high),
        lowest,
        limit,
      })
    : t('chlorineEmpty', { limit });
  const which = meeting?.limit === 'swim-limit' ? 'meetsHigh' : 'meetsLow';
  return {
    label,
    readout,
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

/** What is said of one hour under the pointer; ahead it is a part of a day, never minutes. */
function useReadout(quantity: CurveQuantity): (row: ChartRow) => string {
  const t = useTranslations('week.chart');
  const times = useTimes();
  const units = useUnits();
  return ({ at, behind, ahead }) => {
    const likely = (behind ?? ahead)?.[quantity];
    if (likely === undefined) return '';
    const level = (value: number) => units.figure(value, quantity);
    return t(behind ? 'readoutBehind' : 'readout', {
      when: capitalised(times.partAt(at)),
      value: level(likely.middle),
      low: level(likely.low),
      high: level(likely.high),
    });
  };
}

/** What is written into the lane of pH or stabilizer, and its sentence. */
export function useQuantityPhrases(
  quantity: 'pH' | 'cyanuricAcid',
  keep: readonly [number, number],
): Pick<QuantityLaneProps, 'phrases' | 'label' | 'readout'> {
  const t = useTranslations('week');
  const { sheet, picture } = useSheet();
  const times = useTimes();
  const units = useUnits();
  const name = t(quantity === 'pH' ? 'lane.pH' : 'lane.stabilizer');
  const level = (value: number) => units.figure(value, quantity);
  const range = { low: level(keep[0]), high: level(keep[1]) };
  const readout = useReadout(quantity);
  const [first, last] = [picture.points[0], picture.points.at(-1)];
  if (first === undefined || last === undefined)
    return {
      label: t('chart.quantityEmpty', { name, ...range }),
      readout,
      phrases: { now: undefined, end: undefined, tests: {} },
    };
  const [from, to] = [first[quantity].middle, last[quantity].middle];
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
    label: t('chart.quantityLabel', { name, from: level(from), to: level(to), ...range }),
    readout,
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
