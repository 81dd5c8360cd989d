import { methods } from '@/lib/api/methods';
import { personRoute } from '@/lib/api/routes';
import { doneSchema, emailChangeSchema } from '@/lib/schemas/account';
import { changeEmail } from '@/lib/services/change-email';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  PUT: personRoute({ input: emailChangeSchema, reply: doneSchema, handle: changeEmail }),
});
