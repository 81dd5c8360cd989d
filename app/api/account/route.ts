import { methods } from '@/lib/api/methods';
import { personRoute } from '@/lib/api/routes';
import { accountDeletionSchema, doneSchema, shownAccountSchema } from '@/lib/schemas/account';
import { deleteAccount } from '@/lib/services/delete-account';
import { showAccount } from '@/lib/services/show-account';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  GET: personRoute({ reply: shownAccountSchema, handle: showAccount }),
  DELETE: personRoute({ input: accountDeletionSchema, reply: doneSchema, handle: deleteAccount }),
});
