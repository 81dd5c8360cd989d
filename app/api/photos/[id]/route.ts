import { methods } from '@/lib/api/methods';
import { fileRoute, householdRoute } from '@/lib/api/routes';
import { idSchema } from '@/lib/schemas/id';
import { photoSizeSchema, photosSchema } from '@/lib/schemas/photo';
import { removePhoto } from '@/lib/services/remove-photo';
import { showPicture } from '@/lib/services/show-picture';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  GET: fileRoute({
    may: 'look',
    params: idSchema,
    input: photoSizeSchema,
    handle: (visit, { size }, { id }) => showPicture(visit, { id, size }),
  }),
  DELETE: householdRoute({
    may: 'add-photos',
    params: idSchema,
    reply: photosSchema,
    handle: (visit, _, photo) => removePhoto(visit, photo),
  }),
});
