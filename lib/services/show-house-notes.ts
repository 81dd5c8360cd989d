import 'server-only';
import { findHouseNotes, type StoredHouseNotes } from '@/db/queries/house-notes';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import { assertMay } from '@/lib/auth/permissions';
import { type HouseNotes, houseNoteNames } from '@/lib/schemas/house-note';
import type { ServiceContext } from './context';
import { shownName } from './shown-name';

/** Whom to call and where things are, as far as somebody wrote it down. */
export async function showHouseNotes({ db, access }: ServiceContext): Promise<HouseNotes> {
  assertMay(access, 'look');
  const stored = await findHouseNotes(db, access.householdId);
  return {
    notes: stored ? notesOf(stored) : {},
    updatedAt: stored && toOffsetIso(stored.updatedAt.getTime(), access.timeZone),
    updatedBy: shownName(stored?.updatedByName ?? null, access.language),
  };
}

/** What was said; what was not said is left out. */
export function notesOf(stored: StoredHouseNotes): HouseNotes['notes'] {
  return Object.fromEntries(houseNoteNames.flatMap((name) => (stored[name] === null ? [] : [[name, stored[name]]])));
}
