import { z } from 'zod';
import { instantSchema } from './time';

const MOST_IN_A_NAME = 80;
const MOST_IN_A_PHONE = 40;
const MOST_IN_A_PLACE = 160;
const FEWEST_DIGITS = 3;

/** Something that can be left out; what is left out is not known. */
const words = (most: number) =>
  z
    .string()
    .trim()
    .min(1, 'Write something, or leave it empty.')
    .max(most, `Keep it to ${most} characters: the sheet is one page.`)
    .optional();

/** As people write it: +49 (0)30 1234-56. Letters would not dial. */
const phone = z
  .string()
  .trim()
  .max(MOST_IN_A_PHONE, `Keep it to ${MOST_IN_A_PHONE} characters: one number.`)
  .regex(
    /^\+?[\d\s()./-]*$/,
    'A phone number has digits, spaces and + ( ) / . - only. Names go into the field for names.',
  )
  .refine((text) => text.replace(/\D/g, '').length >= FEWEST_DIGITS, 'Write the whole number.')
  .optional();

/** The one description of the house notes: whom to call, and where things are. A save replaces all of them. */
export const newHouseNotesSchema = z.strictObject({
  professionalName: words(MOST_IN_A_NAME),
  professionalPhone: phone,
  /** Where the household is reached while it is away. */
  ourPhone: phone,
  neighbourName: words(MOST_IN_A_NAME),
  neighbourPhone: phone,
  gate: words(MOST_IN_A_PLACE),
  breaker: words(MOST_IN_A_PLACE),
  pumpSwitch: words(MOST_IN_A_PLACE),
  chemicals: words(MOST_IN_A_PLACE),
});
export type NewHouseNotes = z.output<typeof newHouseNotesSchema>;
export type HouseNoteName = keyof NewHouseNotes;

export const houseNoteNames = Object.keys(newHouseNotesSchema.shape) as HouseNoteName[];

/** The notes as they stand; empty before the first save. */
export const houseNotesSchema = z.object({
  notes: newHouseNotesSchema,
  updatedAt: instantSchema.nullable(),
  updatedBy: z.string().nullable(),
});
export type HouseNotes = z.infer<typeof houseNotesSchema>;
