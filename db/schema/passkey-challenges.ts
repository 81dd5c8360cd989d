import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { people } from './people';

/** What a device was asked to sign: each may be answered once, and for a few minutes. */
export const passkeyChallenges = sqliteTable(
  'passkey_challenges',
  {
    /** Keyed digest of the challenge: who reads the table cannot answer one. */
    digest: text('digest').primaryKey(),
    /** Who adds a passkey with it; null for signing in, where nobody is known yet. */
    personId: text('person_id').references(() => people.id, { onDelete: 'cascade' }),
    expiresAt: integer('expires_at', { mode: 'timestamp_ms' }).notNull(),
  },
  (table) => [
    index('passkey_challenges_expires_at_idx').on(table.expiresAt),
    index('passkey_challenges_person_idx').on(table.personId),
  ],
);
