export type Point = { x: number; y: number };

/** Shorter than this a finger has slipped [px]. */
const FAR = 60;
/** A swipe runs at least so many times as far sideways as it does up or down: anything else is scrolling. */
const STEEPEST = 2;

/** Which way a finger has swiped: to the left brings what comes next. */
export function swipeOf(from: Point, to: Point): 'previous' | 'next' | undefined {
  const [across, down] = [to.x - from.x, Math.abs(to.y - from.y)];
  if (Math.abs(across) <= FAR || Math.abs(across) < STEEPEST * down) return undefined;
  return across < 0 ? 'next' : 'previous';
}
