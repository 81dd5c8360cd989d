import { useTranslations } from 'next-intl';
import { across, bandOf, down, drawnCheck, drawnDoses, drawnWeek, lineOf } from './drawn-week';
import { ProductGlyph } from './product-glyph';

const nights = Array.from({ length: 7 }, (_, day) => [
  { from: day * 24, to: day * 24 + 6 },
  { from: day * 24 + 21, to: day * 24 + 24 },
]).flat();

/** Height of the line at an hour of the drawing. */
const heightAt = (hour: number) => drawnWeek[hour]?.height ?? 0;

/**
 * The lane of free chlorine. The curve is stretched to whatever width there is; words, dots and glyphs stand over it as
 * HTML so that they are never stretched with it.
 */
export function DrawnChlorine({ days }: { days: readonly string[] }) {
  const t = useTranslations('start.reading');
  return (
    <div className="relative h-64 border-t border-rule-2 md:h-72" role="img" aria-label={t('picture')}>
      <GoodRange />
      <svg className="absolute inset-0 size-full" viewBox="0 0 100 100" preserveAspectRatio="none" aria-hidden="true">
        {nights.map(({ from, to }) => (
          <rect
            key={from}
            x={across(from)}
            y="0"
            width={across(to) - across(from)}
            height="100"
            className="fill-night"
          />
        ))}
        {days.map((day, index) => (
          <path
            key={day}
            d={`M${across(index * 24)} 0V100`}
            className="fill-none stroke-rule"
            vectorEffect="non-scaling-stroke"
          />
        ))}
        <path d={bandOf(drawnWeek)} className="fill-band" />
        {drawnDoses.map(({ hour }) => (
          <path
            key={hour}
            d={`M${across(hour)} ${down(heightAt(hour))}V100`}
            className="fill-none stroke-ink"
            strokeWidth="1.1"
            strokeDasharray="2 3"
            vectorEffect="non-scaling-stroke"
          />
        ))}
        <path
          d={lineOf(drawnWeek)}
          className="fill-none stroke-teal"
          strokeWidth="2.6"
          strokeLinejoin="round"
          strokeLinecap="round"
          vectorEffect="non-scaling-stroke"
        />
      </svg>
      <Limit height={1} forbidden="above" words={t('swimLimit')} />
      <Limit height={0} forbidden="below" words={t('lowestLevel')} />
      <At hour={0} height={heightAt(0)}>
        <TestDot />
      </At>
      <At hour={drawnCheck} height={heightAt(drawnCheck)}>
        <TestDot />
      </At>
      {drawnDoses.map(({ hour }) => (
        <At key={hour} hour={hour} height={heightAt(hour)}>
          <span className="flex size-5 items-center justify-center rounded-full border border-ink bg-paper-lift">
            <ProductGlyph form="granules" className="size-3" />
          </span>
        </At>
      ))}
      <Words hour={3} height={0.83}>
        <b className="font-strong text-ink">{t('tested')}</b>
      </Words>
      <Words hour={drawnCheck + 2} height={0.1}>
        <b className="font-strong text-ink">{t('checked')}</b>
      </Words>
      <Words hour={4} height={0.14}>
        <i className="font-display text-[16px] text-teal-ink italic">{t('goodRange')}</i>
      </Words>
    </div>
  );
}

/** Water between the limits, with engraved waves that keep their size at every width. */
function GoodRange() {
  return (
    <div
      className="absolute inset-x-0 bg-water-2"
      style={{ top: `${down(1)}%`, height: `${down(0) - down(1)}%` }}
      aria-hidden="true"
    >
      <svg className="size-full">
        <defs>
          <pattern id="drawn-waves" width="36" height="11" patternUnits="userSpaceOnUse">
            <path d="M0 5.5q4.5 -3 9 0t9 0t9 0t9 0" className="fill-none stroke-wave" strokeWidth="0.7" />
          </pattern>
        </defs>
        <rect width="100%" height="100%" fill="url(#drawn-waves)" />
      </svg>
    </div>
  );
}

/** A limit is inked and hatched on the side where the line may not go; its words stand outside the range. */
function Limit({ height, forbidden, words }: { height: number; forbidden: 'above' | 'below'; words: string }) {
  const above = forbidden === 'above';
  return (
    <div className="absolute inset-x-0 border-t-[1.25px] border-ink" style={{ top: `${down(height)}%` }}>
      <span className={`absolute inset-x-0 h-1.5 bg-hatch-ink ${above ? 'bottom-px' : 'top-0'}`} />
      <span className={`absolute left-2.5 text-chart text-ink-2 ${above ? 'bottom-2.5' : 'top-2.5'}`}>{words}</span>
    </div>
  );
}

function At({ hour, height, children }: { hour: number; height: number; children: React.ReactNode }) {
  return (
    <span
      className="absolute -translate-x-1/2 -translate-y-1/2"
      style={{ left: `${across(hour)}%`, top: `${down(height)}%` }}
    >
      {children}
    </span>
  );
}

function TestDot() {
  return <span className="block size-2.75 rounded-full border-[1.8px] border-ink bg-paper-lift" />;
}

type WordsProps = { hour: number; height: number; children: React.ReactNode };

function Words({ hour, height, children }: WordsProps) {
  return (
    <span
      className="absolute -translate-y-1/2 text-chart whitespace-nowrap"
      style={{ left: `${across(hour)}%`, top: `${down(height)}%` }}
    >
      {children}
    </span>
  );
}
