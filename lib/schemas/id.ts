import { z } from 'zod';

/** A thing of the household by its id, from a path. */
export const idSchema = z.strictObject({ id: z.uuid() });
