import { methods } from '@/lib/api/methods';
import { personRoute } from '@/lib/api/routes';
import { doneSchema } from '@/lib/schemas/account';
import { signOutElsewhere } from '@/lib/services/change-password';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  // All but the one that asks.
  DELETE: personRoute({ reply: doneSchema, handle: signOutElsewhere }),
});
