import 'server-only';
import { and, asc, eq } from 'drizzle-orm';
import type { DatabaseOrTransaction } from '@/db/client';
import { shelfProducts } from '@/db/schema';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

export type ShelfProductRow = typeof shelfProducts.$inferSelect;
export type ShelfProductValues = Omit<typeof shelfProducts.$inferInsert, 'householdId' | 'createdAt'>;

const one = (householdId: ProvenHouseholdId, id: string) =>
  and(eq(shelfProducts.householdId, householdId), eq(shelfProducts.id, id));

/** In the order in which they came to the shelf. */
export async function listShelfProducts(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
): Promise<ShelfProductRow[]> {
  return db
    .select()
    .from(shelfProducts)
    .where(eq(shelfProducts.householdId, householdId))
    .orderBy(asc(shelfProducts.createdAt), asc(shelfProducts.id));
}

export async function findShelfProduct(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  id: string,
): Promise<ShelfProductRow | null> {
  const [product] = await db.select().from(shelfProducts).where(one(householdId, id));
  return product ?? null;
}

/** Adds a product, or replaces the one with its id: sent twice it stands there once. */
export async function saveShelfProduct(
  db: DatabaseOrTransaction,
  { householdId, product, now }: { householdId: ProvenHouseholdId; product: ShelfProductValues; now: Date },
): Promise<void> {
  await db
    .insert(shelfProducts)
    .values({ ...product, householdId, createdAt: now })
    .onConflictDoUpdate({ target: [shelfProducts.householdId, shelfProducts.id], set: product });
}

/** @returns whether the product was there */
export async function setStock(
  db: DatabaseOrTransaction,
  { householdId, id, stock }: { householdId: ProvenHouseholdId; id: string; stock: number },
): Promise<boolean> {
  const changed = await db
    .update(shelfProducts)
    .set({ stock })
    .where(one(householdId, id))
    .returning({ id: shelfProducts.id });
  return changed.length === 1;
}

/** @returns whether the product was there */
export async function deleteShelfProduct(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  id: string,
): Promise<boolean> {
  const deleted = await db.delete(shelfProducts).where(one(householdId, id)).returning({ id: shelfProducts.id });
  return deleted.length === 1;
}
