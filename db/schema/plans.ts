import { sql } from 'drizzle-orm';
import { check, index, integer, sqliteTable, text, unique, uniqueIndex } from 'drizzle-orm/sqlite-core';
import type { WeekPlan } from '@/lib/schemas/plan';
import type { Scenario } from '@/lib/schemas/scenario';
import { households } from './households';
import { readings } from './readings';

/** Plans as they were promised: never recomputed, never deleted by a newer one. */
export const plans = sqliteTable(
  'plans',
  {
    id: text('id').primaryKey(),
    householdId: text('household_id')
      .notNull()
      .references(() => households.id, { onDelete: 'cascade' }),
    /** Counts up within the household; a tick says which version its person looked at. */
    version: integer('version').notNull(),
    engineVersion: text('engine_version').notNull(),
    /** Over engine version and snapshot: while it is unchanged the plan stands. */
    inputHash: text('input_hash').notNull(),
    readingId: text('reading_id')
      .notNull()
      .references(() => readings.id, { onDelete: 'no action' }),
    takenAt: integer('taken_at', { mode: 'timestamp_ms' }).notNull(),
    endsAt: integer('ends_at', { mode: 'timestamp_ms' }).notNull(),
    createdAt: integer('created_at', { mode: 'timestamp_ms' }).notNull(),
    /** What it was made from, whole. */
    snapshot: text('snapshot', { mode: 'json' }).$type<Scenario>().notNull(),
    /** What came out, promised band included. */
    result: text('result', { mode: 'json' }).$type<WeekPlan>().notNull(),
    supersededAt: integer('superseded_at', { mode: 'timestamp_ms' }),
  },
  (table) => [
    unique('plans_household_version').on(table.householdId, table.version),
    unique('plans_household_id').on(table.householdId, table.id),
    uniqueIndex('plans_one_current')
      .on(table.householdId)
      .where(sql`superseded_at is null`),
    check('plans_version_counts_up', sql`${table.version} >= 1`),
    check('plans_end_after_their_reading', sql`${table.takenAt} < ${table.endsAt}`),
    index('plans_household_taken_at_idx').on(table.householdId, table.takenAt),
    index('plans_reading_idx').on(table.readingId),
  ],
);

/** A plan that was not made: the id under which the fault was logged, and the code that the household is told. */
export const planFailures = sqliteTable(
  'plan_failures',
  {
    id: text('id').primaryKey(),
    householdId: text('household_id')
      .notNull()
      .references(() => households.id, { onDelete: 'cascade' }),
    code: text('code').notNull(),
    engineVersion: text('engine_version').notNull(),
    inputHash: text('input_hash').notNull(),
    failedAt: integer('failed_at', { mode: 'timestamp_ms' }).notNull(),
  },
  (table) => [index('plan_failures_household_idx').on(table.householdId, table.failedAt)],
);
