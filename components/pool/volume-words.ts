import { useTranslations } from 'next-intl';
import { formatNumber, formatQuantityIn } from '@/lib/units/format';
import { fromInside, type UnitSystem } from '@/lib/units/unit';
import type { VolumeUnit } from '@/lib/units/unit-mistake';
import { usePoolSetting } from './setting';

/** A volume [m3] in words: in cubic metres, litres or US gallons, as exactly as a garden pool is known. */
export function useVolumeWords() {
  const t = useTranslations('units');
  const { locale } = usePoolSetting();
  const inUnit = (volume: number, unit: VolumeUnit) => {
    if (unit === 'm3') {
      const { value } = formatQuantityIn(volume, 'volume', 'm3', locale);
      return t('m3', { value: volume < 10 ? value : formatNumber(volume, { decimals: 0, locale }) });
    }
    return t(unit, { value: formatNumber(threeFigures(fromInside(volume, unit)), { decimals: 0, locale }) });
  };
  return {
    inUnit,
    inSystem: (volume: number, system: UnitSystem) => inUnit(volume, system === 'metric' ? 'm3' : 'us-gal'),
  };
}

function threeFigures(value: number): number {
  const step = 10 ** Math.max(0, Math.floor(Math.log10(value)) - 2);
  return Math.round(value / step) * step;
}
