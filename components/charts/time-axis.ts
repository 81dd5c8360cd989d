/** The stretch of time that all lanes share, first instant to last [ms]. A week of a clock change has 167 or 169 hours. */
export type TimeAxis = { from: number; to: number };
/** Instants [ms], `to` excluded. */
export type Stretch = { from: number; to: number };

/** Where an instant stands on the axis, 0 at its left end and 1 at its right end: by elapsed time, never by the clock. */
export function shareOf(axis: TimeAxis, instant: number): number {
  return (instant - axis.from) / (axis.to - axis.from);
}

/** The same in pixels of a plot. */
export function xOf(axis: TimeAxis, width: number, instant: number): number {
  return shareOf(axis, instant) * width;
}

export function isOn(axis: TimeAxis, instant: number): boolean {
  return instant >= axis.from && instant <= axis.to;
}

/** The part of a stretch that lies on the axis; undefined when none does. */
export function cutTo(axis: TimeAxis, { from, to }: Stretch): Stretch | undefined {
  const cut = { from: Math.max(from, axis.from), to: Math.min(to, axis.to) };
  return cut.from < cut.to ? cut : undefined;
}
