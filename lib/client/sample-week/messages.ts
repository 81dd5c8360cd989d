import type { SampleWater, SampleWeek } from '@/lib/schemas/sample-water';

export type SampleQuestion = SampleWater;
/** The planned week, or the water for which none could be planned. */
export type SampleAnswer = { week: SampleWeek } | { failed: SampleWater };
