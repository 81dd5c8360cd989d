import { toOffsetIso } from '@/lib/calendar/wall-time';
import type { NewReading } from '@/lib/schemas/reading';
import { type Entered, measuredOf } from './entered';
import type { TestDraft } from './test-draft-schema';

/** A test as it is sent: under the id that was made when its form opened. */
export function newReadingOf({
  draft,
  entered,
  takenAt,
  timeZone,
  zeroAnswer,
}: {
  draft: TestDraft;
  entered: Entered;
  takenAt: number;
  timeZone: string;
  zeroAnswer: 'flashed' | 'stayed-pale' | null;
}): NewReading {
  const { id, kind, method, look } = draft;
  return {
    id,
    takenAt: toOffsetIso(takenAt, timeZone),
    kind,
    method,
    values: measuredOf(entered),
    look,
    ...(zeroAnswer === null ? {} : { zeroAnswer }),
  };
}
