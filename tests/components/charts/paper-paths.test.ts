import { describe, expect, it } from 'vitest';
import { areaPath, linePath } from '@/components/charts/paper-paths';
import { valueAxis } from '@/components/charts/value-axis';

const ground = {
  axis: { from: 0, to: 100 },
  width: 200,
  value: valueAxis({ low: 0, high: 10, height: 100, above: 0, below: 0 }),
};
const points = [
  { at: 0, low: 1, middle: 2, high: 3 },
  { at: 50, low: 4, middle: 5, high: 6 },
];

describe('the paths of a chart on paper', () => {
  it('lead a line through its points, later to the right and more higher up', () => {
    expect(linePath(points, ({ middle }) => middle, ground)).toBe('M0 80L100 50');
  });

  it('close an area along its upper edge and back along its lower one', () => {
    expect(areaPath(points, { low: ({ low }) => low, high: ({ high }) => high }, ground)).toBe(
      'M0 70L100 40L100 60L0 90Z',
    );
  });

  it('are empty without a curve', () => {
    expect(linePath([], () => 0, ground)).toBe('');
    expect(areaPath([], { low: () => 0, high: () => 0 }, ground)).toBe('');
  });
});
