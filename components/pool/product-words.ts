import { useTranslations } from 'next-intl';
import type { HouseholdProduct } from '@/lib/schemas/household-product';
import { dayAndMonth } from '@/lib/calendar/format';
import { formatNumber, formatQuantity } from '@/lib/units/format';
import { factsOf } from './ingredients';
import { usePoolSetting } from './setting';

/** A product on one line and the next: what it is as printed, how strong, how much is left. */
export function useProductWords() {
  const t = useTranslations('pool.product');
  const names = useTranslations('pool.ingredient');
  const units = useTranslations('units');
  const { system, locale } = usePoolSetting();
  const amount = (value: number, liquid: boolean) => {
    const { value: text, unitCode } = formatQuantity(value, liquid ? 'liquidVolume' : 'mass', system, locale);
    return units(unitCode, { value: text });
  };
  return {
    name: ({ substance }: Pick<HouseholdProduct, 'substance'>) => names(`${substance}.name`),
    detail: (product: HouseholdProduct) => {
      const { substance, form, strength, tabletMass, boughtOn, name } = product;
      const { strength: kind } = factsOf(substance);
      const figure =
        strength === undefined ? undefined : formatNumber(strength, { decimals: 1, locale }).replace(/[.,]0$/, '');
      return [
        name,
        form === 'tablet' && tabletMass !== undefined
          ? t('detail.tablets', { mass: amount(tabletMass, false) })
          : t(`detail.${form}`),
        figure !== undefined && kind !== 'none' ? t(`detail.strength.${kind}`, { strength: figure }) : undefined,
        boughtOn === undefined ? undefined : t('detail.bought', { day: dayAndMonth(boughtOn, locale) }),
      ]
        .filter((part) => part !== undefined)
        .join(', ');
    },
    left: ({ form, stock, tabletMass }: HouseholdProduct) => {
      if (form !== 'tablet' || tabletMass === undefined) return amount(stock, form === 'liquid');
      const count = Math.round((stock / tabletMass) * 10) / 10;
      return t('left.tablets', {
        count,
        figure: formatNumber(count, { decimals: Number.isInteger(count) ? 0 : 1, locale }),
      });
    },
  };
}
