import { methods } from '@/lib/api/methods';
import { personRoute } from '@/lib/api/routes';
import { shownAccountSchema } from '@/lib/schemas/account';
import { showAccount } from '@/lib/services/show-account';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  GET: personRoute({ reply: shownAccountSchema, handle: showAccount }),
});
