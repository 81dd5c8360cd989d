import 'server-only';
import type { StoredReading } from '@/db/queries/readings';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import type { HouseholdAccess } from '@/lib/auth/household-access';
import type { RecordedReading } from '@/lib/schemas/reading';
import { shownName } from './shown-name';

/** A reading as somebody of the household sees it. */
export function recordedReading(
  reading: StoredReading,
  { timeZone, language }: Pick<HouseholdAccess, 'timeZone' | 'language'>,
): RecordedReading {
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
    doneBy: shownName(doneByName, language),
    recordedBy: shownName(recordedByName, language),
  };
}
