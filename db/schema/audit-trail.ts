import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { households } from './households';
import { people } from './people';

/** Who changed what in a household; append-only. */
export const auditTrail = sqliteTable(
  'audit_trail',
  {
    id: integer('id').primaryKey({ autoIncrement: true }),
    householdId: text('household_id')
      .notNull()
      .references(() => households.id, { onDelete: 'cascade' }),
    /** Null when the server did it, or the person's account is gone. */
    personId: text('person_id').references(() => people.id, { onDelete: 'set null' }),
    at: integer('at', { mode: 'timestamp_ms' }).notNull(),
    /** A verb and a noun, as its service is called: "save-pool". */
    action: text('action').notNull(),
    subjectId: text('subject_id'),
    detail: text('detail', { mode: 'json' }).$type<Record<string, unknown>>(),
  },
  (table) => [index('audit_trail_household_at_idx').on(table.householdId, table.at)],
);
