import { useTranslations } from 'next-intl';
import { waterAt } from '@/components/charts/water-curve';
import { useSheet } from '@/components/week-sheet/sheet-context';
import { useUnits } from '@/components/week-sheet/use-units';
import { alkalinityAim } from '@/lib/standards/companions';
import { limits } from '@/lib/standards/limits';
import { surfaceRanges } from '@/lib/standards/surface-ranges';
import { lastRead, type LastRead } from './last-read';

export type PaperRow = { name: string; last: string; keep: string };

const decimals = {
  freeChlorine: 'freeChlorine',
  totalChlorine: 'freeChlorine',
  pH: 'pH',
  totalAlkalinity: 'totalAlkalinity',
  cyanuricAcid: 'cyanuricAcid',
  calciumHardness: 'calciumHardness',
  temperature: 'temperature',
} as const;

/** A row for each value of a full test, in the order of the page: what was read last and where it is kept. */
export function useReadingRows(): PaperRow[] {
  const t = useTranslations('week-print.readings');
  const { sheet, picture } = useSheet();
  const units = useUnits();
  const { pool } = sheet;
  const read = lastRead([...(sheet.lastReading ? [sheet.lastReading] : []), ...sheet.readings]);
  const lowest = (waterAt(picture.points, picture.now) ?? picture.points.at(-1))?.lowestLevel;
  const range = (quantity: keyof LastRead, [low, high]: readonly [number, number]) =>
    t('range', { low: units.figure(low, decimals[quantity]), high: units.figure(high, decimals[quantity]) });
  const limit = units.number(pool.swimLimit);
  const free =
    lowest === undefined
      ? t('upTo', { high: limit })
      : t('range', { low: units.figure(lowest, 'freeChlorine'), high: limit });
  const tabletsLead = sheet.doses.some(({ form, status }) => form === 'tablet' && status !== 'skipped');
  const alkalinity = (tabletsLead ? alkalinityAim.tablets : alkalinityAim.fast).value;
  const keep: Record<keyof LastRead, string> = {
    freeChlorine: free,
    totalChlorine: t('freeAnd', { more: units.number(limits.combinedChlorineAct.value) }),
    pH: range('pH', [limits.pHRangeLow.value, limits.pHRangeHigh.value]),
    totalAlkalinity: range('totalAlkalinity', alkalinity),
    cyanuricAcid: range('cyanuricAcid', pool.stabilizerBand),
    calciumHardness: range('calciumHardness', surfaceRanges[pool.surface].calciumHardness),
    temperature: '',
  };
  const order = [
    'freeChlorine',
    'totalChlorine',
    'pH',
    'totalAlkalinity',
    'cyanuricAcid',
    'calciumHardness',
    'temperature',
  ] as const;
  return order.map((quantity) => {
    const value = read[quantity];
    const figure = (level: number) => units.figure(level, decimals[quantity]);
    return {
      name: t(`name.${quantity}`, { unit: units.unitOf('temperature') }),
      last:
        value === undefined
          ? ''
          : value.low === value.high
            ? figure(value.low)
            : t('range', { low: figure(value.low), high: figure(value.high) }),
      keep: keep[quantity],
    };
  });
}
