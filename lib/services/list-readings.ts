import 'server-only';
import { listReadings as queryReadings } from '@/db/queries/readings';
import { assertMay } from '@/lib/auth/permissions';
import type { ReadingListQuery } from '@/lib/schemas/reading-list';
import type { RecordedReading } from '@/lib/schemas/reading';
import type { ServiceContext } from './context';
import { recordedReading } from './recorded-reading';

const usualSpan = 60 * 86_400_000;

/** The household's readings of a stretch of time, newest first. */
export async function listReadings(
  { db, access, now }: ServiceContext,
  query: ReadingListQuery,
): Promise<RecordedReading[]> {
  assertMay(access, 'look');
  const until = query.until === undefined ? new Date(now.getTime() + 1) : new Date(query.until);
  const from = query.from === undefined ? new Date(until.getTime() - usualSpan) : new Date(query.from);
  const readings = await queryReadings(db, { householdId: access.householdId, from, until });
  return readings.map((reading) => recordedReading(reading, access));
}
