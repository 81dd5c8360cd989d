import { z } from 'zod';
import { plannedDoseSchema } from './dose';
import { calendarDaySchema, instantSchema } from './time';

const eachDayOnce = <Entry extends { day: string }>(entries: readonly Entry[]) =>
  new Set(entries.map(({ day }) => day)).size === entries.length;

/** What somebody tries on the week ahead; whatever is left out stays as the plan has it. */
export const tryOutChangesSchema = z.strictObject({
  /** How much swimming a day brings [heads times hours]. */
  swimmers: z
    .array(z.strictObject({ day: calendarDaySchema, swimmerHours: z.number().min(0).max(1000) }))
    .max(8)
    .refine(eachDayOnce, 'Say each day once.')
    .default([]),
  /** The sky of a day: share of clear-sky UV. */
  sky: z
    .array(z.strictObject({ day: calendarDaySchema, sky: z.number().min(0).max(1) }))
    .max(8)
    .refine(eachDayOnce, 'Say each day once.')
    .default([]),
  /** Slow tablets of the whole plan, at the plan's own first loading; null leaves them to the plan. */
  tablets: z.number().int('Count whole tablets.').min(0).max(50).nullable().default(null),
  /** Doses that go in on another evening, with the amount that the plan gave them. */
  moves: z
    .array(z.strictObject({ doseId: z.uuid(), toDay: calendarDaySchema }))
    .max(8)
    .default([]),
});
export type TryOutChanges = z.output<typeof tryOutChangesSchema>;

/** A try-out that is taken into the plan. The id is made on the device, so that a resend is the same one. */
export const tryOutSchema = tryOutChangesSchema.extend({
  id: z.uuid(),
  /** The plan that it was tried on; a newer one has to be looked at first. */
  planId: z.uuid(),
});
export type TryOut = z.output<typeof tryOutSchema>;

/** A try-out that was taken and can be put back. */
export const takenTryOutSchema = z.object({
  id: z.uuid(),
  takenBy: z.string(),
  takenAt: instantSchema,
  changes: tryOutChangesSchema,
});
export type TakenTryOut = z.infer<typeof takenTryOutSchema>;

/** What trying out starts from: the plan that stands, the evenings it may use, and everything the engine needs. */
export const tryOutStartSchema = z.object({
  planId: z.uuid(),
  /** The engine's scenario, wishes of try-outs already taken included; its `now` is the moment of the answer. */
  scenario: z.unknown(),
  /** Doses still ahead, as planned. */
  doses: z.array(plannedDoseSchema.extend({ id: z.uuid() })),
  /** Evenings on which chlorine may go in. */
  evenings: z.array(z.object({ day: calendarDaySchema, at: instantSchema })),
  /** Most slow tablets that the rules allow in this week; 0 where none may be planned. */
  mostTablets: z.number().int(),
});
export type TryOutStart = z.infer<typeof tryOutStartSchema>;
