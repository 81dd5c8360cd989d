import { sql } from 'drizzle-orm';
import { check, index, integer, real, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { GAUGE, type RoundItem } from '@/lib/schemas/round-items';
import { between } from './checks';
import { households } from './households';
import { people } from './people';

/** Ten-minute rounds: who walked round the pool when, and what was not fine. */
export const rounds = sqliteTable(
  'rounds',
  {
    /** Made on the device: the primary key is what makes a resend harmless. */
    id: text('id').primaryKey(),
    householdId: text('household_id')
      .notNull()
      .references(() => households.id, { onDelete: 'cascade' }),
    doneAt: integer('done_at', { mode: 'timestamp_ms' }).notNull(),
    createdAt: integer('created_at', { mode: 'timestamp_ms' }).notNull(),
    doneBy: text('done_by').references(() => people.id, { onDelete: 'set null' }),
    /** What was not fine; an empty list when all was. */
    exceptions: text('exceptions', { mode: 'json' }).$type<RoundItem[]>().notNull(),
    pressure: real('pressure_bar'),
    cleanPressure: real('clean_pressure_bar'),
  },
  (table) => [
    check('rounds_not_from_the_future', sql`${table.doneAt} <= ${table.createdAt} + 60000`),
    check('rounds_pressure_in_range', between(table.pressure, ...GAUGE)),
    check('rounds_clean_pressure_in_range', between(table.cleanPressure, ...GAUGE)),
    index('rounds_household_done_at_idx').on(table.householdId, table.doneAt),
  ],
);
