import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';

/** Fixed windows; survive a restart. */
export const rateLimits = sqliteTable(
  'rate_limits',
  {
    /** Keyed digest of what is limited: no address and no e-mail stands here in the clear. */
    key: text('key').primaryKey(),
    points: integer('points').notNull(),
    expiresAt: integer('expires_at', { mode: 'timestamp_ms' }).notNull(),
  },
  (table) => [index('rate_limits_expires_at_idx').on(table.expiresAt)],
);
