import { AppError } from '@/lib/errors';
import { toInside } from './unit';

export type VolumeUnit = 'm3' | 'L' | 'us-gal';

/**
 * What a garden pool can hold and what most of them hold [m3]. 2 is where the product's scope begins, 400 a large private
 * pool (25 m by 10 m); most in-ground pools lie between 30 m3 (6 m by 4 m, 1.3 m deep) and 120 m3 (12 m by 6 m, 1.7 m
 * deep). Our own bounds, used for questions only: nothing is ever refused or changed by them.
 */
const possible = { low: 2, high: 400 };
const common = { low: 30, high: 120 };
const volumeUnits: readonly VolumeUnit[] = ['m3', 'L', 'us-gal'];

/** A question to ask back: `possible` tells whether the value as typed could be a garden pool at all. */
export type UnitQuestion = { possible: boolean; likelier?: { unit: VolumeUnit; volume: number } };

/**
 * Whether a typed volume looks as if it was meant in another unit; undefined when there is nothing to ask.
 *
 * With `expected` [m3], from shape and depths, the value is doubted when it is less than half or more than twice of that,
 * and the unit that comes nearest within those bounds is offered. Without it, a value is doubted when it is no possible
 * garden pool, or when it lies outside the common sizes and the same number in another unit lies inside them: 18,000 m3
 * cannot be; 18,000 L is 18 m3, possible but rare, while 18,000 US gallons are 68 m3, an everyday pool: both are asked
 * about. 20 m3 is rare as well, but 20 L or 20 gallons are no pool, so nothing is asked.
 *
 * Range: a value above 0. Error: `invalid-input` else.
 */
export function likelyUnitMistake(value: number, unit: VolumeUnit, expected?: number): UnitQuestion | undefined {
  if (!(value > 0 && Number.isFinite(value))) throw new AppError('invalid-input', `${value} is not a volume.`);
  const volume = toInside(value, unit);
  const isPossible = inside(volume, possible);
  const inOtherUnits = volumeUnits
    .filter((other) => other !== unit)
    .map((other) => ({ unit: other, volume: toInside(value, other) }));
  if (expected !== undefined) {
    const about = { low: expected / 2, high: expected * 2 };
    if (isPossible && inside(volume, about)) return undefined;
    return question(isPossible, nearest(inOtherUnits, expected, about));
  }
  if (inside(volume, common)) return undefined;
  const everyday = inOtherUnits.find((other) => inside(other.volume, common));
  if (isPossible) return everyday && question(true, everyday);
  return question(false, everyday ?? inOtherUnits.find((other) => inside(other.volume, possible)));
}

function inside(volume: number, { low, high }: { low: number; high: number }): boolean {
  return volume >= low && volume <= high;
}

type Candidate = { unit: VolumeUnit; volume: number };

function nearest(candidates: readonly Candidate[], expected: number, bounds: { low: number; high: number }) {
  const distance = (candidate: Candidate) => Math.abs(Math.log(candidate.volume / expected));
  return candidates.filter(({ volume }) => inside(volume, bounds)).sort((a, b) => distance(a) - distance(b))[0];
}

function question(isPossible: boolean, likelier: Candidate | undefined): UnitQuestion {
  return likelier ? { possible: isPossible, likelier } : { possible: isPossible };
}
