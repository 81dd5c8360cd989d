import type { ExampleUnit, FigureName } from './names';

/** How a line is drawn; the marks are those of the week sheet. */
export type Mark = 'chlorine' | 'pH' | 'stabilizer' | 'ink' | 'before';

export type Point = readonly [across: number, up: number];
export type Line = { name: FigureName; mark: Mark; points: readonly Point[] };
/** A likely range: its lower and upper edge at the same places. */
export type Range = { name: FigureName; low: readonly Point[]; high: readonly Point[] };
export type Level = { name: FigureName; at: number; forbidden?: 'above' | 'below' };

export type Axis = { low: number; high: number; unit: ExampleUnit; decimals: number; ticks: readonly number[] };

/** What took chlorine in each hour, hung under the curve. */
export type Taken = readonly { at: number; parts: readonly { name: FigureName; value: number }[] }[];

export type Curve = {
  across: Axis;
  up: Axis;
  lines: readonly Line[];
  ranges?: readonly Range[];
  levels?: readonly Level[];
  taken?: Taken;
};

/** Points of a function at equal steps, both ends included. */
export function pointsOf(low: number, high: number, steps: number, up: (across: number) => number): Point[] {
  return Array.from({ length: steps + 1 }, (_, step): Point => {
    const across = low + ((high - low) * step) / steps;
    return [across, up(across)];
  });
}

/** Equal steps from low to high, both ends included. */
export function ticksOf(low: number, high: number, step: number): number[] {
  return Array.from({ length: Math.round((high - low) / step) + 1 }, (_, index) => low + index * step);
}

/** The least round height over all points: an axis that moves in steps does not jump with every move of a slider. */
export function roundHeight(highest: number, steps: readonly number[]): number {
  return steps.find((step) => highest <= step) ?? highest;
}
