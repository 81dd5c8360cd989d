import { sql } from 'drizzle-orm';
import { check, index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import type { TryOutChanges } from '@/lib/schemas/try-out';
import type { Wishes } from '@/lib/schemas/wishes';
import { households } from './households';
import { people } from './people';
import { readings } from './readings';

/** What was said of a day before a try-out said otherwise; a null where nothing was. What it left alone is missing. */
export type FormerDay = { day: string; swimmerHours?: number | null; sky?: number | null };

/** Try-outs that were taken into the plan, and those of them that were put back. */
export const tryOuts = sqliteTable(
  'try_outs',
  {
    /** Made on the device: the primary key is what makes a resend harmless. */
    id: text('id').primaryKey(),
    householdId: text('household_id')
      .notNull()
      .references(() => households.id, { onDelete: 'cascade' }),
    takenAt: integer('taken_at', { mode: 'timestamp_ms' }).notNull(),
    takenBy: text('taken_by').references(() => people.id, { onDelete: 'set null' }),
    /** The newest reading then: a count of tablets holds until the next one. Without it the count is over. */
    readingId: text('reading_id').references(() => readings.id, { onDelete: 'set null' }),
    changes: text('changes', { mode: 'json' }).$type<TryOutChanges>().notNull(),
    /** What the changes wish of the plan that they were tried on. */
    wishes: text('wishes', { mode: 'json' }).$type<Wishes>().notNull(),
    former: text('former', { mode: 'json' }).$type<FormerDay[]>().notNull(),
    putBackAt: integer('put_back_at', { mode: 'timestamp_ms' }),
    putBackBy: text('put_back_by').references(() => people.id, { onDelete: 'set null' }),
  },
  (table) => [
    check('try_outs_put_back_after_taken', sql`${table.putBackAt} >= ${table.takenAt}`),
    check('try_outs_put_back_says_when', sql`${table.putBackBy} is null or ${table.putBackAt} is not null`),
    index('try_outs_household_taken_at_idx').on(table.householdId, table.takenAt),
  ],
);
