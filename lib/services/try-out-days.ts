import 'server-only';
import type { TryOutChanges } from '@/lib/schemas/try-out';

/** What a try-out says of each day. */
export type TriedDay = { day: string; values: { swimmerHours?: number; sky?: number } };

export function daysOf({ swimmers, sky }: TryOutChanges): TriedDay[] {
  const days = new Map<string, TriedDay['values']>();
  for (const { day, swimmerHours } of swimmers) days.set(day, { ...days.get(day), swimmerHours });
  for (const { day, sky: share } of sky) days.set(day, { ...days.get(day), sky: share });
  return [...days].map(([day, values]) => ({ day, values })).sort((a, b) => (a.day < b.day ? -1 : 1));
}
