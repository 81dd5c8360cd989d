import { sql } from 'drizzle-orm';
import { check, index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { isDay } from './checks';
import { households } from './households';
import { memberships } from './memberships';
import { people } from './people';

/** Who looks after the pool while the others are away. Days of the household; nothing of it is written into memberships. */
export const handOvers = sqliteTable(
  'hand_overs',
  {
    /** Made on the device: the primary key is what makes a resend harmless. */
    id: text('id').primaryKey(),
    householdId: text('household_id')
      .notNull()
      .references(() => households.id, { onDelete: 'cascade' }),
    membershipId: text('membership_id')
      .notNull()
      .references(() => memberships.id, { onDelete: 'cascade' }),
    fromDay: text('from_day').notNull(),
    /** The last day away. */
    untilDay: text('until_day').notNull(),
    /** An owner says that this is an adult who may handle chemicals in these days. */
    chemicalsAllowed: integer('chemicals_allowed', { mode: 'boolean' }).notNull(),
    createdBy: text('created_by').references(() => people.id, { onDelete: 'set null' }),
    createdAt: integer('created_at', { mode: 'timestamp_ms' }).notNull(),
    /** Until then it has no effect. */
    agreedAt: integer('agreed_at', { mode: 'timestamp_ms' }),
    /** Taken back by an owner, or declined. */
    endedAt: integer('ended_at', { mode: 'timestamp_ms' }),
  },
  (table) => [
    check('hand_overs_from_is_day', isDay(table.fromDay)),
    check('hand_overs_until_is_day', isDay(table.untilDay)),
    check('hand_overs_days_in_order', sql`${table.fromDay} <= ${table.untilDay}`),
    index('hand_overs_household_idx').on(table.householdId, table.untilDay),
  ],
);
