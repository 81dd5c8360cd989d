import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { instantOf } from './sheet-times';

export type Check = WeekSheet['checks'][number];

/** The first check nobody has made yet, of a kind when one is named. */
export function nextCheck(checks: readonly Check[], kind?: Check['kind']): Check | undefined {
  return checks
    .filter((check) => !check.done && (kind === undefined || check.kind === kind))
    .toSorted((a, b) => instantOf(a.at) - instantOf(b.at))[0];
}
