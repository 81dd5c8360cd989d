import { useTranslations } from 'next-intl';
import type { FigureTable } from '@/components/ui/picture-or-table';
import type { LearntRow } from '@/lib/schemas/learnt';
import { formatNumber } from '@/lib/units/format';
import { usePoolSetting } from '../setting';
import { useFigures } from './use-figures';
import type { useLearntWords } from './use-learnt-words';

/** The same figures as the bars, row by row. */
export function useLearntTable(words: ReturnType<typeof useLearntWords>): (rows: readonly LearntRow[]) => FigureTable {
  const t = useTranslations('learnt.table');
  const { locale } = usePoolSetting();
  return (rows) => ({
    columns: [t('thing'), t('before'), t('learnt'), t('tests')],
    rows: rows.map((row) => [
      `${words.name(row.thing)}: ${words.note(row.thing)}`,
      <Range key="before" row={row} of="before" />,
      <Range key="learnt" row={row} of="learnt" />,
      formatNumber(row.readings, { decimals: 0, locale }),
    ]),
  });
}

function Range({ row, of }: { row: LearntRow; of: 'before' | 'learnt' }) {
  const t = useTranslations('learnt');
  const { figure, withUnit } = useFigures(row);
  const { p10, p90 } = row[of];
  return <>{withUnit(t('range', { low: figure(p10), high: figure(p90) }))}</>;
}
