import { sql } from 'drizzle-orm';
import { check, index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { poolEventKinds } from '@/lib/schemas/pool-event';
import { oneOf } from './checks';
import { households } from './households';
import { people } from './people';

/** What happened to a pool between tests and ends a verdict: a storm, a pump that failed, a cover that came off. */
export const poolEvents = sqliteTable(
  'pool_events',
  {
    /** Made on the device: the primary key is what makes a resend harmless. */
    id: text('id').primaryKey(),
    householdId: text('household_id')
      .notNull()
      .references(() => households.id, { onDelete: 'cascade' }),
    kind: text('kind', { enum: poolEventKinds }).notNull(),
    /** When it happened, as the person says; not when the row was written. */
    happenedAt: integer('happened_at', { mode: 'timestamp_ms' }).notNull(),
    createdAt: integer('created_at', { mode: 'timestamp_ms' }).notNull(),
    reportedBy: text('reported_by').references(() => people.id, { onDelete: 'set null' }),
    /** Said to be over, or never to have been. */
    endedAt: integer('ended_at', { mode: 'timestamp_ms' }),
    endedBy: text('ended_by').references(() => people.id, { onDelete: 'set null' }),
  },
  (table) => [
    check('pool_events_kind_known', oneOf(table.kind, poolEventKinds)),
    check('pool_events_not_from_the_future', sql`${table.happenedAt} <= ${table.createdAt} + 60000`),
    index('pool_events_household_happened_at_idx').on(table.householdId, table.happenedAt),
  ],
);
