import { sql } from 'drizzle-orm';
import { check, index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { unitSystems } from '@/lib/schemas/week-sheet';
import { oneOf } from './checks';

export const households = sqliteTable(
  'households',
  {
    id: text('id').primaryKey(),
    name: text('name').notNull(),
    /** IANA name: a day of this household starts and ends by it. */
    timeZone: text('time_zone').notNull(),
    unitSystem: text('unit_system', { enum: unitSystems }).notNull(),
    /** Language and habits of writing, a BCP 47 tag. */
    locale: text('locale').notNull(),
    demo: integer('demo', { mode: 'boolean' }).notNull().default(false),
    /** Set on the private copies of the demo household: the clean-up deletes them after this instant. */
    expiresAt: integer('expires_at', { mode: 'timestamp_ms' }),
    createdAt: integer('created_at', { mode: 'timestamp_ms' }).notNull(),
  },
  (table) => [
    check('households_unit_system_known', oneOf(table.unitSystem, unitSystems)),
    check('households_name_has_length', sql`length(${table.name}) between 1 and 80`),
    check('households_only_demo_copies_expire', sql`${table.expiresAt} is null or ${table.demo} = 1`),
    uniqueIndex('households_one_demo_original')
      .on(table.demo)
      .where(sql`demo = 1 and expires_at is null`),
    index('households_expires_at_idx').on(table.expiresAt),
  ],
);
