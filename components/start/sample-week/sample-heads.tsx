import { useTranslations } from 'next-intl';
import type { SampleWeek } from '@/lib/schemas/sample-water';
import type { UnitSystem } from '@/lib/units/unit';
import { weekDays, weekHours } from './sample-drawing';
import { useSampleWords } from './use-sample-words';

/** Days and sun over the chart; on a phone the days stand under it instead. */
export function SampleHeads({ week, unitSystem }: { week: SampleWeek; unitSystem: UnitSystem }) {
  const t = useTranslations('start.sample');
  const { days } = useSampleWords(unitSystem);
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
      <svg
        viewBox={`0 0 ${weekHours} 100`}
        preserveAspectRatio="none"
        className="ml-6 block h-11 w-[calc(100%-1.5rem)] border-rule-2 md:ml-0 md:h-14 md:w-full md:border-t"
        aria-hidden="true"
      >
        <path
          d={weekDays.map((day) => `M${day * 24} 0V100`).join('')}
          className="fill-none stroke-rule"
          vectorEffect="non-scaling-stroke"
        />
        <path d={weekDays.map((day) => barsOf(week, day)).join('')} className="fill-ink-3" />
      </svg>
    </>
  );
}

/** One bar for each hour of a day with sun, with some air at its sides and above the strongest. */
function barsOf({ sunByHour }: SampleWeek, day: number): string {
  const strongest = Math.max(1, ...sunByHour);
  return sunByHour
    .map((strength, hour) => {
      const height = Math.round((strength / strongest) * 86);
      return height === 0 ? '' : `M${day * 24 + hour}.25 100V${100 - height}h.5V100Z`;
    })
    .join('');
}
