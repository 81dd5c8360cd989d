import { check, integer, real, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { between } from './checks';
import { households } from './households';

/** How a household weighs money, evenings and steadiness; no row means the usual weights. */
export const preferences = sqliteTable(
  'preferences',
  {
    householdId: text('household_id')
      .primaryKey()
      .references(() => households.id, { onDelete: 'cascade' }),
    visits: integer('visits').notNull(),
    money: real('money').notNull(),
    evenings: real('evenings').notNull(),
    steadiness: real('steadiness').notNull(),
    /** Substances, forms or shelf ids that are not to be planned. */
    avoid: text('avoid', { mode: 'json' }).$type<string[]>().notNull(),
  },
  (table) => [
    check('preferences_visits_in_a_week', between(table.visits, 1, 7)),
    check('preferences_money_in_range', between(table.money, 0, 3)),
    check('preferences_evenings_in_range', between(table.evenings, 0, 3)),
    check('preferences_steadiness_in_range', between(table.steadiness, 0, 3)),
  ],
);
