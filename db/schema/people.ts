import { sql } from 'drizzle-orm';
import { check, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { languages } from '@/lib/schemas/languages';

export const people = sqliteTable(
  'people',
  {
    id: text('id').primaryKey(),
    name: text('name').notNull(),
    /** Lower case; null for the visitor of a demo copy, who has no account. */
    email: text('email').unique(),
    /** Argon2id in its PHC text form. */
    passwordHash: text('password_hash'),
    /** The language of the screen; mail follows the household's locale. */
    language: text('language', { enum: languages }).notNull().default('en'),
    /** When the notes on the first sheet were closed; null until then. */
    tourClosedAt: integer('tour_closed_at', { mode: 'timestamp_ms' }),
    createdAt: integer('created_at', { mode: 'timestamp_ms' }).notNull(),
    /** When the account was given up; what they did in a household stays on its record, without their name. */
    deletedAt: integer('deleted_at', { mode: 'timestamp_ms' }),
  },
  (table) => [
    check('people_email_goes_with_password', sql`(${table.email} is null) = (${table.passwordHash} is null)`),
    check('people_email_is_normalised', sql`${table.email} = lower(trim(${table.email}))`),
    check('people_name_has_length', sql`length(${table.name}) between 1 and 80`),
  ],
);
