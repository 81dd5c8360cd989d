import type { ChartDose } from './chart-doses';
import { doseFoot } from './dose-marks';
import { HATCH } from './patterns';
import { GlyphShape } from './product-glyph';
import { cutTo, isOn, type Stretch, type TimeAxis, xOf } from './time-axis';
import { type ValueAxis, valueAxis, yOf } from './value-axis';
import type { WaterPoint } from './water-curve';

const sparkSize = { width: 96, height: 42 } as const;

/** The scale that all small pictures of a week share, so that their days can be compared. */
export function sparkAxis(points: readonly WaterPoint[], limit: number): ValueAxis {
  const middles = points.map(({ freeChlorine }) => freeChlorine.middle);
  const lows = points.map(({ lowestLevel }) => lowestLevel);
  return valueAxis({
    low: Math.min(limit - 2, ...middles, ...lows) - 0.25,
    high: Math.max(limit, ...middles) + 0.6,
    height: sparkSize.height,
    above: 3,
    below: 3,
  });
}

type Props = {
  axis: TimeAxis;
  value: ValueAxis;
  points: readonly WaterPoint[];
  nights: readonly Stretch[];
  limit: number;
  doses: readonly ChartDose[];
};

/** One day of free chlorine in a row of a list. The row's words and the table say the same. */
export function Spark({ axis, value, points, nights, limit, doses }: Props) {
  const { width, height } = sparkSize;
  const within = points.filter(({ at }) => isOn(axis, at));
  const x = (at: number) => xOf(axis, width, at);
  const y = (level: number) => Math.min(height, Math.max(0, yOf(value, level)));
  const path = (level: (point: WaterPoint) => number, list = within) =>
    list.map((point) => `${x(point.at)} ${y(level(point))}`).join('L');
  const lowest = path(({ lowestLevel }) => lowestLevel);
  const limitY = y(limit);
  return (
    <svg
      width={width}
      height={height}
      viewBox={`0 0 ${width} ${height}`}
      aria-hidden="true"
      className="overflow-hidden"
    >
      {nights.map((night) => {
        const cut = cutTo(axis, night);
        return (
          cut && (
            <rect
              key={cut.from}
              x={x(cut.from)}
              y="0"
              width={x(cut.to) - x(cut.from)}
              height={height}
              className="fill-night"
            />
          )
        );
      })}
      <rect x="0" y={limitY - 4} width={width} height="4" fill={HATCH} opacity="0.5" />
      <path d={`M0 ${limitY}H${width}`} fill="none" className="stroke-ink" strokeWidth="1" />
      {within.length > 1 && (
        <g fill="none">
          <path d={`M${lowest}`} className="stroke-ink" strokeWidth="1" />
          <path d={`M${lowest}`} stroke={HATCH} strokeWidth="5" transform="translate(0 2.5)" opacity="0.5" />
          <path
            d={`M${path(({ freeChlorine }) => freeChlorine.high)}L${path(({ freeChlorine }) => freeChlorine.low, within.toReversed())}Z`}
            className="fill-band"
          />
          <path
            d={`M${path(({ freeChlorine }) => freeChlorine.middle)}`}
            className="stroke-teal"
            strokeWidth="2.2"
            strokeLinejoin="round"
          />
        </g>
      )}
      {doses.map((dose) => {
        const foot = doseFoot(points, dose);
        if (dose.moves !== 'freeChlorine' || foot === undefined || !isOn(axis, dose.at)) return null;
        return (
          <g key={dose.id} transform={`translate(${Math.min(width - 7, Math.max(7, x(dose.at)))} ${y(foot)})`}>
            <circle r="6.5" className="fill-paper-lift stroke-ink" strokeWidth="1.2" />
            <g transform="scale(0.46)">
              <GlyphShape mark={dose.glyph} />
            </g>
          </g>
        );
      })}
    </svg>
  );
}
