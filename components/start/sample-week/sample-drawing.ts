import type { SampleWeek } from '@/lib/schemas/sample-water';

export const weekHours = 168;
export const weekDays = [0, 1, 2, 3, 4, 5, 6] as const;
/** The lane reaches so high at least [mg/L]; free chlorine begins at nothing. */
const LEAST_TOP = 6;

/** The level at the top of the lane: a whole one that holds the likely range. */
export function topOf({ course }: SampleWeek): number {
  return Math.max(LEAST_TOP, Math.ceil(Math.max(...course.high)));
}

/** Share of the width [%]. */
export const across = (hour: number) => rounded((hour / weekHours) * 100);

/** Share of the height, from the top [%]. */
export const down = (level: number, top: number) => rounded((1 - level / top) * 100);

/** A level at each hour from 0 on. */
type Line = readonly number[];

/** A line in a drawing that is `weekHours` wide and 100 high. */
export function pathOf(line: Line, top: number): string {
  return `M${line.map((level, hour) => `${hour} ${down(level, top)}`).join('L')}`;
}

/** The area between two lines. */
export function areaOf(upper: Line, lower: Line, top: number): string {
  const back = lower.map((level, hour) => `${hour} ${down(level, top)}`).toReversed();
  return `${pathOf(upper, top)}L${back.join('L')}Z`;
}

/** Hours from one point to the next where CSS cuts an area out: the lowest level hardly moves in them. */
const CUT_EVERY = 6;

/** The area between two lines as CSS cuts it out of a box. */
export function cutOf(upper: Line, lower: Line, top: number): string {
  const points = (line: Line) =>
    line.flatMap((level, hour) =>
      hour % CUT_EVERY === 0 || hour === line.length - 1 ? `${across(hour)}% ${down(level, top)}%` : [],
    );
  return `polygon(${[...points(upper), ...points(lower).toReversed()].join(',')})`;
}

/** The middle of the course at an hour. */
export function levelAt({ course: { middle } }: SampleWeek, hour: number): number {
  return middle[Math.min(Math.floor(hour), middle.length - 1)] ?? 0;
}

/** Evenings on which something goes in, as days from Monday. */
export function eveningsOf({ doses }: SampleWeek): number[] {
  return [...new Set(doses.map(({ hour }) => dayOf(hour)))];
}

/** The shape that stands for each form. */
export const glyphs = { tablet: 'tablet', granular: 'granules', liquid: 'liquid', other: 'granules' } as const;

export const dayOf = (hour: number) => Math.floor(hour / 24);

function rounded(share: number): number {
  return Math.round(share * 10) / 10;
}
