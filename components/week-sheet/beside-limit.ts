import { formatNumber } from '@/lib/units/format';

/**
 * A value and the limit it is held against, with one decimal, or with two where one would make them look equal: "2.2,
 * under 2.2" explains nothing.
 */
export function besideLimit(value: number, limit: number, locale: string): { value: string; limit: string } {
  const written = (decimals: number) => ({
    value: formatNumber(value, { decimals, locale }),
    limit: formatNumber(limit, { decimals, locale }),
  });
  const short = written(1);
  return short.value === short.limit ? written(2) : short;
}
