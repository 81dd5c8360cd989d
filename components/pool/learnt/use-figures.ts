import { useTranslations } from 'next-intl';
import type { LearntRange, LearntRow } from '@/lib/schemas/learnt';
import { formatNumber } from '@/lib/units/format';
import { fromInside, toInside, type UnitCode, type UnitSystem } from '@/lib/units/unit';
import { usePoolSetting } from '../setting';

type Unit = LearntRow['unit'];
type WordedUnit = 'days' | 'percent' | 'percent-per-hour' | 'percent-per-day' | 'cm-per-hour' | 'in-per-hour';
type Shown = { decimals: number; of: (value: number) => number } & ({ code: UnitCode } | { worded: WordedUnit });

/** From so many days on a tenth of a day is no use to anybody. */
const WHOLE_DAYS_FROM = 3;

const asItIs = (value: number) => value;

/** How each unit is read in a household's measures: as many decimals as are worth saying. */
function shownAs(unit: Unit, system: UnitSystem, around: number): Shown {
  const us = system === 'us';
  const inUnit = (code: UnitCode, decimals: number): Shown => ({
    code,
    decimals,
    of: (value) => fromInside(value, code),
  });
  switch (unit) {
    case 'mg/L':
      return inUnit(us ? 'ppm' : 'mg/L', 1);
    case 'm3':
      return us ? { code: 'us-gal', decimals: 0, of: hundreds } : inUnit('m3', around < 20 ? 1 : 0);
    case 'g':
      return inUnit(us ? 'oz' : 'g', us ? 2 : 1);
    case 'L': {
      const code = us ? 'us-gal-poured' : 'L-poured';
      return {
        code,
        decimals: us || around < 10 ? 1 : 0,
        of: (litres) => fromInside(toInside(litres, 'L-poured'), code),
      };
    }
    case 'cm-per-hour':
      return us
        ? { worded: 'in-per-hour', decimals: 2, of: (value) => fromInside(toInside(value, 'cm'), 'in') }
        : { worded: unit, decimals: 1, of: asItIs };
    case 'days':
      return { worded: unit, decimals: 1, of: asItIs };
    case 'percent':
    case 'percent-per-day':
      return { worded: unit, decimals: 0, of: asItIs };
    case 'percent-per-hour':
      return { worded: unit, decimals: 1, of: asItIs };
  }
}

/** A garden pool is known to a hundred US gallons at best. */
function hundreds(volume: number): number {
  return Math.round(fromInside(volume, 'us-gal') / 100) * 100;
}

type Measured = Pick<LearntRow, 'unit' | 'learnt'>;

/** The figures of one row in the household's measures, with and without their unit. */
export function useFigures(row: Measured) {
  return useRowFigures()(row);
}

/** The same for rows of which it is not known how many there are. */
export function useRowFigures() {
  const t = useTranslations('learnt.unit');
  const units = useTranslations('units');
  const { system, locale } = usePoolSetting();
  return (row: Measured) => figuresOf(row, { system, locale, t, units });
}

type Words = {
  system: UnitSystem;
  locale: string;
  t: ReturnType<typeof useTranslations<'learnt.unit'>>;
  units: ReturnType<typeof useTranslations<'units'>>;
};

function figuresOf({ unit, learnt }: Measured, { system, locale, t, units }: Words) {
  const shown = shownAs(unit, system, learnt.p50);
  const written = (value: number, decimals: number) => formatNumber(value, { decimals, locale });
  const withUnit = (value: string) => ('code' in shown ? units(shown.code, { value }) : t(shown.worded, { value }));
  const figure = (value: number) => written(shown.of(value), shown.decimals);
  return {
    figure,
    withUnit,
    /** "71 m³"; of days whole ones, where that is still exact enough. */
    about: (value: number) => withUnit(unit === 'days' && value >= WHOLE_DAYS_FROM ? written(value, 0) : figure(value)),
    /** A range as the axis counts it. */
    inShown: ({ p10, p50, p90 }: LearntRange): LearntRange => ({
      p10: shown.of(p10),
      p50: shown.of(p50),
      p90: shown.of(p90),
    }),
    /** What the axis says beside a tick. */
    tick: written,
    lastTick: (value: number, decimals: number) => withUnit(written(value, decimals)),
  };
}
