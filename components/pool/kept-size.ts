import { z } from 'zod';
import { poolFloors, poolShapes, volumeUnits } from '@/lib/schemas/pool-size';

/** What the device keeps of the size while it is typed. Apart from the draft, for the drawing of a saved pool needs no zod. */
export const sizeDraftSchema = z.object({
  how: z.enum(['entered', 'measured']),
  volume: z.string(),
  unit: z.enum(volumeUnits),
  sure: z.boolean().nullable(),
  /** The volume and unit of which somebody said "yes, that is the unit". */
  confirmed: z.string(),
  shape: z.enum(poolShapes),
  floor: z.enum(poolFloors),
  /** The measures in which the lengths below are typed. */
  system: z.enum(['metric', 'us']),
  meanDepth: z.string(),
  length: z.string(),
  width: z.string(),
  secondWidth: z.string(),
  diameter: z.string(),
  depth: z.string(),
  shallow: z.string(),
  deep: z.string(),
});
