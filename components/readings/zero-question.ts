import { parseInstant } from '@/lib/calendar/wall-time';
import { type FalseZeroCause, falseZeroQuestion } from '@/lib/client/readings';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { chlorines } from '@/lib/standards/chlorines';
import { type Value, asInterval, middleOf } from './entered';
import type { TestDraft } from './test-draft-schema';

const HOUR = 3_600_000;

/** The question of the care rules about a reading that looks like none, and what the sheet expected instead. */
export type ZeroQuestion = { cause: FalseZeroCause; expected: { low: number; high: number } | undefined };

/**
 * Whether a reading of free chlorine could be a false zero, by what the sheet on this device knows. The server asks the
 * same again, with everything it knows.
 */
export function zeroQuestionOf(
  free: Value | undefined,
  takenAt: number,
  sheet: WeekSheet | undefined,
): ZeroQuestion | undefined {
  if (free === undefined || sheet === undefined) return undefined;
  const expected = expectedAt(takenAt, sheet);
  const cause = falseZeroQuestion({ value: middleOf(free), takenAt }, expected?.low, lastDoseBefore(takenAt, sheet));
  return cause && { cause, expected };
}

function expectedAt(instant: number, { ahead }: WeekSheet): { low: number; high: number } | undefined {
  const index =
    ahead?.hours.findIndex((hour) => Math.abs((parseInstant(hour) ?? Infinity) - instant) <= HOUR / 2) ?? -1;
  const low = ahead?.freeChlorine.p10[index];
  const high = ahead?.freeChlorine.p90[index];
  return low === undefined || high === undefined ? undefined : { low, high };
}

function lastDoseBefore(instant: number, { doses }: WeekSheet): number | undefined {
  const given = doses
    .filter(({ status, substance }) => (status === 'given' || status === 'changed') && chlorines.includes(substance))
    .map(({ givenAt, at }) => parseInstant(givenAt ?? at) ?? Infinity)
    .filter((at) => at <= instant);
  return given.length > 0 ? Math.max(...given) : undefined;
}

/** Names the reading that an answer is about, so that another reading is asked about anew. */
export function zeroSubject(free: Value | undefined): string {
  if (free === undefined) return '';
  const { low, high } = asInterval(free);
  return `${low} ${high}`;
}

/** The answer to this very reading; null when there is none yet. */
export function zeroAnswerTo(draft: TestDraft, free: Value | undefined): TestDraft['zeroAnswer'] {
  return draft.zeroFor === zeroSubject(free) ? draft.zeroAnswer : null;
}
