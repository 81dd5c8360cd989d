import type { ChartDose } from './chart-doses';
import { ChartWords } from './chart-words';
import { DoseCircles, doseFoot, SwimHours } from './dose-marks';
import { areaPath, linePath, type PaperGround } from './paper-paths';
import { HATCH } from './patterns';
import { STIPPLE } from './paper-patterns';
import type { PaperPhrases } from './paper-words';
import { paperWords } from './paper-words';
import { placeWords } from './place-words';
import type { ChartTest } from './test-marks';
import { isOn, type Stretch, xOf } from './time-axis';
import { ticksOf, yOf } from './value-axis';
import type { WaterPoint } from './water-curve';
import type { Limit } from './water-lines';
import { takenBoxes } from './week-words';

type Props = {
  ground: PaperGround;
  points: readonly WaterPoint[];
  now: number;
  limits: readonly Limit[];
  swimLimit: number;
  swimHours: readonly Stretch[];
  doses: readonly ChartDose[];
  tests: readonly ChartTest[];
  planEndsAt: number | undefined;
  /** Where the page stops being good. */
  endsAt: number | undefined;
  phrases: PaperPhrases;
};

const HATCH_HEIGHT = 6;

/** Free chlorine in ink alone: the likely range stippled, the limits hatched, doses on their plumb lines. */
export function PaperChlorine(props: Props) {
  const { ground, points, now, limits, swimLimit, swimHours, doses, tests, planEndsAt, endsAt, phrases } = props;
  const { axis, width, value } = ground;
  const geometry = { ...ground, points, now, limit: swimLimit, doses, tests, planEndsAt };
  const bounds = { x: 0, y: 0, width, height: value.height };
  const words = placeWords(paperWords(phrases, geometry, endsAt), takenBoxes(geometry), bounds);
  const likely = {
    low: (point: WaterPoint) => point.freeChlorine.low,
    high: (point: WaterPoint) => point.freeChlorine.high,
  };
  const hatched = {
    low: ({ lowestLevel }: WaterPoint) => lowestLevel - HATCH_HEIGHT / value.perUnit,
    high: ({ lowestLevel }: WaterPoint) => lowestLevel,
  };
  return (
    <>
      {ticksOf(value).map((level) => (
        <path
          fill="none"
          key={level}
          d={`M0 ${yOf(value, level)}H${width}`}
          className="stroke-ink"
          strokeWidth="0.7"
          strokeDasharray="0.7 5"
        />
      ))}
      <path d={areaPath(points, likely, ground)} fill={STIPPLE} className="stroke-ink" strokeWidth="0.5" />
      <path d={areaPath(points, hatched, ground)} fill={HATCH} />
      <path d={linePath(points, hatched.high, ground)} fill="none" className="stroke-ink" strokeWidth="1.25" />
      {limits.map(({ from, to, value: limit }) => {
        const [x, y] = [xOf(axis, width, from), yOf(value, limit)];
        const reach = xOf(axis, width, to) - x;
        return (
          <g key={from}>
            <rect x={x} y={y - HATCH_HEIGHT} width={reach} height={HATCH_HEIGHT} fill={HATCH} />
            <path fill="none" d={`M${x} ${y}h${reach}`} className="stroke-ink" strokeWidth="1.25" />
          </g>
        );
      })}
      <SwimHours {...ground} hours={swimHours} limit={swimLimit} />
      <path
        d={linePath(points, (point) => point.freeChlorine.middle, ground)}
        fill="none"
        className="stroke-ink"
        strokeWidth="2.3"
        strokeLinejoin="round"
      />
      <PlumbLines ground={ground} doses={doses} points={points} />
      <Tests ground={ground} tests={tests} />
      <DoseCircles {...ground} doses={doses} points={points} quantity="freeChlorine" />
      <ChartWords words={words} />
    </>
  );
}

function PlumbLines({ ground, doses, points }: Pick<Props, 'ground' | 'doses' | 'points'>) {
  const { axis, width, value } = ground;
  return doses.map((dose) => {
    const foot = dose.moves === 'freeChlorine' ? doseFoot(points, dose) : undefined;
    if (foot === undefined || !isOn(axis, dose.at)) return null;
    return (
      <path
        fill="none"
        key={dose.id}
        d={`M${xOf(axis, width, dose.at)} ${yOf(value, foot)}V${value.height}`}
        className="stroke-ink"
        strokeWidth="1.2"
        strokeDasharray={dose.given ? undefined : '2 3'}
      />
    );
  });
}

/** A hollow dot with its whisker; of a strip read between two steps the I-bar alone. */
function Tests({ ground: { axis, width, value }, tests }: Pick<Props, 'ground' | 'tests'>) {
  return tests.map(({ id, at, value: middle, spread, between }) => {
    if (!isOn(axis, at)) return null;
    const [low, high] = [between?.low ?? middle - spread, between?.high ?? middle + spread];
    const x = xOf(axis, width, at);
    return (
      <g key={id} className="stroke-ink" fill="none" strokeWidth="1.3">
        <path fill="none" d={`M${x} ${yOf(value, low)}V${yOf(value, high)}m-3 0h6M${x - 3} ${yOf(value, low)}h6`} />
        {between === undefined && (
          <circle cx={x} cy={yOf(value, middle)} r="4" className="fill-paper stroke-ink" strokeWidth="1.6" />
        )}
      </g>
    );
  });
}
