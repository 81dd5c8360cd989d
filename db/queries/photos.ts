import 'server-only';
import { and, desc, eq } from 'drizzle-orm';
import type { DatabaseOrTransaction, Transaction } from '@/db/client';
import { people, photos, readings, shelfProducts } from '@/db/schema';
import type { PhotoSize } from '@/lib/schemas/photo';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

type NewRow = Omit<typeof photos.$inferInsert, 'householdId'> & { householdId: ProvenHouseholdId };
type Of = { householdId: ProvenHouseholdId; id: string };

/** Keeps a photo; false when one of this id is there already, in this household or another. */
export async function insertPhoto(tx: Transaction, row: NewRow): Promise<boolean> {
  const written = await tx.insert(photos).values(row).onConflictDoNothing().returning({ id: photos.id });
  return written.length > 0;
}

export function countPhotos(tx: Transaction, householdId: ProvenHouseholdId): Promise<number> {
  return tx.$count(photos, eq(photos.householdId, householdId));
}

/** Who added a photo of this household; undefined where there is none. */
export async function findPhoto(
  db: DatabaseOrTransaction,
  { householdId, id }: Of,
): Promise<{ addedBy: string | null } | undefined> {
  const [row] = await db
    .select({ addedBy: photos.addedBy })
    .from(photos)
    .where(and(eq(photos.householdId, householdId), eq(photos.id, id)));
  return row;
}

/** The newest first, without their pictures. */
export async function listPhotos(db: DatabaseOrTransaction, householdId: ProvenHouseholdId) {
  return db
    .select({
      id: photos.id,
      kind: photos.kind,
      readingId: photos.readingId,
      productId: photos.productId,
      caption: photos.caption,
      width: photos.width,
      height: photos.height,
      addedAt: photos.addedAt,
      addedById: photos.addedBy,
      addedBy: people.name,
    })
    .from(photos)
    .leftJoin(people, eq(people.id, photos.addedBy))
    .where(eq(photos.householdId, householdId))
    .orderBy(desc(photos.addedAt), desc(photos.id));
}

/** One copy of a picture. */
export async function readPicture(
  db: DatabaseOrTransaction,
  { householdId, id, size }: Of & { size: PhotoSize },
): Promise<Buffer | undefined> {
  const column = size === 'small' ? photos.small : photos.picture;
  const [row] = await db
    .select({ bytes: column })
    .from(photos)
    .where(and(eq(photos.householdId, householdId), eq(photos.id, id)));
  return row?.bytes;
}

export async function deletePhoto(tx: Transaction, { householdId, id }: Of): Promise<void> {
  await tx.delete(photos).where(and(eq(photos.householdId, householdId), eq(photos.id, id)));
}

/** Whether what a photo is said to belong to is this household's. */
export async function hasSubject(
  tx: Transaction,
  { householdId, kind, about }: { householdId: ProvenHouseholdId; kind: 'strip' | 'label'; about: string },
): Promise<boolean> {
  const found =
    kind === 'strip'
      ? await tx.$count(readings, and(eq(readings.householdId, householdId), eq(readings.id, about)))
      : await tx.$count(shelfProducts, and(eq(shelfProducts.householdId, householdId), eq(shelfProducts.id, about)));
  return found > 0;
}
