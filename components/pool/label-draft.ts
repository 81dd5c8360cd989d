import { z } from 'zod';
import { labelSwimLimits, type SetupState } from '@/lib/schemas/pool-profile';
import { hourOfWallTime, wallTimeOfHour } from './hours';

type LabelAnswers = NonNullable<SetupState['profile']['label']>;

export const swimLimitAnswers = [...labelSwimLimits, 'not-said'] as const;

export const labelDraftSchema = z.object({
  swimLimit: z.union([z.literal([...labelSwimLimits]), z.literal('not-said')]).nullable(),
  /** Hours of the wall clock. */
  from: z.number(),
  to: z.number(),
});
export type LabelDraft = z.infer<typeof labelDraftSchema>;

/** When most families swim, until this one says otherwise. */
const usualSwimHours = { from: 10, to: 20 };

export const emptyLabel: LabelDraft = { swimLimit: null, ...usualSwimHours };

export function labelDraftOf({ swimLimit, swimHours }: LabelAnswers): LabelDraft {
  return { swimLimit, from: hourOfWallTime(swimHours.from), to: hourOfWallTime(swimHours.to) };
}

export function labelAnswersOf({ swimLimit, from, to }: LabelDraft): unknown {
  return {
    swimLimit: swimLimit ?? undefined,
    swimHours: { from: wallTimeOfHour(from), to: wallTimeOfHour(Math.min(to, latest)) },
  };
}

/** Swimming ends on the day it began: midnight is written as the last quarter of an hour before it. */
const latest = 23.75;
