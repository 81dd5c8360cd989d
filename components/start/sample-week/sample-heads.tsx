import { useTranslations } from 'next-intl';
import type { SampleWeek } from '@/lib/schemas/sample-water';
import type { UnitSystem } from '@/lib/units/unit';
import { weekDays } from './sample-drawing';
import { useSampleWords } from './use-sample-words';

/** Days and sun over the chart; on a phone the days stand under it instead. */
export function SampleHeads({ week, unitSystem }: { week: SampleWeek; unitSystem: UnitSystem }) {
  const t = useTranslations('start.sample');
  const { days } = useSampleWords(unitSystem);
  const strongest = Math.max(1, ...week.sunByHour);
  return (
    <>
      <div className="hidden md:block" />
      <div className="hidden grid-cols-7 md:grid" aria-hidden="true">
        {days.map((day) => (
          <p key={day} className="border-l border-rule py-1.5 pl-2.5 font-display text-name">
            {day}
          </p>
        ))}
      </div>
      <p className="hidden border-t border-rule-2 pt-2 md:block">
        <b className="block font-display text-name">{t('sunshine')}</b>
        <span className="block text-fine text-ink-2">{t('sunNote')}</span>
      </p>
      <div className="ml-6 grid h-11 grid-cols-7 md:ml-0 md:h-14 md:border-t md:border-rule-2" aria-hidden="true">
        {weekDays.map((day) => (
          <div key={day} className="flex items-end gap-px border-l border-rule pb-1">
            {week.sunByHour.map((strength, hour) => (
              <span
                key={hour}
                className="w-0 flex-1 bg-ink-3 md:mx-px"
                style={{ height: `${Math.round((strength / strongest) * 88)}%` }}
              />
            ))}
          </div>
        ))}
      </div>
    </>
  );
}
