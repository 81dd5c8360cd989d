import { formatNumber } from '@/lib/units/format';

/** As many decimals as tell two different figures apart; finer than the last nobody measures. */
const decimals = [0, 1, 2, 3, 4] as const;

/**
 * A value and the limit it is held against, with one decimal (or the fewest that are named), or with as many more as they need not to look equal: "2.2,
 * under 2.2" explains nothing.
 */
export function besideLimit(
  value: number,
  limit: number,
  locale: string,
  fewest = 1,
): { value: string; limit: string } {
  const written = decimals
    .filter((places) => places >= fewest)
    .map((places) => ({
      value: formatNumber(value, { decimals: places, locale }),
      limit: formatNumber(limit, { decimals: places, locale }),
    }));
  const apart = written.find((pair) => pair.value !== pair.limit);
  return apart ?? written[0] ?? { value: '', limit: '' };
}
