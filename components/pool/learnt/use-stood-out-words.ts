import { useTranslations } from 'next-intl';
import { dayAndMonth } from '@/lib/calendar/format';
import { dayOf } from '@/lib/calendar/household-day';
import { parseInstant } from '@/lib/calendar/wall-time';
import type { LearntThing, StoodOut } from '@/lib/schemas/learnt';
import { formatNumber, formatQuantity } from '@/lib/units/format';
import { usePoolSetting } from '../setting';

/** Which tests speak of which thing. */
const spokenOfBy: Record<LearntThing, readonly StoodOut['quantity'][]> = {
  dailyLoss: ['freeChlorine'],
  volume: ['freeChlorine'],
  tabletLife: ['tabletsLeft', 'freeChlorine'],
  chlorinePerSwimmerHour: ['freeChlorine'],
  sunStrength: ['freeChlorine'],
  boundPhotolysis: ['freeChlorine'],
  darkDemand: ['freeChlorine'],
  waterPerSwimmerHour: ['cyanuricAcid', 'calciumHardness'],
  carbonDioxideTransfer: ['pH', 'totalAlkalinity'],
};

export function stoodOutFor(thing: LearntThing, stoodOut: readonly StoodOut[]): StoodOut[] {
  return stoodOut.filter(({ quantity }) => spokenOfBy[thing].includes(quantity));
}

/** What became of a test that did not simply count, in a sentence with its day. */
export function useStoodOutWords() {
  const t = useTranslations('learnt');
  const units = useTranslations('units');
  const { timeZone, locale, system } = usePoolSetting();
  return ({ takenAt, kind, quantity, measured, low, high }: StoodOut): string => {
    const day = dayAndMonth(dayOf(parseInstant(takenAt) ?? 0, timeZone), locale);
    if (quantity === 'tabletsLeft') {
      const count = (value: number, decimals: number) => formatNumber(value, { decimals, locale });
      return t('why.tabletsLeft', { day, measured: count(measured, 0), low: count(low, 1), high: count(high, 1) });
    }
    const figure = (value: number) => formatQuantity(value, quantity, system, locale);
    const last = figure(high);
    return t(`why.${kind}`, {
      day,
      quantity: t(`quantity.${quantity}`),
      measured: figure(measured).value,
      low: figure(low).value,
      high: quantity === 'pH' ? last.value : units(last.unitCode, { value: last.value }),
    });
  };
}
