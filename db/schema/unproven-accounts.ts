import { sql } from 'drizzle-orm';
import { check, index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { people } from './people';

/**
 * What somebody signs in with before they have shown that they read the mail of that address. Several people may have given
 * one: whoever asks for an address is not told by its row whether somebody else has it. Once shown, it moves to `people`.
 */
export const unprovenAccounts = sqliteTable(
  'unproven_accounts',
  {
    personId: text('person_id')
      .primaryKey()
      .references(() => people.id, { onDelete: 'cascade' }),
    /** Lower case. */
    email: text('email').notNull(),
    /** Argon2id in its PHC text form. */
    passwordHash: text('password_hash').notNull(),
    createdAt: integer('created_at', { mode: 'timestamp_ms' }).notNull(),
  },
  (table) => [
    check('unproven_accounts_email_is_normalised', sql`${table.email} = lower(trim(${table.email}))`),
    index('unproven_accounts_email_idx').on(table.email, table.createdAt),
  ],
);
