import { z } from 'zod';

/** What a person says about the notes on the first sheet: nothing opens them again. */
export const tourSchema = z.strictObject({ closed: z.literal(true) });
