import type { Limit } from './limits';

/** How exactly a water mark is read off a wall or a bucket: once when it is set, once a day later. */
export const waterMarkError = {
  value: 2,
  unit: 'mm',
  source: {
    kind: 'practice',
    text: 'a waterproof pencil mark, read against calm water with the pump off; small waves allow no more',
  },
} as const satisfies Limit;

/** What a bucket test says: how much faster the pool falls than the bucket [m], and how exactly that is known [m]. */
export type BucketTest = { answer: 'leak' | 'weather' | 'bucket-fell-further'; difference: number; error: number };

/**
 * Leak or weather. A bucket of pool water stands in the pool; sun, wind and rain take and give both the same, so
 * what the pool loses more than the bucket leaks away.
 *
 * difference = drop of the pool - drop of the bucket; a drop is read twice, so at worst each is wrong by the reading error
 * and the difference by twice that. It leaks when the difference is larger. A bucket that fell further than that was
 * drunk from, spilt or stood in the sun, or water was let into the pool: the test is to be done again.
 *
 * @param bucketDrop how far the water in the bucket fell [m]
 * @param poolDrop   how far the pool fell in the same time [m]
 */
export function bucketTestOf({ bucketDrop, poolDrop }: { bucketDrop: number; poolDrop: number }): BucketTest {
  const error = (2 * waterMarkError.value) / 1000;
  const difference = poolDrop - bucketDrop;
  const [apart, allowed] = [tenthsOfMillimetres(difference), tenthsOfMillimetres(error)];
  const answer = apart > allowed ? 'leak' : apart < -allowed ? 'bucket-fell-further' : 'weather';
  return { answer, difference, error };
}

/** Nobody reads finer, and what inches leave over in millimetres does not count. */
function tenthsOfMillimetres(metres: number): number {
  return Math.round(metres * 1000 * 10);
}
