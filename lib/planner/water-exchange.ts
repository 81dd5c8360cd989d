import type { Pool } from '@/lib/schemas/pool';
import { replaceWaterFrom, waterExchangeADay } from '@/lib/standards/companions';
import { limits } from '@/lib/standards/limits';

/** How much water has to be replaced, and why; volumes in m3. */
export type WaterExchange = {
  stabilizer: number;
  swimLimit: number;
  /** Whether no level of chlorine is both high enough and inside the swim limit. */
  closed: 'yes' | 'no';
  /** Stabilizer under which chlorine can be both high enough and inside the swim limit [mg/L]. */
  closesAt: number;
  /** Stabilizer to come down to [mg/L], the water to let out for it in all, and the days that takes. */
  target: number;
  volume: number;
  days: number;
};

/**
 * Replacing water where stabilizer is so high that chlorine cannot be both high enough and inside the swim limit: from 70
 * mg/L at a swim limit of 4, 80 at 5, 90 at 10. Null below.
 *
 * Each day so much of the depth is let out and filled up at most: after n days (1 - share)^n of the stabilizer is left. On
 * the last day only as much goes out as brings it to the target.
 *
 * @param stabilizer mg/L
 */
export function waterExchange(
  stabilizer: number,
  { swimLimit, stabilizerBand, volume, meanDepth }: Pool,
): WaterExchange | null {
  const { stabilizer: from } = replaceWaterFrom.find((row) => swimLimit <= row.swimLimit) ?? replaceWaterFrom.at(-1)!;
  if (stabilizer < from) return null;
  const closesAt = (swimLimit - limits.swimLimitMargin.value) * limits.stabilizerPerLowestLevel.value;
  const [low, high] = stabilizerBand;
  const target = Math.min((low + high) / 2, closesAt);
  const share = Math.min(1, waterExchangeADay.value / meanDepth);
  const days = share === 1 ? 1 : Math.ceil(Math.log(target / stabilizer) / Math.log(1 - share));
  const beforeLastDay = stabilizer * (1 - share) ** (days - 1);
  const lastShare = 1 - target / beforeLastDay;
  const closed = stabilizer >= closesAt ? 'yes' : 'no';
  return { stabilizer, swimLimit, closed, closesAt, target, volume: ((days - 1) * share + lastShare) * volume, days };
}
