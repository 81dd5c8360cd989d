'use client';

import { useTranslations } from 'next-intl';
import { hourRows } from '@/components/charts/hours-table';
import type { CurveQuantity } from '@/components/charts/water-curve';
import { capitalised } from './capitalised';
import { Table } from '@/components/ui/table';
import { useSheet } from './sheet-context';
import { instantOf } from './sheet-times';
import { useTimes } from './use-times';
import { useUnits } from './use-units';

/** A curve hour by hour, and under it what was measured. */
export function HoursTable({ quantity, name }: { quantity: CurveQuantity; name: string }) {
  const t = useTranslations('week.table');
  const { sheet, picture } = useSheet();
  const times = useTimes();
  const units = useUnits();
  const hours = new Set([...(sheet.behind?.hours ?? []), ...(sheet.ahead?.hours ?? [])].map(instantOf));
  const rows = hourRows(picture.points, quantity, picture.now, hours);
  const [first, last] = [rows[0], rows.at(-1)];
  if (first === undefined || last === undefined) return <p className="text-small">{t('empty')}</p>;
  const level = (value: number) => units.figure(value, quantity);
  const limitColumns = quantity === 'freeChlorine' ? [t('lowest'), t('limit')] : [];
  return (
    <>
      <Table
        caption={t('caption', { name: capitalised(name), from: times.heading(first.at), to: times.heading(last.at) })}
        columns={[t('hour'), t('side'), t('low'), t('middle'), t('high'), ...limitColumns]}
        rows={rows.map(({ at, side, likely, lowestLevel, swimLimit }) => ({
          key: at,
          cells: [
            t('dayAndHour', { day: times.heading(at), time: times.clock(at) }),
            t(side),
            level(likely.low),
            level(likely.middle),
            level(likely.high),
            ...(quantity === 'freeChlorine' ? [level(lowestLevel), units.number(swimLimit)] : []),
          ],
        }))}
      />
      <Measured quantity={quantity} />
    </>
  );
}

function Measured({ quantity }: { quantity: CurveQuantity }) {
  const t = useTranslations('week');
  const { sheet } = useSheet();
  const times = useTimes();
  const units = useUnits();
  const measured = sheet.readings.flatMap(({ id, takenAt, method, values }) => {
    const value = values[quantity];
    if (value === undefined) return [];
    const words =
      typeof value === 'number'
        ? units.figure(value, quantity)
        : t('table.between', { low: units.number(value.low), high: units.number(value.high) });
    const at = instantOf(takenAt);
    const when = { day: times.heading(at), time: times.clock(at) };
    return [{ id, words: t('table.measuredAt', { ...when, value: words, method: t(`method.${method}`) }) }];
  });
  if (measured.length === 0) return null;
  return (
    <div className="mt-2 text-small">
      <p className="font-strong">{t('table.measured')}</p>
      <ul>
        {measured.map(({ id, words }) => (
          <li key={id}>{words}</li>
        ))}
      </ul>
    </div>
  );
}
