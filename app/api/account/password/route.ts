import { methods } from '@/lib/api/methods';
import { personRoute } from '@/lib/api/routes';
import { doneSchema, passwordChangeSchema } from '@/lib/schemas/account';
import { changePassword } from '@/lib/services/change-password';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  PUT: personRoute({ input: passwordChangeSchema, reply: doneSchema, handle: changePassword }),
});
