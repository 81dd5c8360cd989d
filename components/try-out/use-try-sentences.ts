'use client';

import { useFormatter, useTranslations } from 'next-intl';
import { capitalised } from '@/components/week-sheet/capitalised';
import { useSheet } from '@/components/week-sheet/sheet-context';
import { useTimes } from '@/components/week-sheet/use-times';
import { useUnits } from '@/components/week-sheet/use-units';
import type { TryOutFact } from '@/lib/client/try-it/facts';
import type { Advice, ChangedDose } from '@/lib/client/try-it/messages';
import type { TryOutChanges } from '@/lib/schemas/try-out';
import { limits } from '@/lib/standards/limits';
import { useChangeWords } from './use-change-words';

/** What is said of a tried week: what becomes of the water, then what a plan would make of it. */
export function useTrySentences() {
  const t = useTranslations('try-out');
  const { sheet } = useSheet();
  const changeWords = useChangeWords();
  const clause = useFactWords();
  const adviceWords = useAdviceWords();
  const units = useUnits();
  return (changes: TryOutChanges, facts: readonly TryOutFact[], advice: Advice | undefined): string[] => {
    const [first, ...others] = facts.map(clause);
    const most = sheet.pool.volume / limits.waterPerSwimmerHour.value;
    const load = changes.swimmers.some(({ swimmerHours }) => swimmerHours > most);
    return [
      ...(first === undefined ? [] : [t('with', { changes: changeWords(changes), clause: first })]),
      ...others.map(capitalised),
      ...(load ? [t('load', { most: units.number(Math.floor(most)) })] : []),
      ...(advice ? adviceWords(advice, facts) : []),
    ];
  };
}

function useFactWords(): (fact: TryOutFact) => string {
  const t = useTranslations('try-out.fact');
  const times = useTimes();
  const units = useUnits();
  const pH = {
    pHLow: units.figure(limits.pHRangeLow.value, 'pH'),
    pHHigh: units.figure(limits.pHRangeHigh.value, 'pH'),
  };
  return (fact) => {
    switch (fact.code) {
      case 'meets':
      case 'still-meets':
        return t(`${fact.code}.${fact.limit}`, { when: times.partAt(fact.at), ...pH });
      case 'meets-earlier':
      case 'meets-later':
        return t(`${fact.code}.${fact.limit}`, {
          when: times.partAt(fact.at),
          planned: times.partAt(fact.planAt),
          ...pH,
        });
      case 'no-longer-meets':
        return t(`${fact.code}.${fact.limit}`, { planned: times.partAt(fact.planAt), ...pH });
      case 'hours-closed':
      case 'hours-opened':
        return t(fact.code, { hours: fact.hours });
      case 'moves':
        return t('moves', {
          by: units.quantity(Math.abs(fact.by), 'freeChlorine'),
          side: fact.by < 0 ? 'lower' : 'higher',
          when: times.partAt(fact.at),
        });
      case 'hardly-moves':
        return t('hardly-moves');
    }
  };
}

function useAdviceWords(): (advice: Advice, facts: readonly TryOutFact[]) => string[] {
  const t = useTranslations('try-out.advice');
  const doses = useTranslations('doses');
  const format = useFormatter();
  const times = useTimes();
  const { amount } = useUnits();
  const dose = ({ substance, form, unit }: ChangedDose, value: number) =>
    doses('amountAndProduct', {
      unit,
      amount: amount(value, unit),
      product: doses(`product.${substance}`, { form, count: value }),
    });
  const parts = (changed: ChangedDose) => {
    const { at, before, after, unit } = changed;
    return {
      day: times.dayInWords(at),
      dose: dose(changed, after ?? before ?? 0),
      before: before === null ? '' : amount(before, unit),
    };
  };
  const item = (changed: ChangedDose) =>
    t(changed.after === null ? 'dropped' : changed.before === null ? 'added' : 'instead', parts(changed));
  return (advice, facts) => {
    if (advice.code === 'refused') return [t('refused')];
    const { changed, keeps } = advice;
    const breaks = keeps ? [] : [t('breaks')];
    const [only, ...others] = changed;
    if (only === undefined) return [t('stays'), ...breaks];
    const broke = facts.some(({ code }) => code === 'meets' || code === 'meets-earlier');
    const covers = broke && keeps && others.length === 0 && only.before !== null && only.after !== null;
    if (covers) return [t('covers', parts(only))];
    return [t('changes', { doses: format.list(changed.map(item)) }), ...breaks];
  };
}
