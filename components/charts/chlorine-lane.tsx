'use client';

import type { ChartDose } from './chart-doses';
import type { ChartRow } from './chart-rows';
import { ChartWords } from './chart-words';
import { ChlorineChart } from './chlorine-chart';
import { DoseCircles, MeetingMark, NowDot, SwimHours } from './dose-marks';
import type { LaneTime } from './lane-chart';
import { LikelyLeader } from './likely-leader';
import { NotesLayer } from './notes-layer';
import { type Box, placeWords } from './place-words';
import type { ChartTest } from './test-marks';
import { isOn, type Stretch } from './time-axis';
import type { ValueAxis } from './value-axis';
import { waterAt, type WaterPoint } from './water-curve';
import type { Limit } from './water-lines';
import { takenBoxes, type WeekPhrases, weekWords } from './week-words';

export type ChlorineLaneProps = {
  time: LaneTime;
  value: ValueAxis;
  rows: ChartRow[];
  points: readonly WaterPoint[];
  limits: readonly Limit[];
  /** The limit of the household, where the words and the brackets hang. */
  swimLimit: number;
  swimHours: readonly Stretch[];
  doses: readonly ChartDose[];
  tests: readonly ChartTest[];
  planEndsAt: number | undefined;
  phrases: WeekPhrases;
  label: string;
};

/** The week's free chlorine with everything that is said about it. */
export function ChlorineLane(props: ChlorineLaneProps) {
  const { time, value, rows, points, limits, swimLimit, swimHours, doses, tests, planEndsAt, phrases, label } = props;
  const { axis, width, now } = time;
  const geometry = { axis, width, value, points, now, limit: swimLimit, doses, tests, planEndsAt };
  const bounds: Box = { x: 0, y: 0, width, height: value.height };
  const words = placeWords(weekWords(phrases, geometry), takenBoxes(geometry), bounds);
  const ground = { axis, width, value };
  const levelNow = isOn(axis, now) ? waterAt(points, now)?.freeChlorine.middle : undefined;
  return (
    <ChlorineChart
      time={time}
      value={value}
      rows={rows}
      limits={limits}
      tests={tests}
      label={label}
      notes={
        <NotesLayer width={width} height={value.height}>
          <SwimHours {...ground} hours={swimHours} limit={swimLimit} />
          <LikelyLeader {...ground} words={words.find(({ id }) => id === 'likely')} points={points} />
          <ChartWords words={words} figure="text-teal-ink" />
          {phrases.meets && <MeetingMark {...ground} at={phrases.meets.at} meets={phrases.meets.value} />}
          <DoseCircles {...ground} doses={doses} points={points} quantity="freeChlorine" />
          {levelNow !== undefined && <NowDot {...ground} at={now} level={levelNow} />}
        </NotesLayer>
      }
    />
  );
}
