import { sql } from 'drizzle-orm';
import { check, index, integer, primaryKey, real, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { type MeasuredQuantity, measuredQuantities, measuredRange } from '@/lib/schemas/measured-range';
import type { NewReading } from '@/lib/schemas/reading';
import { readingKinds, readingMethods, waterLooks } from '@/lib/schemas/reading-kinds';
import { oneOf } from './checks';
import { households } from './households';
import { people } from './people';

const zeroAnswers = ['flashed', 'stayed-pale'] as const;

export const readings = sqliteTable(
  'readings',
  {
    /** Made on the device: the primary key is what makes a resend harmless. */
    id: text('id').primaryKey(),
    householdId: text('household_id')
      .notNull()
      .references(() => households.id, { onDelete: 'cascade' }),
    /** When the water was tested, as the person says; not when the row was written. */
    takenAt: integer('taken_at', { mode: 'timestamp_ms' }).notNull(),
    createdAt: integer('created_at', { mode: 'timestamp_ms' }).notNull(),
    kind: text('kind', { enum: readingKinds }).notNull(),
    method: text('method', { enum: readingMethods }).notNull(),
    look: text('look', { enum: waterLooks }).notNull(),
    zeroAnswer: text('zero_answer', { enum: zeroAnswers }),
    note: text('note'),
    /** Who tested the water, and who wrote it down. */
    doneBy: text('done_by').references(() => people.id, { onDelete: 'set null' }),
    recordedBy: text('recorded_by').references(() => people.id, { onDelete: 'set null' }),
    /** Deleted readings stay for the record and count for nothing. */
    deletedAt: integer('deleted_at', { mode: 'timestamp_ms' }),
  },
  (table) => [
    check('readings_kind_known', oneOf(table.kind, readingKinds)),
    check('readings_method_known', oneOf(table.method, readingMethods)),
    check('readings_look_known', oneOf(table.look, waterLooks)),
    check('readings_zero_answer_known', oneOf(table.zeroAnswer, zeroAnswers)),
    check('readings_note_has_length', sql`length(${table.note}) <= 500`),
    check('readings_not_from_the_future', sql`${table.takenAt} <= ${table.createdAt} + 60000`),
    index('readings_household_taken_at_idx').on(table.householdId, table.takenAt),
  ],
);

/** One row for each quantity that was measured: a missing row means not measured, never zero. */
export const readingValues = sqliteTable(
  'reading_values',
  {
    readingId: text('reading_id')
      .notNull()
      .references(() => readings.id, { onDelete: 'cascade' }),
    quantity: text('quantity', { enum: measuredQuantities as [MeasuredQuantity, ...MeasuredQuantity[]] }).notNull(),
    low: real('low').notNull(),
    high: real('high').notNull(),
    /** A number was read, not a place between two steps of a strip. */
    exact: integer('exact', { mode: 'boolean' }).notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.readingId, table.quantity] }),
    check('reading_values_low_not_above_high', sql`${table.low} <= ${table.high}`),
    check('reading_values_exact_is_one_number', sql`${table.exact} = 0 or ${table.low} = ${table.high}`),
    check('reading_values_quantity_known', oneOf(table.quantity, measuredQuantities)),
    check('reading_values_in_model_range', sql`case ${table.quantity} ${rangeCases(table.low, table.high)} end`),
  ],
);

function rangeCases(low: Parameters<typeof oneOf>[0], high: Parameters<typeof oneOf>[0]) {
  return sql.join(
    measuredQuantities.map((quantity) => {
      const [least, most] = measuredRange[quantity];
      return sql`when ${sql.raw(`'${quantity}'`)} then ${low} >= ${sql.raw(String(least))} and ${high} <= ${sql.raw(String(most))}`;
    }),
    sql.raw(' '),
  );
}

/** What a reading was before each correction; append-only. */
export const readingVersions = sqliteTable(
  'reading_versions',
  {
    id: integer('id').primaryKey({ autoIncrement: true }),
    readingId: text('reading_id')
      .notNull()
      .references(() => readings.id, { onDelete: 'cascade' }),
    replacedAt: integer('replaced_at', { mode: 'timestamp_ms' }).notNull(),
    replacedBy: text('replaced_by').references(() => people.id, { onDelete: 'set null' }),
    former: text('former', { mode: 'json' }).$type<NewReading>().notNull(),
  },
  (table) => [index('reading_versions_reading_idx').on(table.readingId)],
);
