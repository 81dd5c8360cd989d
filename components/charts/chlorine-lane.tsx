'use client';

import type { ChartDose } from './chart-doses';
import type { ChartRow } from './chart-rows';
import { ChartWords } from './chart-words';
import { ChlorineChart } from './chlorine-chart';
import { dayWords } from './day-words';
import { DoseCircles, MeetingMark, NowDot, SwimHours } from './dose-marks';
import type { LaneTime } from './lane-chart';
import type { Reading } from './lane-cursor';
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
  /** Seven days on a desk, or one day on a phone. */
  span: 'week' | 'day';
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
  reading: Reading<ChartRow>;
};

/** Free chlorine with everything that is said about it. */
export function ChlorineLane(props: ChlorineLaneProps) {
  const { span, time, value, rows, points, limits, swimLimit, swimHours, doses, tests, planEndsAt, phrases } = props;
  const { axis, width, now } = time;
  const geometry = { axis, width, value, points, now, limit: swimLimit, doses, tests, planEndsAt };
  const bounds: Box = { x: 0, y: 0, width, height: value.height };
  const wanted = span === 'week' ? weekWords(phrases, geometry) : dayWords(phrases, geometry);
  const words = placeWords(wanted, takenBoxes(geometry), bounds);
  const ground = { axis, width, value };
  const levelNow = isOn(axis, now) ? waterAt(points, now)?.freeChlorine.middle : undefined;
  const { meets } = phrases;
  return (
    <ChlorineChart
      time={time}
      value={value}
      rows={rows}
      limits={limits}
      tests={tests}
      label={props.label}
      reading={props.reading}
      thicker={span === 'day' ? 0.4 : 0}
      byFinger={span === 'day'}
      notes={
        <NotesLayer width={width} height={value.height}>
          <SwimHours {...ground} hours={swimHours} limit={swimLimit} />
          <LikelyLeader {...ground} words={words.find(({ id }) => id === 'likely')} points={points} />
          <ChartWords words={words} />
          {meets && isOn(axis, meets.at) && <MeetingMark {...ground} at={meets.at} meets={meets.value} />}
          <DoseCircles {...ground} doses={doses} points={points} quantity="freeChlorine" />
          {levelNow !== undefined && <NowDot {...ground} at={now} level={levelNow} />}
        </NotesLayer>
      }
    />
  );
}
