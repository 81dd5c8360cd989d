import type { PoolFloor, PoolOutline } from '@/lib/units/volume';

/** Everything the drawing needs [m]; a round pool is as wide as it is long, a flat floor has one depth. */
export type DrawnPool = {
  shape: PoolOutline['shape'];
  length: number;
  width: number;
  /** Second width of a freeform pool; as `width` for the others. */
  secondWidth: number;
  floor: PoolFloor['floor'];
  shallow: number;
  deep: number;
};

/** What is measured, and can be pulled in the drawing. */
export type Measure = 'length' | 'width' | 'secondWidth' | 'shallow' | 'deep';

/** Stands in the drawing, dotted, until the tape measure has been there [m]. */
export const placeholder: Record<Measure, number> = { length: 8, width: 4, secondWidth: 4, shallow: 1.2, deep: 1.8 };

/** Greatest width seen from above [m]. */
export function breadth({ shape, width, secondWidth }: DrawnPool): number {
  return shape === 'freeform' ? Math.max(width, secondWidth) : width;
}

/** Depths along the length, as shares of it and metres: shelf, ramp and deep part as the volume counts them. */
export function floorLine({ floor, shallow, deep }: DrawnPool): readonly (readonly [share: number, depth: number])[] {
  if (floor !== 'drop-off')
    return [
      [0, shallow],
      [1, deep],
    ];
  return [
    [0, shallow],
    [0.5, shallow],
    [0.75, deep],
    [1, deep],
  ];
}
