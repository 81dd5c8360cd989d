import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { households } from './households';
import { people } from './people';

/** Who has confirmed, by name, that they have read the Stop of a product; append-only, the newest one counts. */
export const stopConfirmations = sqliteTable(
  'stop_confirmations',
  {
    /** Made on the device: the primary key is what makes a resend harmless. */
    id: text('id').primaryKey(),
    householdId: text('household_id')
      .notNull()
      .references(() => households.id, { onDelete: 'cascade' }),
    personId: text('person_id')
      .notNull()
      .references(() => people.id, { onDelete: 'cascade' }),
    /** What the product was then: substance, form, strength and label way. A change asks again. */
    product: text('product').notNull(),
    confirmedAt: integer('confirmed_at', { mode: 'timestamp_ms' }).notNull(),
  },
  (table) => [index('stop_confirmations_person_idx').on(table.householdId, table.personId, table.product)],
);
