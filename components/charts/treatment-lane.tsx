'use client';

import { Area, Line, ReferenceArea, ReferenceLine } from 'recharts';
import { ChartWords } from './chart-words';
import { LaneChart, type LaneTime, layer, still } from './lane-chart';
import type { Reading } from './lane-cursor';
import { NotesLayer } from './notes-layer';
import { WAVES } from './patterns';
import { placeWords } from './place-words';
import { MorningBars, TreatmentDoses, TreatmentReadings } from './treatment-marks';
import { type TreatmentRow, treatmentRows } from './treatment-rows';
import { treatmentBoxes, type TreatmentGeometry, type TreatmentPhrases, treatmentWords } from './treatment-words';
import { ticksOf } from './value-axis';
import { LimitLines } from './water-lines';

export type TreatmentLaneProps = Omit<TreatmentGeometry, 'axis' | 'width' | 'now'> & {
  time: LaneTime;
  phrases: TreatmentPhrases;
  label: string;
  reading: Reading<TreatmentRow>;
};

/** Free chlorine since a procedure was opened: never over 10, each morning against its ordinary band. */
export function TreatmentLane({ time, phrases, label, reading, ...shown }: TreatmentLaneProps) {
  const { axis, width, now } = time;
  const { value, points, bars, readings, doses, maximum, swimLimit, lowestLevel } = shown;
  const geometry = { ...shown, axis, width, now };
  const bounds = { x: 0, y: 0, width, height: value.height };
  const words = placeWords(treatmentWords(phrases, geometry), treatmentBoxes(geometry), bounds);
  const ground = { axis, width, value };
  return (
    <LaneChart
      time={time}
      value={value}
      rows={treatmentRows(points, now)}
      label={label}
      reading={reading}
      notes={
        <NotesLayer width={width} height={value.height}>
          <MorningBars {...ground} bars={bars} />
          <ChartWords words={words} />
          <TreatmentDoses {...ground} doses={doses} points={points} />
          <TreatmentReadings {...ground} readings={readings} />
        </NotesLayer>
      }
    >
      {lowestLevel < swimLimit &&
        ['water', 'waves'].map((fill) => (
          <ReferenceArea
            key={fill}
            x1={axis.from}
            x2={axis.to}
            y1={lowestLevel}
            y2={swimLimit}
            className="text-water-2"
            fill={fill === 'water' ? 'currentColor' : WAVES}
            fillOpacity={1}
            zIndex={layer.water}
          />
        ))}
      {ticksOf(value, 36).map((figure) => (
        <ReferenceLine key={figure} y={figure} className="text-rule" stroke="currentColor" zIndex={layer.grid} />
      ))}
      <LimitLines limits={[{ ...axis, value: maximum, forbidden: 'above' }]} axis={value} />
      <LimitLines
        limits={[
          { ...axis, value: swimLimit, forbidden: 'above' },
          { ...axis, value: lowestLevel, forbidden: 'below' },
        ]}
        axis={value}
      />
      <Area
        {...still}
        dataKey={bandAhead}
        className="text-band"
        stroke="none"
        fill="currentColor"
        fillOpacity={1}
        zIndex={layer.band}
      />
      {(['behind', 'ahead'] as const).map((side) => (
        <Line
          key={side}
          {...still}
          dataKey={(row: TreatmentRow) => row[side]?.middle}
          className="text-teal"
          stroke="currentColor"
          strokeWidth={side === 'ahead' ? 2.6 : 1.7}
          strokeLinejoin="round"
          dot={false}
          zIndex={layer.curve}
        />
      ))}
    </LaneChart>
  );
}

function bandAhead({ ahead }: TreatmentRow): [number, number] | undefined {
  return ahead && [ahead.low, ahead.high];
}
