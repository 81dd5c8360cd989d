import { describe, expect, it } from 'vitest';
import { curveColumns } from '@/components/help/how/curve-columns';
import { examples } from '@/lib/client/worked-out/examples/all-examples';
import type { Curve } from '@/lib/client/worked-out/examples/curve';

const axis = { low: 0, high: 2, unit: 'none', decimals: 0, ticks: [] } as const;
const curve: Curve = {
  across: axis,
  up: axis,
  lines: [
    {
      name: 'freeChlorine',
      mark: 'chlorine',
      points: [
        [0, 3],
        [1, 2],
        [2, 1],
      ],
    },
    { name: 'stripRange', mark: 'before', points: [[0, 2]] },
    { name: 'stripRange', mark: 'before', points: [[0, 4]] },
  ],
  ranges: [{ name: 'kitRange', low: [[0, 2.5]], high: [[0, 3.5]] }],
  taken: [{ at: 0, parts: [{ name: 'takenBySun', value: 0.7 }] }],
};

describe('the columns of a drawn example', () => {
  it('hold its lines, the edges of its ranges, and what took chlorine', () => {
    const columns = curveColumns(curve, [0, 2]);
    expect(columns.map(({ name, edge, valueAt }) => [name, edge, valueAt(0)])).toEqual([
      ['freeChlorine', undefined, 3],
      ['stripRange', 'from', 2],
      ['stripRange', 'to', 4],
      ['kitRange', 'from', 2.5],
      ['kitRange', 'to', 3.5],
      ['takenBySun', undefined, 0.7],
    ]);
    expect(columns[0]?.valueAt(1)).toBe(1);
    expect(columns.at(-1)?.valueAt(1)).toBeUndefined();
  });

  it.each(Object.entries(examples))('of %s leave out no line that is drawn', (_page, example) => {
    const drawn = example?.work(example.inputs.map(({ start }) => start)).curve;
    if (drawn === undefined) return;
    const columns = curveColumns(drawn, [drawn.across.low]);
    const wanted = drawn.lines.length + 2 * (drawn.ranges?.length ?? 0) + (drawn.taken?.[0]?.parts.length ?? 0);
    expect(columns).toHaveLength(wanted);
    expect(new Set(columns.map(({ name, edge }) => `${name} ${edge}`)).size).toBe(wanted);
  });
});
