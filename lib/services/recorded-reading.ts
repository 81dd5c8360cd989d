import 'server-only';
import type { StoredReading } from '@/db/queries/readings';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import type { RecordedReading } from '@/lib/schemas/reading';

/** A reading as the household sees it. */
export function recordedReading(reading: StoredReading, timeZone: string): RecordedReading {
  const { id, takenAt, createdAt, kind, method, values, look, zeroAnswer, note, doneByName, recordedByName } = reading;
  return {
    id,
    takenAt: toOffsetIso(takenAt.getTime(), timeZone),
    createdAt: toOffsetIso(createdAt.getTime(), timeZone),
    kind,
    method,
    values,
    look,
    zeroAnswer,
    note,
    doneBy: doneByName,
    recordedBy: recordedByName,
  };
}
