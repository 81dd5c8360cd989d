import { sql } from 'drizzle-orm';
import { check, index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { roles } from '@/lib/schemas/week-sheet';
import { oneOf } from './checks';
import { households } from './households';
import { people } from './people';

export const memberships = sqliteTable(
  'memberships',
  {
    id: text('id').primaryKey(),
    householdId: text('household_id')
      .notNull()
      .references(() => households.id, { onDelete: 'cascade' }),
    personId: text('person_id')
      .notNull()
      .references(() => people.id, { onDelete: 'cascade' }),
    role: text('role', { enum: roles }).notNull(),
    /** An owner says that this is an adult who may handle chemicals. */
    chemicalsAllowed: integer('chemicals_allowed', { mode: 'boolean' }).notNull().default(true),
    /** Adult who may dose; counts only while the safety card was read within the season. */
    handlesChemicals: integer('handles_chemicals', { mode: 'boolean' }).notNull().default(false),
    safetyCardReadAt: integer('safety_card_read_at', { mode: 'timestamp_ms' }),
    /** Half-open: from this instant up to, not including, valid_until. */
    validFrom: integer('valid_from', { mode: 'timestamp_ms' }).notNull(),
    validUntil: integer('valid_until', { mode: 'timestamp_ms' }),
  },
  (table) => [
    check('memberships_role_known', oneOf(table.role, roles)),
    check('memberships_valid_in_order', sql`${table.validUntil} is null or ${table.validFrom} < ${table.validUntil}`),
    check(
      'memberships_card_before_chemicals',
      sql`${table.handlesChemicals} = 0 or ${table.safetyCardReadAt} is not null`,
    ),
    check('memberships_viewers_do_not_dose', sql`${table.handlesChemicals} = 0 or ${table.role} <> 'viewer'`),
    /** A person has one open-ended membership in a household at most. */
    uniqueIndex('memberships_one_open_per_person')
      .on(table.householdId, table.personId)
      .where(sql`valid_until is null`),
    index('memberships_person_idx').on(table.personId),
  ],
);
