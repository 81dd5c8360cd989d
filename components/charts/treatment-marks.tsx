import { GlyphShape } from './product-glyph';
import { isOn, type TimeAxis, xOf } from './time-axis';
import {
  type MorningBar,
  type TreatmentDose,
  treatmentFoot,
  type TreatmentPoint,
  type TreatmentReading,
} from './treatment-rows';
import { BAR } from './treatment-words';
import { type ValueAxis, yOf } from './value-axis';

type Ground = { axis: TimeAxis; width: number; value: ValueAxis };

/** The ordinary band of each morning: a bar whose two ends are drawn. */
export function MorningBars({ bars, axis, width, value }: Ground & { bars: readonly MorningBar[] }) {
  return bars.map(({ at, low, high }) => {
    if (!isOn(axis, at)) return null;
    const [x, top, bottom] = [xOf(axis, width, at) - BAR, yOf(value, high), yOf(value, low)];
    return (
      <g key={at} data-mark="ordinary-band">
        <rect x={x} y={top} width={2 * BAR} height={bottom - top} className="fill-band" />
        <path
          d={`M${x} ${top}h${2 * BAR}M${x} ${bottom}h${2 * BAR}`}
          fill="none"
          className="stroke-teal"
          strokeWidth="1.6"
        />
      </g>
    );
  });
}

/** Readings: hollow inside the band, filled outside it, hollow too where no band says. */
export function TreatmentReadings({
  readings,
  axis,
  width,
  value,
}: Ground & { readings: readonly TreatmentReading[] }) {
  return readings.map(({ at, value: level, inside }) =>
    isOn(axis, at) ? (
      <circle
        key={at}
        data-mark={inside === false ? 'outside' : 'inside'}
        cx={xOf(axis, width, at)}
        cy={yOf(value, level)}
        r="4.6"
        className={inside === false ? 'fill-ink stroke-ink' : 'fill-paper-lift stroke-ink'}
        strokeWidth="1.8"
      />
    ) : null,
  );
}

/** Each dose: a plumb line down to its day's steps and a circle at the foot of its jump, dashed while it is planned. */
export function TreatmentDoses(props: Ground & { doses: readonly TreatmentDose[]; points: readonly TreatmentPoint[] }) {
  const { doses, points, axis, width, value } = props;
  return doses.map(({ at, given, glyph }) => {
    const foot = treatmentFoot(points, at);
    if (foot === undefined || !isOn(axis, at)) return null;
    const [x, y] = [xOf(axis, width, at), yOf(value, foot)];
    return (
      <g key={at} className="stroke-ink">
        <path d={`M${x} ${value.height}V${y}`} fill="none" strokeWidth="1.1" strokeDasharray={given ? 'none' : '2 3'} />
        <g transform={`translate(${x} ${y})`}>
          <circle r="9.5" className="fill-paper-lift" strokeWidth="1.3" strokeDasharray={given ? 'none' : '2 2.5'} />
          {glyph && (
            <g transform="scale(0.66)">
              <GlyphShape mark={glyph} />
            </g>
          )}
        </g>
      </g>
    );
  });
}
