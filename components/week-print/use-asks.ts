import { useTranslations } from 'next-intl';
import { capitalised } from '@/components/week-sheet/capitalised';
import { useSheet } from '@/components/week-sheet/sheet-context';
import { toDoOf } from '@/components/week-sheet/to-do-items';
import { usePaper } from './paper-context';

/** "Four doses, two quick checks, one full test.": what of this week is still to be done. */
export function useAsks(): string {
  const t = useTranslations('week-print.asks');
  const week = useTranslations('week');
  const { sheet, picture } = useSheet();
  const { state, mayAdd } = usePaper();
  if ('bar' in state && state.bar === 'past') return t('past');
  if (!mayAdd) return t('barred');
  const items = picture.days.flatMap((day) => toDoOf(day, sheet));
  const counts = {
    doses: items.filter((item) => item.kind === 'dose' && item.dose.status === 'planned').length,
    quick: items.filter((item) => item.kind === 'check' && item.check.kind === 'quick').length,
    full: items.filter((item) => item.kind === 'check' && item.check.kind === 'full').length,
    steps: items.filter((item) => item.kind === 'step' && item.step.doneAt === null).length,
  };
  const asked = (['doses', 'quick', 'full', 'steps'] as const).filter((kind) => counts[kind] > 0);
  if (asked.length === 0) return t('nothing');
  const list = asked.map((kind) => t(kind, { count: counts[kind] })).join(week('listJoiner'));
  return t('sentence', { list: capitalised(list) });
}
