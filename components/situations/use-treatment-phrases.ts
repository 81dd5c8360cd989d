'use client';

import { useTranslations } from 'next-intl';
import type { TimeAxis } from '@/components/charts/time-axis';
import type { TreatmentLaneProps } from '@/components/charts/treatment-lane';
import { capitalised } from '@/components/week-sheet/capitalised';
import type { TreatmentChart, TreatmentPicture } from './treatment-picture';
import { useSituationFigures } from './use-situation-figures';
import { useSituationTimes } from './use-situation-times';

/** What is written into the chart of a treatment, and its sentence. */
export function useTreatmentPhrases(
  { maximum, swimLimit, lowestLevel }: TreatmentChart,
  { bars, readings }: TreatmentPicture,
  axis: TimeAxis,
  now: number,
): Pick<TreatmentLaneProps, 'phrases' | 'label' | 'reading'> {
  const t = useTranslations('situations.chart');
  const units = useSituationFigures();
  const times = useSituationTimes(now);
  const level = (value: number) => units.figure(value, 'freeChlorine');
  const [first] = bars;
  const read = readings.map(({ value }) => level(value));
  const judged = readings.filter(({ inside }) => inside !== null);
  return {
    label: t('label', {
      from: times.longDay(times.dayOf(axis.from)),
      to: times.longDay(times.dayOf(axis.to - 1)),
      maximum: units.number(maximum),
      read: read.length,
      readings: read.join(', '),
      judged: judged.length,
      inside: judged.filter(({ inside }) => inside).length,
    }),
    reading: {
      name: t('readName'),
      level: ({ ahead, behind }) => (ahead ?? behind)?.middle,
      words: ({ at, ahead, behind }) => {
        const point = ahead ?? behind;
        if (point === undefined) return '';
        return t('readout', {
          when: capitalised(times.partAt(at)),
          time: times.clock(at),
          value: units.quantity(point.middle, 'freeChlorine'),
          low: level(point.low),
          high: level(point.high),
        });
      },
    },
    phrases: {
      maximum: [t('maximum', { maximum: units.number(maximum) }), t('maximumWhy')],
      limit: t('limit', { limit: units.number(swimLimit) }),
      lowest: t('lowest', { lowest: units.number(lowestLevel) }),
      goodRange: t('goodRange'),
      now: t('now', { time: times.clock(now) }),
      ordinary: first && [t('ordinary'), t('between', { low: level(first.low), high: level(first.high) })],
      readings: read,
    },
  };
}
