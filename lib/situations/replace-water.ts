import { waterExchangeADay } from '@/lib/standards/companions';
import { replacedAtMost } from '@/lib/standards/situations';

/** Water to let out and fill up again, day by day. */
export type Replacing = {
  days: number;
  /** Level let out on each day [m], and the water of it [m3]. */
  drop: number;
  volume: number;
  /** What is left after the days [mg/L]: the target, or what a third of the depth comes to. */
  reached: number;
};

/**
 * Replacing water in steps: each day the same part of the depth is let out and filled up, at most 15 cm a day and a third of
 * the depth before the next test. After n days of a share s
 *
 *     c_n = f + (c_0 - f) (1 - s)^n
 *
 * @param now    what the water holds [mg/L]
 * @param target what it is to come down to [mg/L], above `fill`
 * @param fill   what the fill water holds [mg/L]
 * @param volume of the pool [m3]; depth its mean [m]
 * @returns null where there is nothing to do, or the fill water cannot bring it down so far
 */
export function replaceWater(
  now: number,
  target: number,
  fill: number,
  { volume, depth }: { volume: number; depth: number },
): Replacing | null {
  if (now <= target || fill >= target) return null;
  const largest = Math.min(1, waterExchangeADay.value / depth);
  const left = (target - fill) / (now - fill);
  const wanted = largest === 1 ? 1 : Math.ceil(Math.log(left) / Math.log(1 - largest) - 1e-9);
  const most = Math.max(1, Math.floor((replacedAtMost.value * depth) / waterExchangeADay.value + 1e-9));
  const days = Math.min(wanted, most);
  const share = wanted <= most ? 1 - left ** (1 / days) : largest;
  return {
    days,
    drop: share * depth,
    volume: share * volume,
    reached: fill + (now - fill) * (1 - share) ** days,
  };
}
