import { check, index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { isDay } from './checks';
import { households } from './households';
import { people } from './people';

/** Visits of a professional: the day, and what was done. */
export const visits = sqliteTable(
  'visits',
  {
    /** Made on the device: the primary key is what makes a resend harmless. */
    id: text('id').primaryKey(),
    householdId: text('household_id')
      .notNull()
      .references(() => households.id, { onDelete: 'cascade' }),
    visitedOn: text('visited_on').notNull(),
    note: text('note'),
    createdAt: integer('created_at', { mode: 'timestamp_ms' }).notNull(),
    recordedBy: text('recorded_by').references(() => people.id, { onDelete: 'set null' }),
  },
  (table) => [
    check('visits_day_is_a_day', isDay(table.visitedOn)),
    index('visits_household_day_idx').on(table.householdId, table.visitedOn),
  ],
);
