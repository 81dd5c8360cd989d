import { z } from 'zod';
import { doseTickSchema } from '@/lib/schemas/plan-dose';
import type { SentTick } from './doses';

const storedSchema = z.array(z.object({ doseId: z.uuid(), tick: doseTickSchema }));

/** Ticks as an earlier page, or an earlier version, kept them on this device; undefined for anything else. */
export function checkedTicks(kept: unknown): readonly SentTick[] | undefined {
  return storedSchema.safeParse(kept).data;
}
