import { sql } from 'drizzle-orm';
import {
  check,
  foreignKey,
  index,
  integer,
  primaryKey,
  sqliteTable,
  text,
  unique,
  uniqueIndex,
} from 'drizzle-orm/sqlite-core';
import type { Situation, SituationEnding, SituationKind } from '@/lib/schemas/situation';
import { households } from './households';
import { people } from './people';

/**
 * Guided procedures that a household has begun. One is open at a time. The kinds grow, so no CHECK lists them: a table that
 * holds records is never rebuilt.
 */
export const situations = sqliteTable(
  'situations',
  {
    /** Made on the device: the primary key is what makes a resend harmless. */
    id: text('id').primaryKey(),
    householdId: text('household_id')
      .notNull()
      .references(() => households.id, { onDelete: 'cascade' }),
    kind: text('kind').$type<SituationKind>().notNull(),
    answers: text('answers', { mode: 'json' }).$type<Situation['answers']>().notNull(),
    openedAt: integer('opened_at', { mode: 'timestamp_ms' }).notNull(),
    openedBy: text('opened_by').references(() => people.id, { onDelete: 'set null' }),
    endedAt: integer('ended_at', { mode: 'timestamp_ms' }),
    endedBy: text('ended_by').references(() => people.id, { onDelete: 'set null' }),
    ending: text('ending').$type<SituationEnding>(),
  },
  (table) => [
    check('situations_ending_says_when', sql`(${table.endedAt} is null) = (${table.ending} is null)`),
    check('situations_end_after_they_open', sql`${table.endedAt} >= ${table.openedAt}`),
    unique('situations_household_id').on(table.householdId, table.id),
    uniqueIndex('situations_one_open')
      .on(table.householdId)
      .where(sql`${table.endedAt} is null`),
    index('situations_household_opened_at_idx').on(table.householdId, table.openedAt),
  ],
);

/** Steps of a procedure that somebody has done. */
export const situationTicks = sqliteTable(
  'situation_ticks',
  {
    householdId: text('household_id')
      .notNull()
      .references(() => households.id, { onDelete: 'cascade' }),
    situationId: text('situation_id').notNull(),
    step: text('step').notNull(),
    doneAt: integer('done_at', { mode: 'timestamp_ms' }).notNull(),
    doneBy: text('done_by').references(() => people.id, { onDelete: 'set null' }),
  },
  (table) => [
    primaryKey({ columns: [table.situationId, table.step] }),
    foreignKey({
      name: 'situation_ticks_situation_of_the_household',
      columns: [table.householdId, table.situationId],
      foreignColumns: [situations.householdId, situations.id],
    }).onDelete('cascade'),
  ],
);
