import { z } from 'zod';
import { daysBetween, isCalendarDay } from '@/lib/calendar/household-day';
import { calendarDaySchema, instantSchema } from './time';
import { roles } from './week-sheet';

/** A hand-over lasts no longer [days], and no day of it lies further ahead. */
export const longestHandOver = 60;
export const furthestHandOver = 400;

/** Somebody who looks after the pool. */
const dutyMemberSchema = z.object({
  /** Of the membership, not of the person. */
  memberId: z.uuid(),
  name: z.string(),
  role: z.enum(roles),
});
export type DutyMember = z.infer<typeof dutyMemberSchema>;

const handOverSchema = dutyMemberSchema.extend({
  id: z.uuid(),
  you: z.boolean(),
  fromDay: calendarDaySchema,
  untilDay: calendarDaySchema,
  chemicalsAllowed: z.boolean(),
  /** They have read the safety card of this season. */
  cardRead: z.boolean(),
  agreedAt: instantSchema.nullable(),
  inForce: z.boolean(),
});
export type HandOver = z.infer<typeof handOverSchema>;

/** Who looks after the pool now, and who will. */
export const handOversSchema = z.object({
  today: calendarDaySchema,
  onDuty: z.array(dutyMemberSchema),
  /** Who it is while nobody stands in. */
  usually: z.array(dutyMemberSchema),
  /** Those that are not over, the earliest first. */
  handOvers: z.array(handOverSchema),
});
export type HandOvers = z.infer<typeof handOversSchema>;

/** The one description of a hand-over. The id is made on the device; days are those of the household, both included. */
export const newHandOverSchema = z
  .strictObject({
    id: z.uuid(),
    memberId: z.uuid({ error: 'Choose who looks after it.' }),
    fromDay: calendarDaySchema,
    untilDay: calendarDaySchema,
    chemicalsAllowed: z.boolean(),
  })
  .refine(({ fromDay, untilDay }) => fromDay <= untilDay, {
    path: ['untilDay'],
    message: 'The last day away comes before the first.',
  })
  // What is no day is refused already.
  .refine((days) => !areDays(days) || daysBetween(days.fromDay, days.untilDay) < longestHandOver, {
    path: ['untilDay'],
    message: `A hand-over lasts ${longestHandOver} days at most. Write down a second one for the rest.`,
  });
export type NewHandOver = z.output<typeof newHandOverSchema>;

function areDays({ fromDay, untilDay }: { fromDay: string; untilDay: string }): boolean {
  return isCalendarDay(fromDay) && isCalendarDay(untilDay);
}

/** The yes of whoever is asked, and whether they say that they are an adult and have just read the safety card. */
export const handOverAgreementSchema = z.strictObject({ cardRead: z.boolean() });
export type HandOverAgreement = z.output<typeof handOverAgreementSchema>;
