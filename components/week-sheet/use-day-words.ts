'use client';

import { useTranslations } from 'next-intl';
import { capitalised } from './capitalised';
import { useSheet } from './sheet-context';
import type { SheetDay } from './sheet-times';
import { toDoOf, type ToDoItem } from './to-do-items';
import { useDoseWords } from './use-dose-words';
import { useStepWords } from './use-step-words';
import { useTimes } from './use-times';

/** A day in two short lines: what is to be done or was done, and when. */
export function useDayWords(day: SheetDay): { what: string; when: string } {
  const t = useTranslations('week');
  const { sheet, picture } = useSheet();
  const words = useDoseWords();
  const times = useTimes();
  const step = useStepWords();
  const items = toDoOf(day, sheet);
  if (items.length === 0) {
    const ends = picture.planEndsAt;
    if (day.to <= picture.now) return { what: t('lane.nothingDone'), when: '' };
    return ends === undefined || day.from >= ends
      ? { what: t('lane.noPlanShort'), when: t('lane.noPlanNext') }
      : { what: t('lane.nothingToAdd'), when: '' };
  }
  const whatOf = (item: ToDoItem) => {
    if (item.kind === 'dose') return words.amountAndProduct(item.dose);
    if (item.kind === 'step') return step(item.step) ?? t('situation.label');
    return t(`check.${item.kind === 'check' ? item.check.kind : item.reading.kind}`);
  };
  const whenOf = (item: ToDoItem) => {
    if (item.kind !== 'dose') return times.clock(item.at);
    return item.dose.status === 'skipped' ? words.skippedBy(item.dose) : times.clock(item.at);
  };
  const list = (parts: readonly string[]) => parts.join(t('listJoiner'));
  return { what: capitalised(list(items.map(whatOf))), when: list(items.map(whenOf)) };
}
