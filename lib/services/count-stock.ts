import 'server-only';
import { writeAudit } from '@/db/queries/audit-trail';
import { findShelfProduct, setStock } from '@/db/queries/shelf-products';
import { inWriteTransaction } from '@/db/write';
import { assertMay } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import type { HouseholdProduct } from '@/lib/schemas/household-product';
import { bringPlanUpToDate } from './bring-plan-up-to-date';
import type { ServiceContext } from './context';
import { productOf } from './shelf-product';

/** Keeps how much of a product is left [g or mL]. */
export async function countStock(
  context: ServiceContext,
  { id, stock }: { id: string; stock: number },
): Promise<HouseholdProduct> {
  const { db, access, now } = context;
  assertMay(access, 'count-stock');
  const { householdId, personId } = access;
  const counted = await inWriteTransaction(db, async (tx) => {
    const before = await findShelfProduct(tx, householdId, id);
    if (!before) throw new AppError('not-found', 'This product is not on the shelf, or no longer.');
    await setStock(tx, { householdId, id, stock });
    await writeAudit(tx, {
      ...{ householdId, personId, at: now, action: 'count-stock', subjectId: id },
      detail: { from: before.stock, to: stock },
    });
    return productOf({ ...before, stock });
  });
  await bringPlanUpToDate(context);
  return counted;
}
