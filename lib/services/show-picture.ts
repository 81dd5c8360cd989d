import 'server-only';
import { readPicture } from '@/db/queries/photos';
import { assertMay } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import type { PhotoSize } from '@/lib/schemas/photo';
import type { ServiceContext } from './context';

/** One copy of a picture, as a file of its kind; a photo never changes, so its id and size name it for ever. */
export async function showPicture(
  { db, access }: ServiceContext,
  { id, size }: { id: string; size: PhotoSize },
): Promise<{ bytes: Uint8Array<ArrayBuffer>; type: 'image/webp'; tag: string }> {
  assertMay(access, 'look');
  const bytes = await readPicture(db, { householdId: access.householdId, id, size });
  if (bytes === undefined) throw new AppError('not-found', 'This photo is not there, or no longer.');
  return { bytes: new Uint8Array(bytes), type: 'image/webp', tag: `"${id}-${size}"` };
}
