import { expect, it } from 'vitest';
import { drawnCheck, drawnDoses, drawnWeek } from '@/components/start/drawn-week';

it('draws a week that keeps its own promise', () => {
  expect(drawnWeek).toHaveLength(169);
  for (const { height, low, high } of drawnWeek) {
    expect(low).toBeGreaterThan(0);
    expect(high).toBeLessThan(1);
    expect(height).toBeGreaterThan(low);
  }
});

it('falls by day, rests by night, and rises after a dose', () => {
  const at = (hour: number) => drawnWeek[hour]?.height ?? 0;
  expect(at(18)).toBeLessThan(at(8));
  expect(at(29)).toBeCloseTo(at(23), 10);
  for (const { hour } of drawnDoses) expect(at(hour + 3)).toBeGreaterThan(at(hour) + 0.2);
});

it('is surest right after a test', () => {
  const width = (hour: number) => (drawnWeek[hour]?.high ?? 0) - (drawnWeek[hour]?.low ?? 0);
  expect(width(100)).toBeGreaterThan(width(20));
  expect(width(drawnCheck)).toBeCloseTo(width(0), 10);
});
