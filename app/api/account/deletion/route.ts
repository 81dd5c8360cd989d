import { methods } from '@/lib/api/methods';
import { personRoute } from '@/lib/api/routes';
import { deletionPreviewSchema } from '@/lib/schemas/account';
import { showDeletion } from '@/lib/services/delete-account';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  // What would happen; nothing does.
  GET: personRoute({ reply: deletionPreviewSchema, handle: showDeletion }),
});
