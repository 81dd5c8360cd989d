import { expect, it } from 'vitest';
import { bucketTestOf } from '@/lib/standards/bucket-test';

it.each([
  // Two marks, each read to 2 mm: 4 mm cannot be told from weather.
  [6, 6, 'weather'],
  [6, 10, 'weather'],
  [6, 2, 'weather'],
  [6, 10.1, 'leak'],
  [6, 25, 'leak'],
  [12, 7, 'bucket-fell-further'],
])('a bucket that fell %d mm beside a pool that fell %d mm: %s', (bucket, pool, answer) => {
  const found = bucketTestOf({ bucketDrop: bucket / 1000, poolDrop: pool / 1000 });
  expect(found.answer).toBe(answer);
  expect(found.difference * 1000).toBeCloseTo(pool - bucket, 9);
  expect(found.error).toBe(0.004);
});
