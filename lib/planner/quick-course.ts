import { HOURS_IN_PLAN } from '@/lib/projection/forcing';
import { limits } from '@/lib/standards/limits';
import type { QuickFrame } from './quick-week';
import { weights } from './weights';

/** What a draft adds to a quick week; series by hour and member, rises by hour. */
export type QuickDraft = {
  /** [g/m3 of the entered volume] */
  rises: Float64Array;
  source: Float64Array;
  /** How far the draft moves the median's pH, by hour. */
  pH: Float64Array;
  /** What is left of the loss under sun with the stabilizer that its tablets bring. */
  sheltered: Float64Array;
};

/** What the risk of an hour is reckoned with: bounds [mg/L], and what a closed hour weighs. */
export type RiskBounds = { lowest: Float64Array; ceiling: Float64Array; closed: Float64Array };

/**
 * Moves all members of a quick week on from an hour, whose row of `levels` and sum in `risks` are there, and adds up the
 * risk hour by hour, as `riskOf` does it for a week in full, until it passes `most`. All in one loop over plain arrays: a
 * search asks for thousands of these.
 *
 * @param correction what levels are off by; added where risk is reckoned, not where the water moves on
 * @returns the risk up to the end of the week, or up to where it passed `most`
 */
export function reckonOn(
  { members, ofVolume, happens, jumps, kept, losses }: QuickFrame,
  { rises, source, pH, sheltered }: QuickDraft,
  { lowest, ceiling, closed }: RiskBounds,
  correction: Float64Array | null,
  from: number,
  levels: Float64Array,
  risks: Float64Array,
  most: number,
): number {
  const { sunny, dark, constant, linear, square, perPH } = losses;
  const each = 1 / Math.max(1, members - 1);
  const underWeight = weights.shortfall * each;
  const overWeight = weights.excess * each;
  const { medianShortfall, medianExcess, overMaximum } = weights;
  const maximum = limits.freeChlorineMaximum.value;
  let risk = risks[from]!;
  for (let hour = from + 1; hour <= HOURS_IN_PLAN; hour++) {
    const rise = rises[hour]!;
    const happening = rise > 0 || happens[hour] === 1;
    const least = lowest[hour]!;
    const top = ceiling[hour]!;
    const pHMoved = pH[hour - 1]!;
    const underSun = sunny[hour - 1] === 1;
    let under = 0;
    let over = 0;
    let median = 0;
    for (let member = 0, at = (hour - 1) * members; member < members; member++, at++) {
      const before = levels[at]!;
      let loss = dark[at]!;
      if (underSun) {
        const parabola = constant[at]! + before * (linear[at]! + before * square[at]!);
        const byPH = perPH[at]! * pHMoved;
        // exp by its series.
        if (parabola > 0) loss += parabola * (1 + byPH * (1 + 0.5 * byPH)) * sheltered[at]!;
      }
      // exp(-loss) and its mean over the hour, by their series: exact to a thousandth where a tenth is lost in an hour.
      const curve = 0.5 * loss;
      let level = (before + source[at]! * (1 + curve)) / (1 + loss * (1 + curve));
      const now = at + members;
      if (level < 0) level = 0;
      if (happening) level = Math.max(0, level * kept[now]! + jumps[now]! + rise * ofVolume[member]!);
      levels[now] = level;
      if (correction) level += correction[now]!;
      if (member === 0) median = level;
      else {
        if (level < least) under += least - level;
        else if (level > top) over += level - top;
        if (level > maximum) over += overMaximum * (level - maximum);
      }
    }
    risk += underWeight * under + overWeight * over;
    if (median < least) risk += medianShortfall * (least - median) + closed[hour]!;
    else if (median > top) risk += medianExcess * (median - top) + closed[hour]!;
    if (median > maximum) risk += medianExcess * overMaximum * (median - maximum);
    risks[hour] = risk;
    if (risk > most) return risk;
  }
  return risk;
}

/** The row of the first hour, with what happens then. */
export function startOf(
  { members, start, ofVolume, jumps, kept }: QuickFrame,
  rise: number,
  levels: Float64Array,
): void {
  for (let member = 0; member < members; member++)
    levels[member] = Math.max(0, start[member]! * kept[member]! + jumps[member]! + rise * ofVolume[member]!);
}
