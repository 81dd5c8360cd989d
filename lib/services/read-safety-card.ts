import 'server-only';
import { writeAudit } from '@/db/queries/audit-trail';
import { keepCardReading } from '@/db/queries/memberships';
import { inWriteTransaction } from '@/db/write';
import { assertMay } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import type { Done } from '@/lib/schemas/account';
import type { ServiceContext } from './context';

/** Keeps that an adult of the household has read the safety card: from here on they handle chemicals, for this season. */
export async function readSafetyCard({ db, access, now }: ServiceContext): Promise<Done> {
  assertMay(access, 'read-safety-card');
  if (!access.chemicalsAllowed)
    throw new AppError('not-allowed', 'An owner has to mark you as an adult who handles chemicals first.');
  const { householdId, membershipId, personId } = access;
  await inWriteTransaction(db, async (tx) => {
    await keepCardReading(tx, { householdId, membershipId, at: now });
    await writeAudit(tx, { householdId, personId, at: now, action: 'read-safety-card', subjectId: membershipId });
  });
  return { done: true };
}
