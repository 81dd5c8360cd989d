import { addDays, dayOf } from '@/lib/calendar/household-day';
import { wallToInstant } from '@/lib/calendar/wall-time';
import type { Fact } from '@/lib/schemas/plan';
import type { Reason } from './codes';
import { newest, type SituationRecord } from './record';
import { replaceWater, type Replacing } from './replace-water';
import { type Asked, test, tick } from './way';

export type Dissolved = 'cyanuricAcid' | 'calciumHardness';

/** Fill water brings no stabilizer; its hardness stands in the profile. */
function fillOf(quantity: Dissolved, { pool }: SituationRecord): number {
  return quantity === 'cyanuricAcid' ? 0 : pool.fillWater.calciumHardness;
}

function replacing(quantity: Dissolved, now: number, target: number, record: SituationRecord): Replacing | null {
  const { volume, meanDepth: depth } = record.pool;
  return replaceWater(now, target, fillOf(quantity, record), { volume, depth });
}

/** A step for each day from the morning after the test that told, and the test after the last. */
export function replacingSteps(quantity: Dissolved, now: number, target: number, record: SituationRecord): Asked[] {
  const plan = replacing(quantity, now, target, record);
  if (!plan) return [];
  const { timeZone } = record.pool;
  const base = dayOf(Math.max(record.openedAt, newest(record, quantity)?.takenAt ?? 0), timeZone);
  const at = (days: number) => wallToInstant(addDays(base, days), '08:00', timeZone).instant;
  const rounds = Array.from({ length: plan.days }, (_, index) =>
    tick(
      'replace-water',
      at(index + 1),
      { drop: plan.drop, volume: plan.volume, round: index + 1, rounds: plan.days },
      `replace-water-${addDays(base, index + 1)}`,
    ),
  );
  const retest = at(plan.days + 1);
  const code = quantity === 'cyanuricAcid' ? 'test-stabilizer' : 'test-hardness';
  return [...rounds, test(code, retest, [quantity], retest, `${code}-${dayOf(retest, timeZone)}`)];
}

/** How much water that is, and whether one round of it is enough. */
export function replacingReason(
  quantity: Dissolved,
  now: number,
  target: number,
  record: SituationRecord,
): (Fact & { code: Reason })[] {
  const plan = replacing(quantity, now, target, record);
  if (!plan) return [];
  const { days, volume, reached } = plan;
  const all = { code: 'water-to-replace', quantity, from: now, to: reached, volume: volume * days, days } as const;
  return reached > target * 1.001 ? [all, { code: 'water-in-rounds', reached }] : [all];
}
