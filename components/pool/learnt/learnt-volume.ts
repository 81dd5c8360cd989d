import type { Learnt } from '@/lib/schemas/learnt';
import { taughtRows } from './has-taught';

/** The volume that the tests speak of [m3], where it is clear and the entered one lies outside its likely range. */
export function differentVolume(learnt: Learnt): number | undefined {
  const { enteredVolume, measureVolumeAgain } = learnt;
  const row = taughtRows(learnt).main.find(({ thing }) => thing === 'volume');
  if (!row || enteredVolume === null || measureVolumeAgain || !row.clear) return undefined;
  const inside = row.learnt.p10 <= enteredVolume && enteredVolume <= row.learnt.p90;
  return inside ? undefined : row.learnt.p50;
}
