import 'server-only';
import { writeAudit } from '@/db/queries/audit-trail';
import { deleteShelfProduct } from '@/db/queries/shelf-products';
import { inWriteTransaction } from '@/db/write';
import { assertMay } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import type { Done } from '@/lib/schemas/account';
import { bringPlanUpToDate } from './bring-plan-up-to-date';
import type { ServiceContext } from './context';

/** Takes a product off the shelf; what was dosed of it stays in the record. */
export async function removeShelfProduct(context: ServiceContext, { id }: { id: string }): Promise<Done> {
  const { db, access, now } = context;
  assertMay(access, 'change-shelf');
  const { householdId, personId } = access;
  await inWriteTransaction(db, async (tx) => {
    if (!(await deleteShelfProduct(tx, householdId, id)))
      throw new AppError('not-found', 'This product is not on the shelf, or no longer.');
    await writeAudit(tx, { householdId, personId, at: now, action: 'remove-shelf-product', subjectId: id });
  });
  await bringPlanUpToDate(context);
  return { done: true };
}
