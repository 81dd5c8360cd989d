import { useTranslations } from 'next-intl';
import { DrawnChlorine } from './drawn-chlorine';
import { DrawnToDo } from './drawn-to-do';

/**
 * How a week sheet is read: the same lanes on one time axis as the real one, drawn without a single figure, because
 * nobody's water has been measured yet.
 */
export function DrawnSheet() {
  const t = useTranslations('start.reading');
  const days = [t('day1'), t('day2'), t('day3'), t('day4'), t('day5'), t('day6'), t('day7')] as const;
  return (
    <section aria-labelledby="reading">
      <div className="flex flex-wrap items-baseline justify-between gap-x-6 pt-4 pb-2.5">
        <h2 id="reading" className="font-display text-section">
          {t('title')}
        </h2>
        <p className="text-small text-ink-2">{t('note')}</p>
      </div>
      <div className="md:grid md:grid-cols-[118px_1fr]">
        <div className="hidden md:block" />
        <div className="hidden grid-cols-7 md:grid" aria-hidden="true">
          {days.map((day) => (
            <p key={day} className="border-l border-rule py-1.5 pl-2.5 font-display text-name">
              {day}
            </p>
          ))}
        </div>
        <p className="flex items-baseline justify-between pb-1.5 md:block md:border-t md:border-rule-2 md:pt-3.5">
          <b className="block font-display md:max-w-24 text-name text-teal-ink">{t('chlorine')}</b>
          <span className="block text-fine text-ink-2 md:mt-0.5">{t('chlorineNote')}</span>
        </p>
        <DrawnChlorine days={days} />
        <DrawnToDo days={days} />
      </div>
    </section>
  );
}
