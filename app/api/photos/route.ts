import { methods } from '@/lib/api/methods';
import { householdRoute, uploadRoute } from '@/lib/api/routes';
import { MOST_PHOTO_BYTES, newPhotoSchema, photosSchema } from '@/lib/schemas/photo';
import { receivePhoto } from '@/lib/services/add-photo';
import { showPhotos } from '@/lib/services/show-photos';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  GET: householdRoute({ may: 'look', reply: photosSchema, handle: showPhotos }),
  POST: uploadRoute({
    may: 'add-photos',
    most: MOST_PHOTO_BYTES,
    input: newPhotoSchema,
    reply: photosSchema,
    handle: receivePhoto,
  }),
});
