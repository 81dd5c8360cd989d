'use client';

import { useTranslations } from 'next-intl';
import type { DoseUnit } from '@/lib/schemas/dose';
import { waterExchangeADay } from '@/lib/standards/companions';
import { limits } from '@/lib/standards/limits';
import { accidentTime } from '@/lib/standards/situations';
import { formatNumber, formatQuantity } from '@/lib/units/format';
import type { Quantity } from '@/lib/units/quantity';
import { useHousehold } from './situation-context';

type Figures = Record<string, string | number>;

/** What each figure of a step or a reason measures; the others are counts. */
const quantities: Readonly<Record<string, Quantity>> = {
  stabilizer: 'cyanuricAcid',
  freeChlorine: 'freeChlorine',
  combinedChlorine: 'combinedChlorine',
  temperature: 'temperature',
  volume: 'volume',
  drop: 'level',
  from: 'calciumHardness',
  to: 'calciumHardness',
  reached: 'calciumHardness',
  fill: 'calciumHardness',
  aim: 'calciumHardness',
};

/** Figures in the household's units. */
export function useSituationFigures() {
  const t = useTranslations('units');
  const { unitSystem, locale } = useHousehold();
  const quantity = (value: number, of: Quantity) => {
    const { value: figure, unitCode } = formatQuantity(value, of, unitSystem, locale);
    return t(unitCode, { value: figure });
  };
  const figure = (value: number, of: Quantity) => formatQuantity(value, of, unitSystem, locale).value;
  const number = (value: number, decimals = Number.isInteger(value) ? 0 : 1) =>
    formatNumber(value, { decimals, locale });

  /** What the words of a code name beside its own figures: limits that stand still. */
  const standing: Figures = {
    drop: quantity(waterExchangeADay.value, 'level'),
    level: quantity(accidentTime.freeChlorine, 'freeChlorine'),
    pHMost: quantity(accidentTime.pHAtMost, 'pH'),
    warm: quantity(accidentTime.temperatureAtLeast, 'temperature'),
    maximum: number(limits.freeChlorineMaximum.value),
    // Until a fact names them: nobody measured them.
    temperature: 'none',
    pH: 'none',
  };

  const written = (code: string, name: string, value: string | number): string | number => {
    if (typeof value === 'string') return value;
    if (name === 'pH') return figure(value, 'pH');
    if (name === 'limit') return quantity(value, code === 'combined' ? 'combinedChlorine' : 'cyanuricAcid');
    const of = quantities[name];
    return of === undefined ? value : quantity(value, of);
  };

  return {
    quantity,
    figure,
    number,
    /** "95 g", "1.2 L"; whole tablets are only counted. */
    amount: (value: number, unit: DoseUnit) =>
      unit === 'tablet' ? number(value) : quantity(value, unit === 'g' ? 'mass' : 'liquidVolume'),
    unitOf: (of: Quantity) => t(formatQuantity(0, of, unitSystem, locale).unitCode, { value: '' }).trim(),
    standing,
    /** The figures of a fact as its words want them. */
    inWords: (code: string, figures: Readonly<Record<string, unknown>>): Figures => ({
      ...standing,
      ...Object.fromEntries(
        Object.entries(figures).flatMap(([name, value]) =>
          typeof value === 'string' || typeof value === 'number' ? [[name, written(code, name, value)]] : [],
        ),
      ),
    }),
  };
}
