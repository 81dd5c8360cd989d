import 'server-only';
import { writeAudit } from '@/db/queries/audit-trail';
import { findHouseNotes, saveHouseNotes as saveRow } from '@/db/queries/house-notes';
import { inWriteTransaction } from '@/db/write';
import { assertMay } from '@/lib/auth/permissions';
import { houseNoteNames, type HouseNotes, type NewHouseNotes } from '@/lib/schemas/house-note';
import type { ServiceContext } from './context';
import { notesOf, showHouseNotes } from './show-house-notes';

/** Replaces the house notes; what they were is kept in the record. Saved again as they are, nothing is written. */
export async function saveHouseNotes(context: ServiceContext, notes: NewHouseNotes): Promise<HouseNotes> {
  const { db, access, now } = context;
  assertMay(access, 'keep-house-notes');
  const { householdId, personId } = access;
  await inWriteTransaction(db, async (tx) => {
    const stored = await findHouseNotes(tx, householdId);
    const before: NewHouseNotes = stored ? notesOf(stored) : {};
    if (houseNoteNames.every((name) => before[name] === notes[name])) return;
    await saveRow(tx, { householdId, personId, values: valuesOf(notes), now });
    const detail = { before, after: notes };
    await writeAudit(tx, { householdId, personId, at: now, action: 'save-house-notes', detail });
  });
  return showHouseNotes(context);
}

/** All columns, so that what was said before and is not said now is taken away. */
function valuesOf(notes: NewHouseNotes) {
  return {
    professionalName: notes.professionalName ?? null,
    professionalPhone: notes.professionalPhone ?? null,
    ourPhone: notes.ourPhone ?? null,
    neighbourName: notes.neighbourName ?? null,
    neighbourPhone: notes.neighbourPhone ?? null,
    gate: notes.gate ?? null,
    breaker: notes.breaker ?? null,
    pumpSwitch: notes.pumpSwitch ?? null,
    chemicals: notes.chemicals ?? null,
  };
}
