'use client';

import { useTranslations } from 'next-intl';
import { Table } from '@/components/ui/table';
import { type Extreme, highAndLowOf } from './high-and-low';
import { useSheet } from './sheet-context';
import { useTimes } from './use-times';
import { useUnits } from './use-units';

/** Sun, rain, swimmers, high and low water of each day. */
export function DaysTable() {
  const t = useTranslations('week');
  const { sheet, picture } = useSheet();
  const times = useTimes();
  const units = useUnits();
  const extremeWords = ({ value, part }: Extreme) =>
    t('figureAt', { figure: units.figure(value, 'freeChlorine'), part: times.partName(part) });
  return (
    <Table
      caption={t('table.captionDays')}
      columns={[
        t('table.day'),
        t('table.sun'),
        t('table.rain'),
        t('table.swimmers'),
        t('table.dayHigh'),
        t('table.dayLow'),
      ]}
      rows={picture.days.map((day) => {
        const extremes = highAndLowOf(day, picture.points, sheet.household.timeZone);
        return {
          key: day.day,
          cells: [
            times.heading(day.from),
            units.number(
              day.sun.reduce((sum, share) => sum + share, 0),
              1,
            ),
            units.rain(day.rain),
            units.number(day.swimmerHours),
            extremes ? extremeWords(extremes.high) : t('lane.noHighLow'),
            extremes ? extremeWords(extremes.low) : t('lane.noHighLow'),
          ],
        };
      })}
    />
  );
}
