import { beforeAll, describe, expect, it } from 'vitest';
import { listAudit } from '@/db/queries/audit-trail';
import { newHouseNotesSchema } from '@/lib/schemas/house-note';
import { checkInput } from '@/lib/schemas/problems';
import type { ServiceContext } from '@/lib/services/context';
import { saveHouseNotes } from '@/lib/services/save-house-notes';
import { showHouseNotes } from '@/lib/services/show-house-notes';
import { aPoolHousehold, at, hoursLater } from '@/tests/support/pool-household';
import { freshDatabase } from '@/tests/support/test-database';

const notes = {
  professionalName: 'The pool firm in the lane',
  professionalPhone: '+49 (0)30 1234-56',
  ourPhone: '0170 555 01',
  gate: 'Key under the third pot; lift the latch.',
};

describe('house notes', () => {
  let owner: ServiceContext;
  beforeAll(async () => {
    owner = await aPoolHousehold(freshDatabase());
  });

  it('are empty, then what was saved, then replaced as a whole; what they were stays in the record', async () => {
    expect(await showHouseNotes(owner)).toEqual({ notes: {}, updatedAt: null, updatedBy: null });
    const saved = await saveHouseNotes(owner, notes);
    expect(saved).toMatchObject({ notes, updatedBy: owner.access.personName });
    const later = at(owner, hoursLater(3));
    const shown = await saveHouseNotes(later, { breaker: 'Cellar, the green one' });
    expect(shown.notes).toEqual({ breaker: 'Cellar, the green one' });
    expect(Date.parse(shown.updatedAt ?? '')).toBe(later.now.getTime());
    const [entry] = await listAudit(owner.db, owner.access.householdId);
    expect(entry).toMatchObject({ action: 'save-house-notes', detail: { before: notes } });
  });

  it('sent twice are the same', async () => {
    await saveHouseNotes(owner, notes);
    expect((await saveHouseNotes(owner, notes)).notes).toEqual(notes);
  });

  it('are kept by a caretaker; a viewer sees them and changes nothing; another household sees its own', async () => {
    await saveHouseNotes({ ...owner, access: { ...owner.access, role: 'caretaker' } }, notes);
    const viewer = { ...owner, access: { ...owner.access, role: 'viewer' as const } };
    await expect(saveHouseNotes(viewer, {})).rejects.toMatchObject({ code: 'not-allowed' });
    expect((await showHouseNotes(viewer)).notes).toEqual(notes);
    expect((await showHouseNotes(await aPoolHousehold(owner.db))).notes).toEqual({});
  });

  it.each([
    ['a phone with letters', { ourPhone: 'call Ines' }, 'ourPhone', /digits, spaces/],
    ['a phone without enough digits', { neighbourPhone: '+ 1' }, 'neighbourPhone', 'Write the whole number.'],
    ['a place that fills the page', { gate: 'x'.repeat(161) }, 'gate', /160 characters/],
    ['a name that is only spaces', { neighbourName: '  ' }, 'neighbourName', /leave it empty/],
    ['a field it does not know', { code: '1234' }, 'code', /does not know this field/],
  ])('says what is wrong with %s', (_, wrong, path, message) => {
    const checked = checkInput(newHouseNotesSchema, { ...notes, ...wrong });
    expect(checked).toMatchObject({ sound: false });
    if (!checked.sound)
      expect(checked.problems[0]).toEqual({ path, message: expect.stringMatching(message) as string });
  });
});
