import { sql } from 'drizzle-orm';
import { check, foreignKey, index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { households } from './households';
import { planDoses } from './plan-doses';

/** Whole tablets that were left in the feeder before a dose of new ones: they tell how long tablets last. */
export const tabletsFound = sqliteTable(
  'tablets_found',
  {
    doseId: text('dose_id').primaryKey(),
    householdId: text('household_id')
      .notNull()
      .references(() => households.id, { onDelete: 'cascade' }),
    tablets: integer('tablets').notNull(),
  },
  (table) => [
    foreignKey({
      name: 'tablets_found_dose_of_the_household',
      columns: [table.householdId, table.doseId],
      foreignColumns: [planDoses.householdId, planDoses.id],
    }).onDelete('cascade'),
    check('tablets_found_in_range', sql`${table.tablets} between 0 and 50`),
    index('tablets_found_household_idx').on(table.householdId),
  ],
);
