import { AppError, type FieldProblem } from '@/lib/errors';

/** Outline of the water from above [m]. `freeform`: a kidney, by its length and its two greatest widths. */
export type PoolOutline =
  | { shape: 'rectangle'; length: number; width: number }
  | { shape: 'oval'; length: number; width: number }
  | { shape: 'round'; diameter: number }
  | { shape: 'freeform'; length: number; widthA: number; widthB: number };

/** Depths of the water [m], not of the basin. */
export type PoolFloor =
  | { floor: 'flat'; depth: number }
  | { floor: 'slope'; shallow: number; deep: number }
  | { floor: 'drop-off'; shallow: number; deep: number };

export type PoolSize = { volume: number; meanDepth: number; area: number };

/** Shares of the length in a pool with a drop-off: shelf and deep part; the ramp between them takes the rest. */
const DROP_OFF = { shelf: 1 / 2, deep: 1 / 4 };

/**
 * Volume [m3], mean depth [m] and surface [m2] of a pool.
 *
 * Surface: rectangle L W; oval pi/4 L W; round pi/4 D^2; freeform 0.45 (A + B) L, the trade's rule for kidneys. Mean depth:
 * flat d; slope (shallow + deep) / 2; drop-off 1/2 shallow + 1/4 deep + 1/4 (shallow + deep) / 2, that is a shelf over
 * half of the length, a ramp over a quarter, a deep part over the last quarter.
 *
 * Range: every measure above 0, deep not less than shallow. Error: `invalid-input` naming each field that is not.
 * Uncertainty: exact for straight walls and the stated floor; the kidney rule is within about 10 %, the shares of a drop-off
 * move the mean depth by up to 15 %, so such a volume counts as estimated.
 * Source: geometry; kidney rule and check values in tests/reference/published-values.csv (VOL-*) and sources.md 12. The
 * shares of the drop-off are our assumption.
 */
export function poolSize(outline: PoolOutline, floor: PoolFloor): PoolSize {
  const problems = problemsOf(outline, floor);
  if (problems.length > 0) throw new AppError('invalid-input', 'These measures do not make a pool.', { problems });
  const area = areaOf(outline);
  const meanDepth = meanDepthOf(floor);
  return { volume: area * meanDepth, meanDepth, area };
}

function areaOf(outline: PoolOutline): number {
  switch (outline.shape) {
    case 'rectangle':
      return outline.length * outline.width;
    case 'oval':
      return (Math.PI / 4) * outline.length * outline.width;
    case 'round':
      return (Math.PI / 4) * outline.diameter ** 2;
    case 'freeform':
      return 0.45 * (outline.widthA + outline.widthB) * outline.length;
  }
}

function meanDepthOf(floor: PoolFloor): number {
  switch (floor.floor) {
    case 'flat':
      return floor.depth;
    case 'slope':
      return (floor.shallow + floor.deep) / 2;
    case 'drop-off': {
      const ramp = 1 - DROP_OFF.shelf - DROP_OFF.deep;
      return DROP_OFF.shelf * floor.shallow + DROP_OFF.deep * floor.deep + (ramp * (floor.shallow + floor.deep)) / 2;
    }
  }
}

function problemsOf(outline: PoolOutline, floor: PoolFloor): FieldProblem[] {
  const measures = Object.entries({ ...outline, ...floor }).filter((entry) => typeof entry[1] === 'number');
  const problems = measures
    .filter(([, value]) => !(Number(value) > 0 && Number.isFinite(value)))
    .map(([path]) => ({ path, message: 'Enter a length above zero.' }));
  if (floor.floor !== 'flat' && floor.deep < floor.shallow)
    problems.push({ path: 'deep', message: 'The deep end is at least as deep as the shallow end.' });
  return problems;
}
