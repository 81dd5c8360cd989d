import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import type { Device } from '@/lib/schemas/device';
import { households } from './households';
import { people } from './people';

/** Shaped as the session package wants it. */
export const sessions = sqliteTable(
  'sessions',
  {
    /** Keyed digest of the token in the cookie: who reads this table cannot sign in with it. */
    id: text('id').primaryKey(),
    userId: text('person_id')
      .notNull()
      .references(() => people.id, { onDelete: 'cascade' }),
    /** Unix seconds, not milliseconds: the session package reads and writes it. */
    expiresAt: integer('expires_at').notNull(),
    /** The household that this device looks at. */
    householdId: text('household_id').references(() => households.id, { onDelete: 'set null' }),
    /** Two words of a closed list, worked out when it began; what the browser said of itself is not kept. */
    device: text('device', { mode: 'json' }).$type<Device>(),
    startedAt: integer('started_at', { mode: 'timestamp_ms' }),
    /** To the hour: a session is not written at each request. */
    lastSeenAt: integer('last_seen_at', { mode: 'timestamp_ms' }),
  },
  (table) => [index('sessions_person_idx').on(table.userId), index('sessions_expires_at_idx').on(table.expiresAt)],
);
