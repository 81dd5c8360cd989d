import { check, index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { sql } from 'drizzle-orm';
import type { PosteriorStep } from '@/lib/schemas/posterior';
import { households } from './households';
import { readings } from './readings';

/** What the pool had taught by each reading. A copy of what the readings say: it can be worked out again at any time. */
export const posteriors = sqliteTable(
  'posteriors',
  {
    readingId: text('reading_id')
      .primaryKey()
      .references(() => readings.id, { onDelete: 'cascade' }),
    householdId: text('household_id')
      .notNull()
      .references(() => households.id, { onDelete: 'cascade' }),
    takenAt: integer('taken_at', { mode: 'timestamp_ms' }).notNull(),
    engineVersion: text('engine_version').notNull(),
    /** Over engine version, pool and everything up to the reading: while it is unchanged the step stands. */
    inputHash: text('input_hash').notNull(),
    /** What is known after the reading, and what became of its values. */
    step: text('step', { mode: 'json' }).$type<PosteriorStep>().notNull(),
    createdAt: integer('created_at', { mode: 'timestamp_ms' }).notNull(),
  },
  (table) => [
    index('posteriors_household_taken_at_idx').on(table.householdId, table.takenAt),
    check('posteriors_hash_is_one', sql`length(${table.inputHash}) = 64`),
  ],
);
