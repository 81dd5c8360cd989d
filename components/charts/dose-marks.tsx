import type { ChartDose } from './chart-doses';
import { GlyphShape } from './product-glyph';
import { cutTo, isOn, type Stretch, type TimeAxis, xOf } from './time-axis';
import { type ValueAxis, yOf } from './value-axis';
import { type CurveQuantity, footOf, type WaterPoint } from './water-curve';

type Ground = { axis: TimeAxis; width: number; value: ValueAxis };

/** Swim hours of each day: a thin bracket under the limit. */
export function SwimHours({ hours, limit, axis, width, value }: Ground & { hours: readonly Stretch[]; limit: number }) {
  const y = yOf(value, limit) + 3;
  return hours.map((stretch) => {
    const cut = cutTo(axis, stretch);
    if (cut === undefined) return null;
    const [from, to] = [xOf(axis, width, cut.from), xOf(axis, width, cut.to)];
    return <path key={cut.from} d={`M${from} ${y}v5H${to}v-5`} fill="none" className="stroke-ink" strokeWidth="1" />;
  });
}

/** Where on its curve a dose goes in: at the foot of its jump. */
export function doseFoot(points: readonly WaterPoint[], { at, moves }: ChartDose): number | undefined {
  return moves && footOf(points, at)?.[moves].middle;
}

/** The product's glyph in a circle at the foot of each jump of one quantity. */
export function DoseCircles(
  props: Ground & { doses: readonly ChartDose[]; points: readonly WaterPoint[]; quantity: CurveQuantity },
) {
  const { doses, points, quantity, axis, width, value } = props;
  return doses.map((dose) => {
    const foot = doseFoot(points, dose);
    if (dose.moves !== quantity || foot === undefined || !isOn(axis, dose.at)) return null;
    return (
      <g key={dose.id} transform={`translate(${xOf(axis, width, dose.at)} ${yOf(value, foot)})`}>
        <circle r="9.5" className="fill-paper-lift stroke-ink" strokeWidth="1.3" />
        <g transform="scale(0.68)">
          <GlyphShape mark={dose.glyph} />
        </g>
      </g>
    );
  });
}

/** A projected meeting with a limit. */
export function MeetingMark({ at, meets, axis, width, value }: Ground & { at: number; meets: number }) {
  return (
    <path
      d="M-4.5 -4.5l9 9m0 -9l-9 9"
      transform={`translate(${xOf(axis, width, at)} ${yOf(value, meets)})`}
      fill="none"
      className="stroke-terra-ink"
      strokeWidth="2.4"
      strokeLinecap="round"
    />
  );
}

/** Where the water stands at this moment. */
export function NowDot({ at, level, axis, width, value }: Ground & { at: number; level: number }) {
  return (
    <circle
      cx={xOf(axis, width, at)}
      cy={yOf(value, level)}
      r="5.5"
      className="fill-teal stroke-paper-lift"
      strokeWidth="2"
    />
  );
}
