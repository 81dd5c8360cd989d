import { readdirSync, readFileSync } from 'node:fs';
import { randomUUID } from 'node:crypto';
import { sql } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { openDatabase } from '@/db/client';
import { prepareDatabase } from '@/db/migrate';
import { people } from '@/db/schema';
import { freshFile } from '@/tests/support/test-database';

const now = new Date('2026-07-05T12:00:00Z');

/** The tables that migrations after a first one make, in the order in which they can go again. */
function tablesMadeAfter(first: string): string[] {
  const later = readdirSync('drizzle').filter((file) => file.endsWith('.sql') && file !== `${first}.sql`);
  return later
    .toSorted()
    .flatMap((file) => [...readFileSync(`drizzle/${file}`, 'utf8').matchAll(/CREATE TABLE `(\w+)`/g)])
    .map(([, table]) => table!)
    .toReversed();
}

describe('prepareDatabase', () => {
  it('turns on the write-ahead log and copies nothing when the file is new or up to date', async () => {
    const url = `file:${freshFile()}`;
    const db = openDatabase(url);
    expect(await prepareDatabase(db, url, now)).toBeNull();
    expect(await db.get(sql`PRAGMA journal_mode`)).toMatchObject({ journal_mode: 'wal' });
    expect(await prepareDatabase(db, url, now)).toBeNull();
  });

  it('copies a database that holds something before it migrates it', async () => {
    const url = `file:${freshFile()}`;
    const db = openDatabase(url);
    await prepareDatabase(db, url, now);
    await db.insert(people).values({ id: randomUUID(), name: 'Ines', createdAt: now });
    const journal = JSON.parse(readFileSync('drizzle/meta/_journal.json', 'utf8')) as {
      entries: { when: number; tag: string }[];
    };
    const second = journal.entries[1];
    if (!second) throw new Error('There is no second migration.');
    // As if everything after the first migration were still to come.
    const triggers = await db.all<{ name: string }>(sql`SELECT name FROM sqlite_master WHERE type = 'trigger'`);
    for (const { name } of triggers) await db.run(sql.raw(`DROP TRIGGER "${name}"`));
    for (const table of tablesMadeAfter(journal.entries[0]!.tag)) await db.run(sql.raw(`DROP TABLE ${table}`));
    await db.run(sql`ALTER TABLE pools DROP COLUMN learning_from`);
    await db.run(sql`ALTER TABLE people DROP COLUMN language`);
    await db.run(sql`ALTER TABLE people DROP COLUMN tour_closed_at`);
    await db.run(sql`ALTER TABLE people DROP COLUMN deleted_at`);
    await db.run(sql`ALTER TABLE memberships DROP COLUMN chemicals_allowed`);
    await db.run(sql`DELETE FROM __drizzle_migrations WHERE created_at >= ${second.when}`);

    const copy = await prepareDatabase(db, url, now);
    if (copy === null) throw new Error('Nothing was copied.');
    const before = openDatabase(`file:${copy}`);
    expect(await before.select({ name: people.name }).from(people)).toEqual([{ name: 'Ines' }]);
    expect(await before.all(sql`SELECT 1 FROM sqlite_master WHERE type = 'trigger'`)).toEqual([]);
    expect(await db.all(sql`SELECT 1 FROM sqlite_master WHERE type = 'trigger'`)).toHaveLength(triggers.length);
  });
});
