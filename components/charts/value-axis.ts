/** A vertical axis drawn without margins: the room above and below the values belongs to the axis itself. */
export type ValueAxis = {
  low: number;
  high: number;
  height: number;
  /** What the whole height stands for, bottom to top. */
  domain: [bottom: number, top: number];
  /** Pixels for one unit. */
  perUnit: number;
};

type Shape = { low: number; high: number; height: number; above: number; below: number };

/** An axis from `low` to `high` in a lane of a height [px] that keeps `above` and `below` [px] free for words. */
export function valueAxis({ low, high, height, above, below }: Shape): ValueAxis {
  const perUnit = (height - above - below) / (high - low);
  return { low, high, height, perUnit, domain: [low - below / perUnit, high + above / perUnit] };
}

/** Pixels from the top of the lane. */
export function yOf(axis: ValueAxis, value: number): number {
  return (axis.domain[1] - value) * axis.perUnit;
}

/** 1, 2, 3 ... from `low` to `high` of an axis, in steps that leave figures room to be read. */
export function ticksOf({ low, high, perUnit }: ValueAxis, roomForFigure = 24): number[] {
  const step = [0.1, 0.2, 0.5, 1, 2, 5, 10, 20, 50, 100].find((size) => size * perUnit >= roomForFigure) ?? 200;
  const first = Math.ceil(low / step);
  return Array.from({ length: Math.floor(high / step) - first + 1 }, (_, index) => (first + index) * step);
}
