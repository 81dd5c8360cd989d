import { z } from 'zod';
import {
  currentPasswordSchema,
  householdNameSchema,
  knownTimeZoneSchema,
  localeSchema,
  unitSystemSchema,
} from './account';
import { roles } from './week-sheet';

/** One of the households that a person belongs to. */
const householdSummarySchema = z.object({
  id: z.string(),
  name: z.string(),
  role: z.enum(roles),
  timeZone: z.string(),
  unitSystem: unitSystemSchema,
  locale: z.string(),
  demo: z.boolean(),
  /** The one that this device looks at. */
  current: z.boolean(),
  /** Whether its first run is finished. */
  poolCompleted: z.boolean(),
});
export const householdListSchema = z.array(householdSummarySchema);
export type HouseholdList = z.output<typeof householdListSchema>;

export const chosenHouseholdSchema = z.strictObject({ householdId: z.string().min(1).max(64) });

/** A household of one's own, for somebody who has an account. */
export const newHouseholdSchema = z.strictObject({
  name: householdNameSchema,
  timeZone: knownTimeZoneSchema,
  unitSystem: unitSystemSchema,
  locale: localeSchema,
});
export type NewHousehold = z.output<typeof newHouseholdSchema>;

/** Whoever closes a household shows that they are who they are, and that they mean this one. */
export const closingSchema = z.strictObject({
  password: currentPasswordSchema,
  name: z.string({ error: 'Write the name of the household.' }).max(200, 'Write the name of the household.'),
});
export type Closing = z.output<typeof closingSchema>;

/** What is left out stays as it is. */
export const householdChangesSchema = z.strictObject({
  name: householdNameSchema.optional(),
  timeZone: knownTimeZoneSchema.optional(),
  unitSystem: unitSystemSchema.optional(),
  locale: localeSchema.optional(),
});
export type HouseholdChanges = z.output<typeof householdChangesSchema>;

/** That the person is an adult and has just read the safety card. */
export const safetyCardSchema = z.strictObject({
  adult: z.literal(true, { error: 'Only an adult handles chemicals.' }),
  read: z.literal(true, { error: 'Read the safety card to its end first.' }),
});
