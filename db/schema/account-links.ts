import { sql } from 'drizzle-orm';
import { check, index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { accountLinkPurposes } from '@/lib/schemas/account-link';
import { oneOf } from './checks';
import { people } from './people';

/** What a link in a mail to one person opens, once: their address, or another password. */
export const accountLinks = sqliteTable(
  'account_links',
  {
    /** A keyed digest of what stands in the link: who reads the table cannot open anything with it. */
    tokenDigest: text('token_digest').primaryKey(),
    personId: text('person_id')
      .notNull()
      .references(() => people.id, { onDelete: 'cascade' }),
    purpose: text('purpose', { enum: accountLinkPurposes }).notNull(),
    /** The address that the link was sent to. */
    email: text('email').notNull(),
    createdAt: integer('created_at', { mode: 'timestamp_ms' }).notNull(),
    expiresAt: integer('expires_at', { mode: 'timestamp_ms' }).notNull(),
    usedAt: integer('used_at', { mode: 'timestamp_ms' }),
  },
  (table) => [
    check('account_links_purpose_known', oneOf(table.purpose, accountLinkPurposes)),
    check('account_links_email_is_normalised', sql`${table.email} = lower(trim(${table.email}))`),
    index('account_links_person_idx').on(table.personId),
    index('account_links_expires_at_idx').on(table.expiresAt),
  ],
);
