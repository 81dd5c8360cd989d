import 'server-only';
import { writeAudit } from '@/db/queries/audit-trail';
import { deletePhoto, findPhoto } from '@/db/queries/photos';
import { inWriteTransaction } from '@/db/write';
import { assertMay } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import type { Photo } from '@/lib/schemas/photo';
import type { ServiceContext } from './context';
import { showPhotos } from './show-photos';

/** Takes a photo away for good: one's own, or any for an owner. */
export async function removePhoto(context: ServiceContext, { id }: { id: string }): Promise<Photo[]> {
  const { db, access, now } = context;
  assertMay(access, 'add-photos');
  const { householdId, personId } = access;
  await inWriteTransaction(db, async (tx) => {
    const photo = await findPhoto(tx, { householdId, id });
    if (!photo) throw new AppError('not-found', 'This photo is not there, or no longer.');
    if (photo.addedBy !== personId) assertMay(access, 'remove-any-photo');
    await deletePhoto(tx, { householdId, id });
    await writeAudit(tx, { householdId, personId, at: now, action: 'remove-photo', subjectId: id });
  });
  return showPhotos(context);
}
