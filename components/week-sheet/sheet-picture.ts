import { type ChartRow, rowsOf } from '@/components/charts/chart-rows';
import type { Stretch, TimeAxis } from '@/components/charts/time-axis';
import {
  courseOf,
  pointsOf,
  type WaterCourse,
  type WaterPoint,
  wholeCourse,
  withJumps,
} from '@/components/charts/water-curve';
import type { Limit } from '@/components/charts/water-lines';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { doseInstant } from './dose-state';
import { axisOf, daysOf, instantOf, nightsOf, type SheetDay, swimHoursOf } from './sheet-times';

/** A sheet in instants and points: what all lanes draw from. */
export type SheetPicture = {
  axis: TimeAxis;
  now: number;
  days: SheetDay[];
  nights: Stretch[];
  swimHours: Stretch[];
  rows: ChartRow[];
  /** Behind and ahead in one, in the order of time. */
  points: WaterPoint[];
  swimLimits: Limit[];
  /** Undefined while there is no plan that could be drawn. */
  planEndsAt: number | undefined;
  /** The first hour ahead at which the water is expected to meet a limit. */
  meeting: Meeting | undefined;
};

type Meeting = { at: number; value: number; limit: 'lowest-level' | 'swim-limit' };

export function pictureOf(sheet: WeekSheet): SheetPicture {
  const days = daysOf(sheet);
  const axis = axisOf(days);
  const now = instantOf(sheet.now);
  const course = courseOn(sheet, axis);
  const points = wholeCourse(course);
  const swimHours = swimHoursOf(days, sheet);
  return {
    axis,
    now,
    days,
    nights: nightsOf(days),
    swimHours,
    rows: rowsOf(course),
    points,
    swimLimits: swimLimitsOf(points, sheet.pool.swimLimit, axis),
    planEndsAt: sheet.plan && sheet.ahead ? instantOf(sheet.plan.endsAt) : undefined,
    meeting: meetingOf(course.ahead, swimHours),
  };
}

/** Both curves of a sheet on an axis, with the jumps of its doses where they belong. */
export function courseOn(sheet: WeekSheet, axis: TimeAxis): WaterCourse {
  const jumps = sheet.doses.filter(({ form, status }) => form !== 'tablet' && status !== 'skipped').map(doseInstant);
  const [behind, ahead] = [sheet.behind, sheet.ahead].map((curve) => withJumps(pointsOf(curve), jumps));
  return courseOf(behind ?? [], ahead ?? [], instantOf(sheet.now), axis);
}

/** The limit as it held hour by hour; where no curve says, the household's limit of today. */
function swimLimitsOf(points: readonly WaterPoint[], limitToday: number, axis: TimeAxis): Limit[] {
  const steps = [
    { at: axis.from, value: points[0]?.swimLimit ?? limitToday },
    ...points.map(({ at, swimLimit }) => ({ at, value: swimLimit })),
  ];
  const changes = steps.filter(({ value }, index) => index === 0 || value !== steps[index - 1]?.value);
  return changes.map(({ at, value }, index) => ({
    from: at,
    to: changes[index + 1]?.at ?? axis.to,
    value,
    forbidden: 'above',
  }));
}

function meetingOf(ahead: readonly WaterPoint[], swimHours: readonly Stretch[]): Meeting | undefined {
  const swimming = (at: number) => swimHours.some(({ from, to }) => at >= from && at < to);
  for (const { at, freeChlorine, lowestLevel, swimLimit } of ahead) {
    if (freeChlorine.middle < lowestLevel) return { at, value: lowestLevel, limit: 'lowest-level' };
    if (freeChlorine.middle > swimLimit && swimming(at)) return { at, value: swimLimit, limit: 'swim-limit' };
  }
  return undefined;
}
