import { useTranslations } from 'next-intl';
import type { Learnt, LearntRow, LearntThing } from '@/lib/schemas/learnt';
import { formatNumber, formatQuantity } from '@/lib/units/format';
import { usePoolSetting } from '../setting';
import { useVolumeWords } from '../volume-words';

/** Dark demand is stated for water of this temperature [degrees C]. */
const DARK_DEMAND_TEMPERATURE = 27;
/** The day's loss is reckoned from this level of free chlorine [mg/L]. */
const FROM_LEVEL = 3;
/** Within such a share of what was assumed it is as usual. */
const AS_USUAL = 0.08;

export type SizeKnown = 'drew' | 'entered';

/** What is said of each thing that a pool teaches. */
export function useLearntWords({ enteredVolume, measureVolumeAgain, tabletHoursADay }: Learnt, how: SizeKnown) {
  const t = useTranslations('learnt');
  const units = useTranslations('units');
  const { system, locale } = usePoolSetting();
  const volumes = useVolumeWords();
  const written = (value: number, quantity: 'freeChlorine' | 'temperature') => {
    const { value: figure, unitCode } = formatQuantity(value, quantity, system, locale);
    return units(unitCode, { value: figure });
  };
  const entered = volumes.inSystem(enteredVolume ?? 0, system);

  const headingOf = ({ thing, learnt }: LearntRow, about: (value: number) => string) =>
    thing === 'volume' && measureVolumeAgain
      ? t('measureAgain.heading')
      : t(`heading.${thing}`, { value: about(learnt.p50) });

  const sentenceOf = (row: LearntRow): string => {
    const { thing, before, learnt } = row;
    if (thing === 'dailyLoss') return t('words.dailyLoss', { compared: comparison(before.p50, learnt.p50) });
    if (thing !== 'volume') return t(`words.${thing}`);
    const words = { how, entered, learnt: volumes.inSystem(learnt.p50, system) };
    if (measureVolumeAgain) return t('measureAgain.words', words);
    if (words.learnt !== entered) return t('words.volumeDiffers', words);
    return row.clear ? t('words.volume', words) : '';
  };

  return {
    name: (thing: LearntThing) => t(`thing.${thing}.name`),
    note: (thing: LearntThing): string => {
      if (thing === 'dailyLoss') return t('thing.dailyLoss.note', { level: written(FROM_LEVEL, 'freeChlorine') });
      if (thing === 'darkDemand')
        return t('thing.darkDemand.note', { temperature: written(DARK_DEMAND_TEMPERATURE, 'temperature') });
      if (thing !== 'tabletLife') return t(`thing.${thing}.note`);
      const hours = tabletHoursADay ?? 24;
      const whole = Number.isInteger(hours) ? 0 : 1;
      return t('thing.tabletLife.note', {
        hours: hours === 24 ? 'always' : formatNumber(hours, { decimals: whole, locale }),
      });
    },
    headingOf,
    sentenceOf: (row: LearntRow) => {
      const again = row.thing === 'volume' && measureVolumeAgain;
      // Even where no single test says much of the volume, all together move it a little, and it is used.
      const unclear = row.readings === 0 && row.thing !== 'volume' ? t('untold') : t('notClear');
      return row.clear || again ? sentenceOf(row) : [unclear, sentenceOf(row)].join(' ').trim();
    },
  };
}

function comparison(usual: number, learnt: number): 'less' | 'more' | 'usual' {
  if (learnt < usual * (1 - AS_USUAL)) return 'less';
  return learnt > usual * (1 + AS_USUAL) ? 'more' : 'usual';
}
