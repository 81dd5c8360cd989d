'use client';

import { useTranslations } from 'next-intl';
import type { Axis, Curve, Level, Mark, Point } from '@/lib/client/worked-out/examples/curve';
import { pathOf, percentOf, shareOf } from './curve-path';
import { clearPlace } from './clear-place';
import { LineWords } from './line-words';
import { useWritten } from './use-written';

const strokes: Record<Mark, { className: string; width: number; dash?: string }> = {
  chlorine: { className: 'stroke-teal', width: 2.6 },
  pH: { className: 'stroke-plum', width: 2, dash: '9 3.5' },
  stabilizer: { className: 'stroke-ochre', width: 2, dash: '11 3 1.6 3' },
  ink: { className: 'stroke-ink', width: 2.3 },
  before: { className: 'stroke-ink', width: 2, dash: '.1 5' },
};

/**
 * Curves on two plain axes. The lines are stretched to whatever width there is; words stand over them as HTML, so that
 * they are not stretched with them.
 */
export function DrawnCurve({ curve }: { curve: Curve }) {
  const { across, up } = curve;
  return (
    <div aria-hidden="true">
      <div className="relative ml-12 h-60 border-b border-l border-rule-2 md:ml-14 md:h-68">
        <svg className="absolute inset-0 size-full overflow-hidden" viewBox="0 0 100 100" preserveAspectRatio="none">
          {across.ticks.map((tick) => (
            <path
              key={tick}
              d={`M${100 * shareOf(tick, across)} 0V100`}
              className="fill-none stroke-rule"
              vectorEffect="non-scaling-stroke"
            />
          ))}
          {curve.ranges?.map(({ name, low, high }) => (
            <path key={name} d={areaOf(low, high, across, up)} className="fill-band" />
          ))}
          {curve.lines.map(({ name, mark, points }, index) => (
            <path
              key={`${name}${index}`}
              d={pathOf(points, across, up)}
              className={`fill-none ${strokes[mark].className}`}
              strokeWidth={strokes[mark].width}
              strokeDasharray={strokes[mark].dash}
              strokeLinejoin="round"
              strokeLinecap="round"
              vectorEffect="non-scaling-stroke"
            />
          ))}
        </svg>
        {curve.levels?.map((level) => (
          <LevelLine key={level.name} level={level} curve={curve} />
        ))}
        <UpTicks up={up} />
        <LineWords curve={curve} />
      </div>
      <AcrossTicks across={across} />
    </div>
  );
}

function areaOf(low: readonly Point[], high: readonly Point[], across: Axis, up: Axis): string {
  return `${pathOf(high, across, up)}L${pathOf([...low].reverse(), across, up).slice(1)}Z`;
}

function LevelLine({ level, curve }: { level: Level; curve: Curve }) {
  const { up } = curve;
  const t = useTranslations('how-examples');
  const written = useWritten();
  const above = level.forbidden !== 'below';
  return (
    <div
      className="absolute inset-x-0 border-t-[1.25px] border-ink"
      style={{ top: percentOf(1 - shareOf(level.at, up)) }}
    >
      {level.forbidden === undefined ? null : (
        <span className={`absolute inset-x-0 h-1.5 bg-hatch-ink ${above ? 'bottom-px' : 'top-0'}`} />
      )}
      <span
        className={`absolute px-2 text-chart whitespace-nowrap text-ink-2 ${above ? 'bottom-2' : 'top-2'}`}
        style={{ left: percentOf(clearPlace(curve, level)) }}
      >
        {t(`figure.${level.name}`)} {written(level.at, { ...up, decimals: Number.isInteger(level.at) ? 0 : 1 })}
      </span>
    </div>
  );
}

function UpTicks({ up }: { up: Axis }) {
  const written = useWritten();
  return up.ticks.map((tick, index) => (
    <span
      key={tick}
      className="absolute -left-2 -translate-x-full -translate-y-1/2 text-figure whitespace-nowrap text-ink-2"
      style={{ top: percentOf(1 - shareOf(tick, up)) }}
    >
      {written(
        tick,
        index === up.ticks.length - 1 && up.unit !== 'hourOfDay' ? up : { unit: 'none', decimals: up.decimals },
      )}
    </span>
  ));
}

function AcrossTicks({ across }: { across: Axis }) {
  const written = useWritten();
  return (
    <div className="relative ml-12 h-6 md:ml-14">
      {across.ticks.map((tick, index) => (
        <span
          key={tick}
          className={`absolute top-1.5 text-figure whitespace-nowrap text-ink-2 ${index === across.ticks.length - 1 ? '-translate-x-full' : '-translate-x-1/2'}`}
          style={{ left: percentOf(shareOf(tick, across)) }}
        >
          {written(
            tick,
            across.unit === 'hourOfDay' || index === across.ticks.length - 1
              ? across
              : { unit: 'none', decimals: across.decimals },
          )}
        </span>
      ))}
    </div>
  );
}
