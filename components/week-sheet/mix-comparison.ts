import type { Mark } from '@/components/charts/product-glyph';
import type { Alternative } from '@/lib/schemas/plan';
import type { WeekSheet } from '@/lib/schemas/week-sheet';

const burdens = ['money', 'visits', 'swing', 'stabilizer', 'hardness', 'kilograms'] as const;
export type Burden = (typeof burdens)[number];
export type Mix = Alternative['kind'] | 'mix';

export const markOf: Record<Mix, Mark> = { tablets: 'tablet', granular: 'granules', liquid: 'liquid', mix: 'mix' };

/** One burden of the ways that are possible; further left is easier. A way whose value the reply lacks has no place. */
export type BurdenRow = { burden: Burden; values: Partial<Record<Mix, number>> };

export function burdenRows(sheet: WeekSheet): BurdenRow[] {
  const { plan } = sheet;
  if (!plan?.mix) return [];
  const { mix } = plan;
  const possible = plan.alternatives.filter(isPossible);
  return burdens
    .map((burden) => {
      const others = possible.map((alternative) => [alternative.kind, alternative[burden]] as const);
      return { burden, values: { ...Object.fromEntries(others), mix: mix[burden] } };
    })
    .filter(({ values }) => Object.keys(values).length > 1);
}

/** A way without any dose could not be planned from this shelf. */
export function isPossible({ feasible, doses }: Alternative): boolean {
  return feasible || doses.length > 0;
}

export type PlacedMark = { mix: Mix; x: number };

/** Marks closer than this would touch; in a crowd they stand this far apart. */
const TOUCHING = 12;
const APART = 14.5;

/** Where the marks of a row stand on a track of a width [px]: by value, and side by side where values are alike. */
export function placeMarks({ values }: BurdenRow, width: number, margin = 8): PlacedMark[] {
  const entries = Object.entries(values) as [Mix, number][];
  const [low, high] = [Math.min(...entries.map(([, value]) => value)), Math.max(...entries.map(([, value]) => value))];
  const share = (value: number) => (high === low ? 0 : (value - low) / (high - low));
  const marks = entries
    .map(([mix, value]) => ({ mix, x: margin + share(value) * (width - 2 * margin) }))
    .toSorted((a, b) => a.x - b.x);
  const crowds = marks.reduce<PlacedMark[][]>((done, mark) => {
    const crowd = done.at(-1);
    const last = crowd?.at(-1);
    return crowd && last && mark.x - last.x < TOUCHING ? [...done.slice(0, -1), [...crowd, mark]] : [...done, [mark]];
  }, []);
  return crowds.flatMap((crowd) => spread(crowd, width, margin));
}

function spread(crowd: PlacedMark[], width: number, margin: number): PlacedMark[] {
  const half = ((crowd.length - 1) * APART) / 2;
  const centre = crowd.reduce((sum, { x }) => sum + x, 0) / crowd.length;
  const held = Math.min(Math.max(centre, margin + half), width - margin - half);
  return crowd.map(({ mix }, index) => ({ mix, x: held - half + index * APART }));
}
