'use client';

import { useTranslations } from 'next-intl';
import { Disclosure } from '@/components/ui/disclosure';
import { Table } from '@/components/ui/table';
import type { OpenSituation } from '@/lib/schemas/situation';
import { type TreatmentChart, pointsOf } from './treatment-picture';
import { useSituationFigures } from './use-situation-figures';
import { instantOf, useSituationTimes } from './use-situation-times';

type Props = { open: OpenSituation; chart: TreatmentChart; now: number; until: number };

/** What the chart shows, in figures: the readings against their band, then every hour up to the last day of the steps. */
export function TreatmentTables({ open, chart, now, until }: Props) {
  const t = useTranslations('situations.chart');
  const mornings = useTranslations('situations.mornings');
  const units = useSituationFigures();
  const times = useSituationTimes(now);
  const level = (value: number) => units.figure(value, 'freeChlorine');
  const whenOf = (at: number) => `${times.heading(times.dayOf(at))}, ${times.clock(at)}`;
  const bandOf = (iso: string) => open.procedure.mornings.find(({ takenAt }) => takenAt === iso);
  const points = pointsOf(chart).filter(({ at }) => at < until);
  const [first, last] = [points[0], points.at(-1)];
  const doseIn = (at: number, next: number) =>
    chart.doses.find((dose) => instantOf(dose.at) >= at && instantOf(dose.at) < next);
  const againstBand = (value: number, low: number, high: number) => {
    if (value < low) return mornings('below', { value: level(low - value) });
    return value > high ? mornings('above', { value: level(value - high) }) : mornings('inside');
  };
  return (
    <Disclosure summary={<span className="text-small">{t('seeHours')}</span>}>
      {chart.readings.length > 0 && (
        <Table
          caption={t('captionReadings')}
          columns={[t('hour'), t('reading'), t('ordinaryColumn'), t('judged')]}
          rows={chart.readings.map(({ takenAt, freeChlorine }) => {
            const band = bandOf(takenAt);
            const known = band !== undefined && band.low !== null && band.high !== null;
            return {
              key: takenAt,
              cells: [
                whenOf(instantOf(takenAt)),
                level(freeChlorine),
                known ? t('between', { low: level(band.low ?? 0), high: level(band.high ?? 0) }) : mornings('noBand'),
                known ? againstBand(freeChlorine, band.low ?? 0, band.high ?? 0) : '',
              ],
            };
          })}
        />
      )}
      {first && last && (
        <Table
          caption={t('captionHours', { from: whenOf(first.at), to: whenOf(last.at) })}
          columns={[t('hour'), t('low'), t('middle'), t('high'), t('dose')]}
          rows={points.map(({ at, low, middle, high }, index) => {
            const dose = doseIn(at, points[index + 1]?.at ?? at);
            return {
              key: at,
              cells: [
                whenOf(at),
                level(low),
                level(middle),
                level(high),
                dose ? t(dose.given ? 'doseGiven' : 'dosePlanned') : '',
              ],
            };
          })}
        />
      )}
    </Disclosure>
  );
}
