import 'server-only';
import { and, eq, gt, isNull, lte } from 'drizzle-orm';
import type { DatabaseOrTransaction, Transaction } from '@/db/client';
import { accountLinks } from '@/db/schema';
import type { AccountLinkPurpose } from '@/lib/schemas/account-link';
import type { SystemScope } from '@/lib/schemas/scope';

/** A new link ends those before it that were for the same. */
export async function insertAccountLink(tx: Transaction, link: typeof accountLinks.$inferInsert): Promise<void> {
  await endAccountLinks(tx, link.personId, [link.purpose]);
  await tx.insert(accountLinks).values(link);
}

export async function endAccountLinks(
  tx: Transaction,
  personId: string,
  purposes: readonly AccountLinkPurpose[],
): Promise<void> {
  for (const purpose of purposes)
    await tx
      .delete(accountLinks)
      .where(and(eq(accountLinks.personId, personId), eq(accountLinks.purpose, purpose), isNull(accountLinks.usedAt)));
}

export async function findAccountLink(db: DatabaseOrTransaction, _scope: SystemScope, tokenDigest: string) {
  const [link] = await db.select().from(accountLinks).where(eq(accountLinks.tokenDigest, tokenDigest));
  return link ?? null;
}

/** The address that a person has asked to change to, while its link still opens. */
export async function findAwaitedEmail(db: DatabaseOrTransaction, personId: string, now: Date): Promise<string | null> {
  const [link] = await db
    .select({ email: accountLinks.email })
    .from(accountLinks)
    .where(
      and(
        eq(accountLinks.personId, personId),
        eq(accountLinks.purpose, 'change-email'),
        isNull(accountLinks.usedAt),
        gt(accountLinks.expiresAt, now),
      ),
    );
  return link?.email ?? null;
}

/** Uses a link up. @returns what it was for; null when it is used, over or for something else: of two at once one is first */
export async function consumeAccountLink(
  tx: Transaction,
  _scope: SystemScope,
  { tokenDigest, at }: { tokenDigest: string; at: Date },
) {
  const [used] = await tx
    .update(accountLinks)
    .set({ usedAt: at })
    .where(and(eq(accountLinks.tokenDigest, tokenDigest), isNull(accountLinks.usedAt), gt(accountLinks.expiresAt, at)))
    .returning();
  return used ?? null;
}

/** Links that have been over for so long that nobody asks any more what became of them. */
export async function deleteOldAccountLinks(
  db: DatabaseOrTransaction,
  _scope: SystemScope,
  before: Date,
): Promise<void> {
  await db.delete(accountLinks).where(lte(accountLinks.expiresAt, before));
}
