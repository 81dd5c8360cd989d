import 'server-only';
import { mkdirSync } from 'node:fs';
import { dirname } from 'node:path';
import { type Client, createClient } from '@libsql/client';
import type { ExtractTablesWithRelations } from 'drizzle-orm';
import { drizzle, type LibSQLDatabase } from 'drizzle-orm/libsql';
import type { SQLiteTransaction } from 'drizzle-orm/sqlite-core';
import type { ResultSet } from '@libsql/client';
import { environment } from '@/lib/env';
import * as schema from './schema';
import { takingTurns } from './turns';

type Schema = typeof schema;
export type Database = LibSQLDatabase<Schema> & { $client: Client };
export type Transaction = SQLiteTransaction<'async', ResultSet, Schema, ExtractTablesWithRelations<Schema>>;
/** What a query needs: it does not care whether it runs inside a transaction. */
export type DatabaseOrTransaction = Database | Transaction;

/** Waiting for the lock blocks the whole process, so it is kept short; `db/write.ts` waits the rest without blocking. */
const busyTimeoutMilliseconds = 100;

/** Opens a database. A file is made together with its folder. */
export function openDatabase(url: string, authToken?: string): Database {
  const isFile = url.startsWith('file:');
  if (isFile) mkdirSync(dirname(url.slice('file:'.length)), { recursive: true });
  const client = createClient({
    url,
    timeout: busyTimeoutMilliseconds,
    ...(authToken === undefined ? {} : { authToken }),
  });
  return drizzle({ client: isFile ? takingTurns(client) : client, schema });
}

const shared = globalThis as { wadewellDatabase?: Database };

/** The one database of this process, opened at the first call: the build imports every route and must not touch it. */
export function database(): Database {
  const { databaseUrl, databaseAuthToken } = environment();
  shared.wadewellDatabase ??= openDatabase(databaseUrl, databaseAuthToken);
  return shared.wadewellDatabase;
}
