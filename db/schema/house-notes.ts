import { integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { households } from './households';
import { people } from './people';

/** What somebody who looks after the pool has to find: whom to call, and where things are. One row for each household. */
export const houseNotes = sqliteTable('house_notes', {
  householdId: text('household_id')
    .primaryKey()
    .references(() => households.id, { onDelete: 'cascade' }),
  professionalName: text('professional_name'),
  professionalPhone: text('professional_phone'),
  /** Who is reached while the household is away, and who is near. */
  ourPhone: text('our_phone'),
  neighbourName: text('neighbour_name'),
  neighbourPhone: text('neighbour_phone'),
  gate: text('gate'),
  breaker: text('breaker'),
  pumpSwitch: text('pump_switch'),
  chemicals: text('chemicals'),
  updatedAt: integer('updated_at', { mode: 'timestamp_ms' }).notNull(),
  updatedBy: text('updated_by').references(() => people.id, { onDelete: 'set null' }),
});
