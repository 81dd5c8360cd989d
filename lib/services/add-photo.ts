import 'server-only';
import { writeAudit } from '@/db/queries/audit-trail';
import { countPhotos, findPhoto, hasSubject, insertPhoto } from '@/db/queries/photos';
import { inWriteTransaction } from '@/db/write';
import { assertMay } from '@/lib/auth/permissions';
import { countTry } from '@/lib/auth/rate-limit';
import type { HouseholdRequest } from '@/lib/auth/visit';
import { AppError } from '@/lib/errors';
import { encodePhoto } from '@/lib/photos/encode-photo';
import { MOST_DEMO_PHOTOS, MOST_PHOTOS, type NewPhoto, type Photo } from '@/lib/schemas/photo';
import type { ServiceContext } from './context';
import { showPhotos } from './show-photos';

/** Keeps a photo that was sent, as often as pictures may be: each of them is work. Error: `too-many-requests`. */
export async function receivePhoto(context: HouseholdRequest, photo: NewPhoto): Promise<Photo[]> {
  const { visit, access } = context;
  await countTry(visit, 'upload-person', access.personId);
  await countTry(visit, 'upload-address', visit.address);
  return addPhoto(context, photo);
}

/** Keeps a photo, encoded anew. Sent twice it is there once. */
export async function addPhoto(
  context: ServiceContext,
  { id, kind, about, caption, bytes }: NewPhoto,
): Promise<Photo[]> {
  const { db, access, now } = context;
  assertMay(access, 'add-photos');
  const { householdId, personId } = access;
  // Before the work of encoding, and outside the transaction: a resend costs nothing.
  if (await findPhoto(db, { householdId, id })) return showPhotos(context);
  const { picture, small, width, height } = await encodePhoto(bytes);
  const most = access.demo ? MOST_DEMO_PHOTOS : MOST_PHOTOS;
  await inWriteTransaction(db, async (tx) => {
    if (kind !== 'equipment' && !(await hasSubject(tx, { householdId, kind, about: about! })))
      throw new AppError('not-found', 'What this photo belongs to is no longer there.');
    const row = {
      ...{ id, householdId, kind, caption: caption ?? null },
      ...{ readingId: kind === 'strip' ? about : null, productId: kind === 'label' ? about : null },
      ...{ picture, small, width, height, addedAt: now, addedBy: personId },
    };
    if (!(await insertPhoto(tx, row))) {
      if (await findPhoto(tx, { householdId, id })) return;
      throw new AppError('conflict', 'This photo was added in another household.');
    }
    if ((await countPhotos(tx, householdId)) > most)
      throw new AppError('conflict', 'There is no room for more photos. Take one away first.');
    await writeAudit(tx, {
      householdId,
      personId,
      at: now,
      action: 'add-photo',
      subjectId: id,
      detail: { kind, about },
    });
  });
  return showPhotos(context);
}
