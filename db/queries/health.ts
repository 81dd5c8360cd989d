import 'server-only';
import { sql } from 'drizzle-orm';
import type { DatabaseOrTransaction } from '@/db/client';

/** Asks for one row of a migrated table; fails when there is no database behind the file. */
export async function readDatabaseHealth(db: DatabaseOrTransaction): Promise<void> {
  await db.get(sql`SELECT count(*) AS applied FROM __drizzle_migrations`);
}
