import { z } from 'zod';
import { newReadingSchema } from '@/lib/schemas/reading';

/** A test that has not reached the server; `refusal` says why it will not be taken as it is. */
const unsentReadingSchema = z.object({ reading: newReadingSchema, refusal: z.string().nullable() });
export type UnsentReading = z.infer<typeof unsentReadingSchema>;

const storedSchema = z.array(unsentReadingSchema);

/** Tests as an earlier page, or an earlier version, kept them on this device; undefined for anything else. */
export function checkedReadings(kept: unknown): readonly UnsentReading[] | undefined {
  return storedSchema.safeParse(kept).data;
}
