import { useLocale, useTranslations } from 'next-intl';
import type { SampleDose } from '@/lib/schemas/sample-water';
import { formatNumber, formatQuantity } from '@/lib/units/format';
import type { Quantity } from '@/lib/units/quantity';
import type { UnitSystem } from '@/lib/units/unit';

/** Figures and doses of the sheet on the start page in words, for server and browser alike. */
export function useSampleWords(unitSystem: UnitSystem) {
  const t = useTranslations('start.sample');
  const units = useTranslations('units');
  const locale = useLocale();

  const number = (value: number, decimals = 0) => formatNumber(value, { decimals, locale });
  const quantity = (value: number, of: Quantity) => {
    const written = formatQuantity(value, of, unitSystem, locale);
    return units(written.unitCode, { value: written.value });
  };
  const amount = ({ amount: value, unit }: SampleDose) =>
    unit === 'tablet' ? t('tablets', { count: value }) : quantity(value, unit === 'g' ? 'mass' : 'liquidVolume');

  return {
    number,
    quantity,
    milligrams: (value: number, decimals = 0) => units('mg/L', { value: number(value, decimals) }),
    days: [t('day1'), t('day2'), t('day3'), t('day4'), t('day5'), t('day6'), t('day7')] as const,
    /** "2 tablets", "400 mL". */
    amount,
    /** "slow, in the feeder", "granules". */
    product: (dose: SampleDose) => t(`products.${dose.form}`),
    /** "2 slow tablets in the feeder", "400 mL of liquid". */
    dose: (dose: SampleDose) => t(`doses.${dose.form}`, { amount: amount(dose), count: dose.amount }),
  };
}
