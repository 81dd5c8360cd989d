import 'server-only';
import { writeAudit } from '@/db/queries/audit-trail';
import { listShelfProducts, saveShelfProduct as saveRow } from '@/db/queries/shelf-products';
import { inWriteTransaction } from '@/db/write';
import { assertMay } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import type { HouseholdProduct } from '@/lib/schemas/household-product';
import { bringPlanUpToDate } from './bring-plan-up-to-date';
import type { ServiceContext } from './context';
import { productValues } from './shelf-product';

/** As many as a plan takes into account. */
const fullShelf = 50;

/** Puts a product on the shelf, or changes the one with its id; sent again it stands there once. */
export async function saveShelfProduct(context: ServiceContext, product: HouseholdProduct): Promise<HouseholdProduct> {
  const { db, access, now } = context;
  assertMay(access, 'change-shelf');
  const { householdId, personId } = access;
  await inWriteTransaction(db, async (tx) => {
    const others = (await listShelfProducts(tx, householdId)).filter(({ id }) => id !== product.id);
    if (others.length >= fullShelf)
      throw new AppError('conflict', `A shelf holds ${fullShelf} products. Take away what is used up.`);
    await saveRow(tx, { householdId, product: productValues(product), now });
    await writeAudit(tx, {
      ...{ householdId, personId, at: now, action: 'save-shelf-product', subjectId: product.id },
      detail: product,
    });
  });
  await bringPlanUpToDate(context);
  return product;
}
