import { sql } from 'drizzle-orm';
import { check, foreignKey, index, integer, real, sqliteTable, text, unique } from 'drizzle-orm/sqlite-core';
import { doseUnits, type PlannedDose } from '@/lib/schemas/dose';
import { doseStatuses } from '@/lib/schemas/plan-dose';
import { productForms, substances } from '@/lib/schemas/shelf-product';
import { isDay, isWallTime, oneOf } from './checks';
import { households } from './households';
import { people } from './people';
import { plans } from './plans';

const doseActions = ['claim', 'given', 'changed', 'skipped', 'undo'] as const;

/** The doses of a stored plan, as they stand now; how they came to stand so is in dose_events. */
export const planDoses = sqliteTable(
  'plan_doses',
  {
    id: text('id').primaryKey(),
    householdId: text('household_id')
      .notNull()
      .references(() => households.id, { onDelete: 'cascade' }),
    planId: text('plan_id').notNull(),
    /** Planned as a day and a wall time of the household; `at` is the instant that makes of it. */
    day: text('day').notNull(),
    wallTime: text('wall_time').notNull(),
    at: integer('at', { mode: 'timestamp_ms' }).notNull(),
    /** Shelf id, null when it has to be bought. No key: a product may leave the shelf, its doses stay. */
    productId: text('product_id'),
    /** What the product was called and how its label wanted it, then. */
    productName: text('product_name'),
    toBuy: integer('to_buy', { mode: 'boolean' }).notNull(),
    substance: text('substance', { enum: substances }).notNull(),
    form: text('form', { enum: productForms }).notNull(),
    amount: real('amount').notNull(),
    unit: text('unit', { enum: doseUnits }).notNull(),
    /** Free chlorine it adds [mg/L]. */
    rise: real('rise').notNull(),
    reason: text('reason').notNull(),
    effect: text('effect', { mode: 'json' }).$type<NonNullable<PlannedDose['effect']>>(),
    status: text('status', { enum: doseStatuses }).notNull().default('planned'),
    givenAt: integer('given_at', { mode: 'timestamp_ms' }),
    givenAmount: real('given_amount'),
    /** Who put it in, and who ticked it. */
    doneBy: text('done_by').references(() => people.id, { onDelete: 'set null' }),
    recordedBy: text('recorded_by').references(() => people.id, { onDelete: 'set null' }),
    /** When the last tick was written: undo is open from here. */
    tickedAt: integer('ticked_at', { mode: 'timestamp_ms' }),
    claimedBy: text('claimed_by').references(() => people.id, { onDelete: 'set null' }),
    claimedAt: integer('claimed_at', { mode: 'timestamp_ms' }),
    /** Version of the plan that the person of the last tick looked at. */
    planVersionSeen: integer('plan_version_seen'),
    /** Two people ticked it: perhaps it went in twice. Until a reading the verdict is "stay out". */
    doubtfulAt: integer('doubtful_at', { mode: 'timestamp_ms' }),
  },
  (table) => [
    foreignKey({
      name: 'plan_doses_plan_of_the_household',
      columns: [table.householdId, table.planId],
      foreignColumns: [plans.householdId, plans.id],
    }).onDelete('cascade'),
    unique('plan_doses_household_id').on(table.householdId, table.id),
    check('plan_doses_day_is_a_day', isDay(table.day)),
    check('plan_doses_wall_time_is_a_time', isWallTime(table.wallTime)),
    check('plan_doses_substance_known', oneOf(table.substance, substances)),
    check('plan_doses_form_known', oneOf(table.form, productForms)),
    check('plan_doses_unit_known', oneOf(table.unit, doseUnits)),
    check('plan_doses_status_known', oneOf(table.status, doseStatuses)),
    check('plan_doses_amount_in_range', sql`${table.amount} > 0 and ${table.amount} <= 1e6`),
    check('plan_doses_to_buy_has_no_product', sql`${table.toBuy} = 0 or ${table.productId} is null`),
    check(
      'plan_doses_given_says_when_and_how_much',
      sql`(${table.status} in ('given', 'changed')) = (${table.givenAt} is not null) and (${table.givenAt} is null) = (${table.givenAmount} is null)`,
    ),
    check('plan_doses_given_amount_in_range', sql`${table.givenAmount} > 0 and ${table.givenAmount} <= 1e6`),
    index('plan_doses_household_at_idx').on(table.householdId, table.at),
    index('plan_doses_plan_idx').on(table.planId),
  ],
);

/** Every tick that was ever sent; append-only. */
export const doseEvents = sqliteTable(
  'dose_events',
  {
    /** The id of the tick, made on the device: a resend is the same tick. */
    id: text('id').primaryKey(),
    householdId: text('household_id')
      .notNull()
      .references(() => households.id, { onDelete: 'cascade' }),
    doseId: text('dose_id').notNull(),
    action: text('action', { enum: doseActions }).notNull(),
    statusFrom: text('status_from', { enum: doseStatuses }).notNull(),
    statusTo: text('status_to', { enum: doseStatuses }).notNull(),
    amountFrom: real('amount_from'),
    amountTo: real('amount_to'),
    givenAtFrom: integer('given_at_from', { mode: 'timestamp_ms' }),
    givenAtTo: integer('given_at_to', { mode: 'timestamp_ms' }),
    planVersionSeen: integer('plan_version_seen').notNull(),
    recordedBy: text('recorded_by').references(() => people.id, { onDelete: 'set null' }),
    createdAt: integer('created_at', { mode: 'timestamp_ms' }).notNull(),
  },
  (table) => [
    foreignKey({
      name: 'dose_events_dose_of_the_household',
      columns: [table.householdId, table.doseId],
      foreignColumns: [planDoses.householdId, planDoses.id],
    }).onDelete('cascade'),
    check('dose_events_action_known', oneOf(table.action, doseActions)),
    check('dose_events_status_from_known', oneOf(table.statusFrom, doseStatuses)),
    check('dose_events_status_to_known', oneOf(table.statusTo, doseStatuses)),
    index('dose_events_dose_idx').on(table.doseId, table.createdAt),
  ],
);
