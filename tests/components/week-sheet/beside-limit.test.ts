import { expect, it } from 'vitest';
import { besideLimit } from '@/components/week-sheet/beside-limit';

it.each([
  [1.6, 2, '1.6', '2.0'],
  [2.16, 2.2, '2.16', '2.20'],
  [7.198, 7.2, '7.198', '7.200'],
  [7.19996, 7.2, '7.2', '7.2'],
])('%d beside %d is written %s and %s', (value, limit, writtenValue, writtenLimit) => {
  expect(besideLimit(value, limit, 'en-US')).toEqual({ value: writtenValue, limit: writtenLimit });
});
