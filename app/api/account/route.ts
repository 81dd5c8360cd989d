import { methods } from '@/lib/api/methods';
import { personRoute } from '@/lib/api/routes';
import { accountDeletionSchema, doneSchema } from '@/lib/schemas/account';
import { deleteAccount } from '@/lib/services/delete-account';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  DELETE: personRoute({ input: accountDeletionSchema, reply: doneSchema, handle: deleteAccount }),
});
