'use client';

import { useTranslations } from 'next-intl';
import type { DoseUnit } from '@/lib/schemas/dose';
import { formatNumber, formatQuantity, type Written } from '@/lib/units/format';
import type { Quantity } from '@/lib/units/quantity';
import { convert } from '@/lib/units/unit';
import { useSheet } from './sheet-context';

/** Figures of the household's units in words. */
export function useUnits() {
  const t = useTranslations('units');
  const { unitSystem, locale } = useSheet().sheet.household;

  const written = ({ value, unitCode }: Written) => t(unitCode, { value });
  const quantity = (value: number, of: Quantity) => written(formatQuantity(value, of, unitSystem, locale));
  const number = (value: number, decimals = Number.isInteger(value) ? 0 : 1) =>
    formatNumber(value, { decimals, locale });

  return {
    /** A number as short as it is exact: "4", "4.5". */
    number,
    /** With its sign: "+0.6", "-0.9". */
    signed: (value: number, decimals?: number) => {
      const written = number(value, decimals);
      return value > 0 && written !== number(0, decimals) ? t('plus', { value: written }) : written;
    },
    /** The unit in which a quantity is written, alone: "mg/L". */
    unitOf: (of: Quantity) => t(formatQuantity(0, of, unitSystem, locale).unitCode, { value: '' }).trim(),
    /** A figure without its unit: "3.0", "7.5", "44". */
    figure: (value: number, of: Quantity) => formatQuantity(value, of, unitSystem, locale).value,
    /** A figure with its unit: "3.0 mg/L". */
    quantity,
    /** "95 g", "1.2 kg", "8 fl oz"; whole tablets are only counted. */
    amount: (value: number, unit: DoseUnit) =>
      unit === 'tablet' ? number(value) : quantity(value, unit === 'g' ? 'mass' : 'liquidVolume'),
    /** What is to be carried home, from kilograms: never in grams or ounces. */
    weightToCarry: (kilograms: number) => {
      const unitCode = unitSystem === 'us' ? 'lb' : 'kg';
      return t(unitCode, { value: number(convert(kilograms, 'kg', unitCode), 1) });
    },
    /** Rain, from millimetres. */
    rain: (millimetres: number) => quantity(millimetres / 1000, 'rain'),
    /** Water for a bucket, from litres: whole ones, and never less than was asked for. */
    bucket: (litres: number) => {
      const unitCode = unitSystem === 'us' ? 'us-gal-poured' : 'L-poured';
      return t(unitCode, { value: number(Math.ceil(convert(litres, 'L-poured', unitCode)), 0) });
    },
  };
}
