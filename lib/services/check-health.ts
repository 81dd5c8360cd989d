import 'server-only';
import { readDatabaseHealth } from '@/db/queries/health';
import type { Database } from '@/db/client';
import type { Health } from '@/lib/schemas/health';

/** Whether the database answers. A fault is thrown: the wrapper makes a 500 of it. */
export async function checkHealth({ db }: { db: Database }): Promise<Health> {
  await readDatabaseHealth(db);
  return { status: 'ok' };
}
