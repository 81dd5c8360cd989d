import 'server-only';
import { mkdirSync } from 'node:fs';
import { basename, dirname, join } from 'node:path';
import { sql } from 'drizzle-orm';
import { migrate } from 'drizzle-orm/libsql/migrator';
import { readMigrationFiles } from 'drizzle-orm/migrator';
import type { Database } from './client';

const migrationsFolder = join(process.cwd(), 'drizzle');

/**
 * Brings a database up to date at the start of the server: journal, promises of the connection, migrations. The file of a
 * database that holds something is copied before it is changed.
 *
 * @returns where the copy lies, or null when none was needed
 */
export async function prepareDatabase(db: Database, url: string, now: Date): Promise<string | null> {
  const isFile = url.startsWith('file:');
  if (isFile) {
    await db.get(sql`PRAGMA journal_mode = WAL`);
    await assertPromises(db);
  }
  const applied = await lastAppliedMigration(db);
  const isBehind = readMigrationFiles({ migrationsFolder }).some(({ folderMillis }) => folderMillis > (applied ?? 0));
  const copy = isFile && isBehind && applied !== null ? await copyOf(db, url.slice('file:'.length), now) : null;
  await migrate(db, { migrationsFolder });
  return copy;
}

/** Full synchronisation and foreign keys are the defaults measured; a version that changes them must not start. */
async function assertPromises(db: Database): Promise<void> {
  const synchronous = await db.get<{ synchronous: number }>(sql`PRAGMA synchronous`);
  const keys = await db.get<{ foreign_keys: number }>(sql`PRAGMA foreign_keys`);
  if (synchronous.synchronous !== 2) throw new Error('The database does not wait for the disk (PRAGMA synchronous).');
  if (keys.foreign_keys !== 1) throw new Error('The database does not check foreign keys (PRAGMA foreign_keys).');
}

async function lastAppliedMigration(db: Database): Promise<number | null> {
  const table = await db.all(sql`SELECT 1 FROM sqlite_master WHERE type = 'table' AND name = '__drizzle_migrations'`);
  if (table.length === 0) return null;
  const { last } = await db.get<{ last: number | null }>(sql`SELECT max(created_at) AS last FROM __drizzle_migrations`);
  return last;
}

async function copyOf(db: Database, file: string, now: Date): Promise<string> {
  const folder = join(dirname(file), 'backups');
  mkdirSync(folder, { recursive: true });
  const stamp = now.toISOString().replaceAll(':', '-');
  const copy = join(folder, `${basename(file, '.db')}-before-migration-${stamp}.db`);
  // Not a copy of the file: what stands in the write-ahead log belongs to it too.
  await db.run(sql`VACUUM INTO ${copy}`);
  return copy;
}
