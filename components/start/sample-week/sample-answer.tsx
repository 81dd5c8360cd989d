import { useTranslations } from 'next-intl';
import type { SampleDose, SampleWeek } from '@/lib/schemas/sample-water';
import type { UnitSystem } from '@/lib/units/unit';
import { dayOf, eveningsOf } from './sample-drawing';
import { useSampleWords } from './use-sample-words';

/** Under the one the sun takes chlorine fast; over the other little room is left under the swim limit [mg/L]. */
const LITTLE_STABILIZER = 30;
const MUCH_STABILIZER = 50;

/** The week in one line, its doses, and why it looks like this. */
export function SampleAnswer({ week, unitSystem }: { week: SampleWeek; unitSystem: UnitSystem }) {
  const t = useTranslations('start.sample');
  const words = useSampleWords(unitSystem);
  const headline = useHeadline(week);
  const why = useWhy(week, unitSystem);
  return (
    <>
      <h3 className="font-display text-section">{headline}</h3>
      <ul className="mt-1 text-body">
        {week.doses.map((dose) => (
          <li key={`${dose.hour} ${dose.form}`} className="font-emphasis">
            {t('onDay', { day: words.days[dayOf(dose.hour)] ?? '', dose: words.dose(dose) })}
          </li>
        ))}
      </ul>
      <p className="mt-1.5 text-small">{why}</p>
    </>
  );
}

function useHeadline(week: SampleWeek): string {
  const t = useTranslations('start.sample');
  if (week.standing.code === 'replace-water') return t('replaceWater');
  if (week.standing.code === 'few-open-hours') return t('fewOpenHours');
  return t('evenings', { count: eveningsOf(week).length });
}

function useWhy(week: SampleWeek, unitSystem: UnitSystem): string {
  const t = useTranslations('start.sample');
  const words = useSampleWords(unitSystem);
  const { standing, water, doses } = week;
  if (standing.code === 'replace-water')
    return t('replaceWaterWhy', {
      stabilizer: words.milligrams(water.stabilizer),
      volume: words.quantity(standing.volume, 'volume'),
      days: standing.days,
      target: words.milligrams(standing.target),
    });
  if (standing.code === 'few-open-hours')
    return t('fewOpenHoursWhy', {
      share: Math.round(standing.share * 100),
      visits: standing.visits,
      stabilizer:
        water.stabilizer < LITTLE_STABILIZER ? 'little' : water.stabilizer > MUCH_STABILIZER ? 'much' : 'enough',
    });
  return t('why', { forms: formsOf(doses) });
}

function formsOf(doses: readonly SampleDose[]): 'both' | 'tablets' | 'fast' | 'none' {
  const slow = doses.some(({ form }) => form === 'tablet');
  const fast = doses.some(({ form }) => form !== 'tablet');
  if (slow) return fast ? 'both' : 'tablets';
  return fast ? 'fast' : 'none';
}
