import type { SampleWeek } from '@/lib/schemas/sample-water';

export const weekHours = 168;
export const weekDays = [0, 1, 2, 3, 4, 5, 6] as const;
/** The lane reaches so high at least [mg/L]; free chlorine begins at nothing. */
const LEAST_TOP = 6;

/** The level at the top of the lane: a whole one that holds the likely range. */
export function topOf({ course }: SampleWeek): number {
  return Math.max(LEAST_TOP, ...course.map(({ high }) => Math.ceil(high)));
}

/** Share of the width [%]. */
export const across = (hour: number) => rounded((hour / weekHours) * 100);

/** Share of the height, from the top [%]. */
export const down = (level: number, top: number) => rounded((1 - level / top) * 100);

type Point = { hour: number; level: number };

export function pathOf(points: readonly Point[], top: number): string {
  return `M${points.map(({ hour, level }) => `${across(hour)} ${down(level, top)}`).join('L')}`;
}

/** The area between a line and a level or another line, closed. */
export function areaOf(upper: readonly Point[], lower: readonly Point[], top: number): string {
  return `${pathOf([...upper, ...lower.toReversed()], top)}Z`;
}

/** The same area as CSS cuts it out of a box. */
export function cutOf(upper: readonly Point[], lower: readonly Point[], top: number): string {
  const points = [...upper, ...lower.toReversed()];
  return `polygon(${points.map(({ hour, level }) => `${across(hour)}% ${down(level, top)}%`).join(',')})`;
}

/** One line of a course. */
export function lineOf({ course }: SampleWeek, line: 'low' | 'middle' | 'high' | 'lowest'): Point[] {
  return course.map((point) => ({ hour: point.hour, level: point[line] }));
}

/** The middle of the course at an hour. */
export function levelAt({ course }: SampleWeek, hour: number): number {
  return (course.findLast((point) => point.hour <= hour) ?? course[0])?.middle ?? 0;
}

/** Evenings on which something goes in, as days from Monday. */
export function eveningsOf({ doses }: SampleWeek): number[] {
  return [...new Set(doses.map(({ hour }) => dayOf(hour)))];
}

export const dayOf = (hour: number) => Math.floor(hour / 24);

function rounded(share: number): number {
  return Math.round(share * 100) / 100;
}
