import 'server-only';
import type { DatabaseOrTransaction } from '@/db/client';
import { listShelfProducts as listRows } from '@/db/queries/shelf-products';
import type { HouseholdAccess } from '@/lib/auth/household-access';
import type { HouseholdProduct } from '@/lib/schemas/household-product';
import { productOf } from './shelf-product';

type Context = { db: DatabaseOrTransaction; access: Pick<HouseholdAccess, 'householdId'> };

/** What stands on the shelf, in the order in which it came. */
export async function listShelfProducts({ db, access }: Context): Promise<HouseholdProduct[]> {
  return (await listRows(db, access.householdId)).map(productOf);
}
