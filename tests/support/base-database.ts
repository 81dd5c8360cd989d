import { mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import type { TestProject } from 'vitest/node';
import { openDatabase } from '@/db/client';
import { prepareDatabase } from '@/db/migrate';

declare module 'vitest' {
  export interface ProvidedContext {
    /** An empty database built by the real migrations; tests copy the file. */
    baseDatabase: string;
  }
}

/** Once per run, in a folder of the run's own: two runs in one tree do not disturb each other. */
export default async function buildBaseDatabase(project: TestProject): Promise<() => void> {
  const parent = join(process.cwd(), 'tests', '.databases');
  mkdirSync(parent, { recursive: true });
  const folder = mkdtempSync(join(parent, 'run-'));
  const file = join(folder, 'base-test.db');
  const db = openDatabase(`file:${file}`);
  await prepareDatabase(db, `file:${file}`, new Date());
  // The copy is of the one file: nothing may be left in the write-ahead log.
  await db.$client.execute('PRAGMA wal_checkpoint(TRUNCATE)');
  db.$client.close();
  project.provide('baseDatabase', file);
  return () => {
    rmSync(folder, { recursive: true, force: true });
  };
}
