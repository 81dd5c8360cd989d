import 'server-only';
import { listPhotos } from '@/db/queries/photos';
import { assertMay, may } from '@/lib/auth/permissions';
import type { Photo } from '@/lib/schemas/photo';
import type { ServiceContext } from './context';
import { shownName } from './shown-name';

/** The photos of a household, the newest first, without their pictures. */
export async function showPhotos({ db, access }: ServiceContext): Promise<Photo[]> {
  assertMay(access, 'look');
  const rows = await listPhotos(db, access.householdId);
  return rows.map(({ readingId, productId, addedAt, addedById, addedBy, ...photo }) => ({
    ...photo,
    about: readingId ?? productId,
    addedAt: addedAt.toISOString(),
    addedBy: shownName(addedBy, access.language),
    removable: may(access, 'remove-any-photo') || (may(access, 'add-photos') && addedById === access.personId),
  }));
}
