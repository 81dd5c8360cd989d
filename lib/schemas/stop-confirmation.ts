import { z } from 'zod';

/**
 * Somebody has read the Stop of the product of a dose and will do so. The id is made on the device, so that a resend is
 * harmless; which product that is, the server knows.
 */
export const newStopConfirmationSchema = z.strictObject({ id: z.uuid(), doseId: z.uuid() });
export type NewStopConfirmation = z.output<typeof newStopConfirmationSchema>;
