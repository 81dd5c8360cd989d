import type { Axis, Point } from '@/lib/client/worked-out/examples/curve';

/** Where on an axis a value lies, 0 at its low end and 1 at its high. */
export function shareOf(value: number, { low, high }: Pick<Axis, 'low' | 'high'>): number {
  return (value - low) / (high - low);
}

/** Hundredths: more would only make the page longer. */
const round = (value: number) => Math.round(value * 100) / 100;

/** A share as the style of a place. Rounded too: server and browser differ in the last digits, and their pages must not. */
export function percentOf(share: number): string {
  return `${round(100 * share)}%`;
}

/** A path through points in a box of 100 by 100, up being up. */
export function pathOf(points: readonly Point[], across: Axis, up: Axis): string {
  const at = ([x, y]: Point) => `${round(100 * shareOf(x, across))} ${round(100 * (1 - shareOf(y, up)))}`;
  return `M${points.map(at).join('L')}`;
}
