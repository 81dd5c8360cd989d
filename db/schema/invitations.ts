import { sql } from 'drizzle-orm';
import { check, index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { roles } from '@/lib/schemas/week-sheet';
import { oneOf } from './checks';
import { households } from './households';
import { people } from './people';

/** Who was asked to join: single use, for seven days, until it is withdrawn. */
export const invitations = sqliteTable(
  'invitations',
  {
    /** Made on the device: the primary key is what makes a resend harmless. */
    id: text('id').primaryKey(),
    householdId: text('household_id')
      .notNull()
      .references(() => households.id, { onDelete: 'cascade' }),
    /** A keyed digest of what stands in the link: who reads the table cannot join with it. */
    tokenDigest: text('token_digest').notNull().unique(),
    /** What the household calls whoever is meant. */
    name: text('name').notNull(),
    /** Where the link goes by mail; null when it is handed over by whoever invites, and once it is used. */
    email: text('email'),
    role: text('role', { enum: roles }).notNull(),
    chemicalsAllowed: integer('chemicals_allowed', { mode: 'boolean' }).notNull(),
    createdAt: integer('created_at', { mode: 'timestamp_ms' }).notNull(),
    createdBy: text('created_by').references(() => people.id, { onDelete: 'set null' }),
    expiresAt: integer('expires_at', { mode: 'timestamp_ms' }).notNull(),
    usedAt: integer('used_at', { mode: 'timestamp_ms' }),
    usedBy: text('used_by').references(() => people.id, { onDelete: 'set null' }),
    withdrawnAt: integer('withdrawn_at', { mode: 'timestamp_ms' }),
  },
  (table) => [
    check('invitations_role_known', oneOf(table.role, roles)),
    check('invitations_name_has_length', sql`length(${table.name}) between 1 and 80`),
    check('invitations_viewers_do_not_dose', sql`${table.chemicalsAllowed} = 0 or ${table.role} <> 'viewer'`),
    check('invitations_used_or_withdrawn', sql`${table.usedAt} is null or ${table.withdrawnAt} is null`),
    index('invitations_household_idx').on(table.householdId, table.createdAt),
  ],
);
