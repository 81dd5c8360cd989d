import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import {
  findReading,
  insertReading,
  listReadings,
  replaceReading,
  deleteReading,
  listReadingVersions,
} from '@/db/queries/readings';
import type { NewReading } from '@/lib/schemas/reading';
import { aHousehold, freshDatabase } from '@/tests/support/test-database';

const now = new Date('2026-07-05T12:00:00Z');
const july = { from: new Date('2026-07-01T00:00:00Z'), until: new Date('2026-08-01T00:00:00Z') };
const aReading = (): NewReading => ({
  id: randomUUID(),
  takenAt: '2026-07-05T07:00:00-04:00',
  kind: 'full',
  method: 'strip',
  values: { freeChlorine: { low: 1, high: 3 }, pH: 7.4, cyanuricAcid: { low: 40, high: 40 } },
  look: 'clear',
});

describe('readings', () => {
  it('keeps numbers as numbers and intervals as intervals, one of no width too', async () => {
    const db = freshDatabase();
    const { householdId, personId } = await aHousehold(db);
    const reading = aReading();
    await insertReading(db, { householdId, reading, doneBy: personId, recordedBy: personId, now });
    const [stored] = await listReadings(db, { householdId, ...july });
    expect(stored).toMatchObject({
      id: reading.id,
      takenAt: new Date('2026-07-05T11:00:00Z'),
      createdAt: now,
      values: reading.values,
      doneByName: 'Ines',
    });
  });

  it('keeps a resent reading once', async () => {
    const db = freshDatabase();
    const { householdId } = await aHousehold(db);
    const sent = { householdId, reading: aReading(), doneBy: null, recordedBy: null, now };
    expect(await insertReading(db, sent)).toBe('added');
    expect(await insertReading(db, sent)).toBe('already-recorded');
    expect(await listReadings(db, { householdId, ...july })).toHaveLength(1);
  });

  it('never shows, corrects or deletes a reading of another household', async () => {
    const db = freshDatabase();
    const mine = await aHousehold(db);
    const { householdId } = await aHousehold(db);
    const reading = aReading();
    await insertReading(db, { householdId: mine.householdId, reading, doneBy: null, recordedBy: null, now });
    expect(await listReadings(db, { householdId, ...july })).toEqual([]);
    expect(await findReading(db, householdId, reading.id)).toBeNull();
    expect(await replaceReading(db, { householdId, reading, replacedBy: null, now })).toBe(false);
    expect(await deleteReading(db, { householdId, id: reading.id, now })).toBe(false);
    expect(await insertReading(db, { householdId, reading, doneBy: null, recordedBy: null, now })).toBe(
      'already-recorded',
    );
    expect(await listReadings(db, { householdId: mine.householdId, ...july })).toHaveLength(1);
  });

  it('keeps what a reading was before its correction', async () => {
    const db = freshDatabase();
    const { householdId, personId } = await aHousehold(db);
    const reading = aReading();
    await insertReading(db, { householdId, reading, doneBy: null, recordedBy: null, now });
    const corrected = { ...reading, values: { freeChlorine: 2.5, pH: 7.4 } };
    expect(await replaceReading(db, { householdId, reading: corrected, replacedBy: personId, now })).toBe(true);
    expect((await findReading(db, householdId, reading.id))?.values).toEqual(corrected.values);
    expect(await listReadingVersions(db, householdId, reading.id)).toMatchObject([
      { replacedAt: now, replacedBy: personId, former: { values: reading.values } },
    ]);
  });
});
