import { sql } from 'drizzle-orm';
import { check, index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { languages } from '@/lib/schemas/languages';
import { oneOf } from './checks';
import { households } from './households';
import { people } from './people';

/**
 * Mail on its way. It is written with what it tells of, in one transaction, and sent afterwards: nobody waits for a mail
 * server. Once it has left, or is given up, its words go: there may be a link in them.
 */
export const outgoingMails = sqliteTable(
  'outgoing_mails',
  {
    id: text('id').primaryKey(),
    /** Of whom or of what it tells: a household's mail goes with the household, a person's with the person. */
    householdId: text('household_id').references(() => households.id, { onDelete: 'cascade' }),
    personId: text('person_id').references(() => people.id, { onDelete: 'cascade' }),
    /** The invitation, say, whose row shows whether it arrived. */
    subjectId: text('subject_id'),
    email: text('email').notNull(),
    language: text('language', { enum: languages }).notNull(),
    subject: text('subject').notNull(),
    text: text('text'),
    html: text('html'),
    createdAt: integer('created_at', { mode: 'timestamp_ms' }).notNull(),
    tries: integer('tries').notNull().default(0),
    /** When it is due; null once it has left or is given up. */
    nextTryAt: integer('next_try_at', { mode: 'timestamp_ms' }),
    sentAt: integer('sent_at', { mode: 'timestamp_ms' }),
    /** What the mail server said when it last refused. */
    refusal: text('refusal'),
  },
  (table) => [
    check('outgoing_mails_language_known', oneOf(table.language, languages)),
    check('outgoing_mails_of_somebody', sql`${table.householdId} is not null or ${table.personId} is not null`),
    check('outgoing_mails_sent_is_not_due', sql`${table.sentAt} is null or ${table.nextTryAt} is null`),
    check('outgoing_mails_due_has_words', sql`${table.nextTryAt} is null or ${table.text} is not null`),
    index('outgoing_mails_due_idx').on(table.nextTryAt),
    index('outgoing_mails_subject_idx').on(table.subjectId),
    index('outgoing_mails_household_idx').on(table.householdId),
    index('outgoing_mails_person_idx').on(table.personId),
  ],
);
