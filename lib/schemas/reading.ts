import { z } from 'zod';
import { type MeasuredQuantity, measuredRange } from './measured-range';
import { readingKinds, readingMethods, waterLooks } from './reading-kinds';
import { instantSchema } from './time';

/** A strip read between two steps: the value lies somewhere in here. */
export const intervalSchema = z
  .strictObject({ low: z.number(), high: z.number() })
  .refine(({ low, high }) => low <= high, { path: ['high'], message: 'The lower value comes first.' });
export type Interval = z.infer<typeof intervalSchema>;

const outside = (low: number, high: number) => `A value from ${low} to ${high} is possible here.`;

function measured(quantity: MeasuredQuantity) {
  const [low, high] = measuredRange[quantity];
  const inside = (value: number) => value >= low && value <= high;
  return z.union([
    z.number().min(low, outside(low, high)).max(high, outside(low, high)),
    intervalSchema.refine((interval) => inside(interval.low) && inside(interval.high), outside(low, high)),
  ]);
}

/** What was measured; a quantity that is left out was not measured. mg/L, alkalinity and hardness as CaCO3, degrees C. */
export const measuredSchema = z.strictObject({
  freeChlorine: measured('freeChlorine').optional(),
  combinedChlorine: measured('combinedChlorine').optional(),
  pH: measured('pH').optional(),
  totalAlkalinity: measured('totalAlkalinity').optional(),
  calciumHardness: measured('calciumHardness').optional(),
  cyanuricAcid: measured('cyanuricAcid').optional(),
  temperature: measured('temperature').optional(),
});
export type Measured = z.infer<typeof measuredSchema>;

/** A reading as the engine takes it. */
export const readingSchema = measuredSchema.extend({
  takenAt: instantSchema,
  method: z.enum(readingMethods).default('drop-kit'),
});
export type Reading = z.output<typeof readingSchema>;

/** The one description of a new reading: form, route and import use it. The id is made on the device. */
export const newReadingSchema = z
  .strictObject({
    id: z.uuid(),
    takenAt: instantSchema,
    kind: z.enum(readingKinds),
    method: z.enum(readingMethods),
    values: measuredSchema,
    look: z.enum(waterLooks).default('clear'),
    /** The answer to the false-zero question; left out when it was not asked or not yet answered. */
    zeroAnswer: z.enum(['flashed', 'stayed-pale']).optional(),
    note: z.string().max(500, 'Keep the note under 500 characters.').optional(),
  })
  .superRefine(({ kind, values }, context) => {
    if (Object.values(values).every((value) => value === undefined))
      context.addIssue({
        code: 'custom',
        path: ['values'],
        message: 'Enter at least one value. Untouched means not measured.',
      });
    if (kind === 'full')
      for (const quantity of ['freeChlorine', 'pH'] as const)
        if (values[quantity] === undefined)
          context.addIssue({
            code: 'custom',
            path: ['values', quantity],
            message: 'A full test needs free chlorine and pH: without them there is no plan.',
          });
  });
export type NewReading = z.output<typeof newReadingSchema>;

/** A reading as the household sees it. */
export const recordedReadingSchema = z.object({
  id: z.uuid(),
  takenAt: instantSchema,
  createdAt: instantSchema,
  kind: z.enum(readingKinds),
  method: z.enum(readingMethods),
  values: measuredSchema,
  look: z.enum(waterLooks),
  zeroAnswer: z.enum(['flashed', 'stayed-pale']).nullable(),
  note: z.string().nullable(),
  doneBy: z.string().nullable(),
  recordedBy: z.string().nullable(),
});
export type RecordedReading = z.infer<typeof recordedReadingSchema>;
