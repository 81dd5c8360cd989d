import 'server-only';
import { and, asc, count, desc, eq, gt, inArray, isNotNull, isNull, lte, sql } from 'drizzle-orm';
import type { DatabaseOrTransaction } from '@/db/client';
import { outgoingMails } from '@/db/schema';
import type { ProvenHouseholdId, SystemScope } from '@/lib/schemas/scope';

export type OutgoingMail = typeof outgoingMails.$inferSelect;

/** Written in the same transaction as what it tells of. */
export async function insertOutgoingMail(
  db: DatabaseOrTransaction,
  mail: typeof outgoingMails.$inferInsert,
): Promise<void> {
  await db.insert(outgoingMails).values(mail);
}

/**
 * Takes what is due, oldest first, and puts its next try off, so that nobody else sends it meanwhile, and somebody does if
 * this process ends before it has said how it went.
 */
export async function claimDueMails(
  db: DatabaseOrTransaction,
  _scope: SystemScope,
  { now, until, most }: { now: Date; until: Date; most: number },
): Promise<OutgoingMail[]> {
  const due = db
    .select({ id: outgoingMails.id })
    .from(outgoingMails)
    .where(lte(outgoingMails.nextTryAt, now))
    .orderBy(asc(outgoingMails.nextTryAt))
    .limit(most);
  return db
    .update(outgoingMails)
    .set({ nextTryAt: until, tries: sql`${outgoingMails.tries} + 1` })
    .where(inArray(outgoingMails.id, due))
    .returning();
}

/** It has left. @param keepWords on the mailbox page of this machine, where they are to be read */
export async function markSent(
  db: DatabaseOrTransaction,
  _scope: SystemScope,
  { id, at, keepWords }: { id: string; at: Date; keepWords: boolean },
): Promise<void> {
  await db
    .update(outgoingMails)
    .set({ sentAt: at, nextTryAt: null, refusal: null, ...(keepWords ? {} : { text: null, html: null }) })
    .where(eq(outgoingMails.id, id));
}

/** It was refused; without a next try it is given up. */
export async function markRefused(
  db: DatabaseOrTransaction,
  _scope: SystemScope,
  { id, refusal, nextTryAt }: { id: string; refusal: string; nextTryAt: Date | null },
): Promise<void> {
  await db
    .update(outgoingMails)
    .set({ refusal, nextTryAt, ...(nextTryAt === null ? { text: null, html: null } : {}) })
    .where(eq(outgoingMails.id, id));
}

/** Nobody needs it any more: it has not left yet and never will. */
export async function withdrawMails(db: DatabaseOrTransaction, subjectId: string): Promise<void> {
  await db.delete(outgoingMails).where(and(eq(outgoingMails.subjectId, subjectId), isNull(outgoingMails.sentAt)));
}

const progress = {
  subjectId: outgoingMails.subjectId,
  refusal: outgoingMails.refusal,
  nextTryAt: outgoingMails.nextTryAt,
  sentAt: outgoingMails.sentAt,
};

/** How far the mail of a household has come, the newest first. */
export async function listHouseholdMails(db: DatabaseOrTransaction, householdId: ProvenHouseholdId) {
  return db
    .select(progress)
    .from(outgoingMails)
    .where(eq(outgoingMails.householdId, householdId))
    .orderBy(desc(outgoingMails.createdAt));
}

export async function countHouseholdMails(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  since: Date,
): Promise<number> {
  const [row] = await db
    .select({ mails: count() })
    .from(outgoingMails)
    .where(and(eq(outgoingMails.householdId, householdId), gt(outgoingMails.createdAt, since)));
  return row?.mails ?? 0;
}

/** How far the newest mail to a person about their account has come. The person asks, by their session. */
export async function findPersonMail(db: DatabaseOrTransaction, personId: string) {
  const [mail] = await db
    .select(progress)
    .from(outgoingMails)
    .where(eq(outgoingMails.personId, personId))
    .orderBy(desc(outgoingMails.createdAt))
    .limit(1);
  return mail;
}

/** Everything that was written on this machine, the newest first, for the mailbox page. */
export async function listKeptMails(db: DatabaseOrTransaction, _scope: SystemScope) {
  return db
    .select()
    .from(outgoingMails)
    .where(isNotNull(outgoingMails.text))
    .orderBy(desc(outgoingMails.createdAt))
    .limit(100);
}

export async function deleteOldMails(db: DatabaseOrTransaction, _scope: SystemScope, before: Date): Promise<void> {
  await db.delete(outgoingMails).where(and(isNull(outgoingMails.nextTryAt), lte(outgoingMails.createdAt, before)));
}
