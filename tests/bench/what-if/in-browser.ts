import { projectWeek, projectWeekBand } from '@/lib/projection';
import { errors, stabilized } from '../weeks';

/** What the median's week and the likely range of a what-if take [ms]: the first time, and the median of the times after. */
export type Took = { first: number; after: number };

declare global {
  /** Times the median's week with other swimmers each time. */
  var timeMedian: () => Took;
  /** Times the band likewise. */
  var timeBand: () => Took;
}

function times(count: number, work: (swimmers: number) => unknown): Took {
  const each = Array.from({ length: count }, (_, index) => {
    const from = performance.now();
    work(index % 12);
    return performance.now() - from;
  });
  const [first = NaN, ...rest] = each;
  return { first, after: rest.sort((a, b) => a - b)[Math.floor(rest.length / 2)] ?? NaN };
}

const { pool, start, doses } = stabilized[20]!;
const swimming = (swimmers: number) => ({ swimmerHours: [0, 0, 0, 0, 0, swimmers, 0] });

globalThis.timeMedian = () => times(41, (swimmers) => projectWeek(pool, start, swimming(swimmers), doses));
globalThis.timeBand = () =>
  times(11, (swimmers) => projectWeekBand(pool, { ...start, errors }, swimming(swimmers), doses));
