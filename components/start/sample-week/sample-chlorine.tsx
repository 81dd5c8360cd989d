import { useTranslations } from 'next-intl';
import { GlyphShape } from '@/components/charts/product-glyph';
import type { SampleDose, SampleWeek } from '@/lib/schemas/sample-water';
import type { UnitSystem } from '@/lib/units/unit';
import { across, areaOf, cutOf, down, glyphs, levelAt, pathOf, topOf, weekDays, weekHours } from './sample-drawing';
import { useSampleWords } from './use-sample-words';

type Props = { week: SampleWeek; before?: SampleWeek | undefined; unitSystem: UnitSystem };

/**
 * The lane of free chlorine. The curves are stretched to whatever width there is; words, dots and glyphs stand over them as
 * HTML so that they are never stretched with it.
 */
export function SampleChlorine({ week, before, unitSystem }: Props) {
  const t = useTranslations('start.sample');
  const { number, days } = useSampleWords(unitSystem);
  const top = topOf(week);
  const { swimLimit, swims, tested } = week;
  const { low, middle, high, lowest } = week.course;
  const atLeast = Math.min(...lowest);
  const picture = t('picture', {
    tested: number(tested, 1),
    low: number(Math.min(...middle), 1),
    high: number(Math.max(...middle), 1),
    lowest: number(atLeast, 1),
    swimLimit: number(swimLimit),
  });
  return (
    <>
      <p className="flex items-baseline justify-between pt-1 pb-1.5 md:block md:border-t md:border-rule-2 md:pt-3.5">
        <b className="block font-display text-name text-teal-ink md:max-w-20">{t('chlorine')}</b>
        <span className="block text-fine text-ink-2 md:mt-0.5 md:max-w-20">{t('chlorineNote')}</span>
      </p>
      <div className="ml-6 md:ml-0">
        <div className="relative h-64 border-t border-rule-2 md:h-84" role="img" aria-label={picture}>
          <Ground week={week} top={top} />
          <svg
            className="absolute inset-0 size-full"
            viewBox={`0 0 ${weekHours} 100`}
            preserveAspectRatio="none"
            aria-hidden="true"
          >
            <Nights week={week} />
            <path d={areaOf(high, low, top)} className="fill-band" />
            <path
              d={pathOf(lowest, top)}
              className="fill-none stroke-ink"
              strokeWidth="1.25"
              vectorEffect="non-scaling-stroke"
            />
            {week.doses.map(({ hour, form }) => (
              <path
                key={`${hour} ${form}`}
                d={`M${hour} ${down(levelAt(week, hour), top)}V100`}
                className="fill-none stroke-ink"
                strokeWidth="1.1"
                strokeDasharray="2 3"
                vectorEffect="non-scaling-stroke"
              />
            ))}
            {before === undefined ? null : (
              <path
                d={pathOf(before.course.middle, top)}
                className="fill-none stroke-teal-ink"
                strokeWidth="1.6"
                strokeDasharray="1 4"
                strokeLinecap="round"
                vectorEffect="non-scaling-stroke"
              />
            )}
            <path
              d={pathOf(middle, top)}
              className="fill-none stroke-teal"
              strokeWidth="2.6"
              strokeLinejoin="round"
              strokeLinecap="round"
              vectorEffect="non-scaling-stroke"
            />
          </svg>
          <SwimLimit week={week} top={top} />
          <Levels top={top} />
          <Words level={swimLimit} top={top} above>
            <b className="font-strong text-ink">{t('swimLimit', { limit: number(swimLimit) })}</b>
            <span className="ml-1 hidden lg:inline">{t('swimLimitNote')}</span>
          </Words>
          <Words level={atLeast} top={top}>
            <b className="font-strong text-ink">{t('lowestLevel', { level: number(atLeast, 1) })}</b>
            <span className="ml-1 hidden lg:inline">{t('lowestLevelNote')}</span>
          </Words>
          <At hour={0} level={tested} top={top}>
            <span className="block size-2.75 rounded-full border-[1.8px] border-ink bg-paper-lift" />
          </At>
          {week.doses.map((dose) => (
            <At key={`${dose.hour} ${dose.form}`} hour={dose.hour} level={levelAt(week, dose.hour)} top={top}>
              <span className="flex size-6 items-center justify-center rounded-full border border-ink bg-paper-lift">
                <svg viewBox="-8 -8 16 16" className="size-3.5" aria-hidden="true">
                  <GlyphShape mark={glyphs[dose.form]} />
                </svg>
              </span>
              {isFast(dose) ? (
                <b className="absolute right-full bottom-full hidden bg-paper px-1 font-display text-name md:block">
                  {t('rise', { rise: number(dose.rise, 1) })}
                </b>
              ) : null}
            </At>
          ))}
        </div>
        <p
          className="flex justify-between border-t border-rule-2 pt-1 text-chart text-ink-2 md:hidden"
          aria-hidden="true"
        >
          {days.map((day) => (
            <span key={day} className="w-0 flex-1 text-center">
              {day.slice(0, 2)}
            </span>
          ))}
        </p>
        <p className="pt-1.5 pb-2 text-fine text-ink-2">
          {t('legend', { tested: number(tested, 1), from: swims.from, to: swims.to })}
          {before === undefined ? null : <span className="ml-1">{t('beforeLegend')}</span>}
        </p>
      </div>
    </>
  );
}

const isFast = ({ form }: SampleDose) => form === 'granular' || form === 'liquid';

/** Share of the lane that is hatched under the lowest level. */
const HATCHED = 0.03;

/** Water between the limits, hatching where the line may not go. */
function Ground({ week, top }: { week: SampleWeek; top: number }) {
  const { lowest } = week.course;
  const limit = lowest.map(() => week.swimLimit);
  const below = lowest.map((level) => level - top * HATCHED);
  return (
    <>
      <div className="absolute inset-0 bg-water-2" style={{ clipPath: cutOf(limit, lowest, top) }} aria-hidden="true" />
      <div
        className="absolute inset-0 bg-hatch-ink"
        style={{ clipPath: cutOf(lowest, below, top) }}
        aria-hidden="true"
      />
    </>
  );
}

function Nights({ week: { sun } }: { week: SampleWeek }) {
  const tenth = (hour: number) => Math.round(hour * 10) / 10;
  const box = (from: number, to: number) => `M${tenth(from)} 0H${tenth(to)}V100H${tenth(from)}Z`;
  const nights = weekDays.map((day) => box(day * 24, day * 24 + sun.rises) + box(day * 24 + sun.sets, day * 24 + 24));
  return (
    <>
      <path d={nights.join('')} className="fill-night" />
      <path
        d={weekDays.map((day) => `M${day * 24} 0V100`).join('')}
        className="fill-none stroke-rule"
        vectorEffect="non-scaling-stroke"
      />
    </>
  );
}

/** The limit is inked and hatched above; brackets hang from it where people swim. */
function SwimLimit({ week: { swimLimit, swims }, top }: { week: SampleWeek; top: number }) {
  return (
    <div
      className="absolute inset-x-0 border-t-[1.25px] border-ink"
      style={{ top: `${down(swimLimit, top)}%` }}
      aria-hidden="true"
    >
      <span className="absolute inset-x-0 bottom-px h-1.5 bg-hatch-ink" />
      {weekDays.map((day) => (
        <span
          key={day}
          className="absolute top-0.75 h-1.5 border-x border-t border-ink"
          style={{ left: `${across(day * 24 + swims.from)}%`, width: `${across(swims.to - swims.from)}%` }}
        />
      ))}
    </div>
  );
}

/** Figures of the axis, at the left of the lane. */
function Levels({ top }: { top: number }) {
  const levels = Array.from({ length: top + 1 }, (_, level) => level);
  return levels.map((level) => (
    <span
      key={level}
      className="absolute -left-2 -translate-x-full -translate-y-1/2 text-chart text-ink-2"
      style={{ top: `${down(level, top)}%` }}
      aria-hidden="true"
    >
      {level}
    </span>
  ));
}

type AtProps = { hour: number; level: number; top: number; children: React.ReactNode };

function At({ hour, level, top, children }: AtProps) {
  return (
    <span
      className="absolute -translate-x-1/2 -translate-y-1/2"
      style={{ left: `${across(hour)}%`, top: `${down(level, top)}%` }}
      aria-hidden="true"
    >
      {children}
    </span>
  );
}

type WordsProps = { level: number; top: number; above?: boolean; children: React.ReactNode };

/** Words of a limit stand outside the range, on the side where the line may not go. */
function Words({ level, top, above = false, children }: WordsProps) {
  return (
    <span
      className={`absolute left-2.5 bg-paper px-1 text-chart text-ink-2 ${above ? '-translate-y-[calc(100%+9px)]' : 'translate-y-4.5'}`}
      style={{ top: `${down(level, top)}%` }}
      aria-hidden="true"
    >
      {children}
    </span>
  );
}
