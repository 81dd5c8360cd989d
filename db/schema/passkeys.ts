import { sql } from 'drizzle-orm';
import { blob, check, index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { people } from './people';

/** What a person signs in with instead of a password: a key of their device, of which only the public half is here. */
export const passkeys = sqliteTable(
  'passkeys',
  {
    /** The credential's own id in base64url, made by the device: nobody can register one that is taken. */
    id: text('id').primaryKey(),
    personId: text('person_id')
      .notNull()
      .references(() => people.id, { onDelete: 'cascade' }),
    /** As the device gave it, in COSE form. */
    publicKey: blob('public_key', { mode: 'buffer' }).notNull(),
    /** How often it has signed, by its own count; devices that share their passkeys keep it at 0. */
    counter: integer('counter').notNull(),
    /** How the browser reaches it. */
    transports: text('transports', { mode: 'json' }).$type<string[]>().notNull(),
    /** What the person calls it. */
    name: text('name').notNull(),
    /** Whether it is kept in more places than one. */
    backedUp: integer('backed_up', { mode: 'boolean' }).notNull(),
    createdAt: integer('created_at', { mode: 'timestamp_ms' }).notNull(),
    lastUsedAt: integer('last_used_at', { mode: 'timestamp_ms' }),
  },
  (table) => [
    check('passkeys_name_has_length', sql`length(${table.name}) between 1 and 80`),
    check('passkeys_counter_in_range', sql`${table.counter} between 0 and 4294967295`),
    index('passkeys_person_created_at_idx').on(table.personId, table.createdAt),
  ],
);
