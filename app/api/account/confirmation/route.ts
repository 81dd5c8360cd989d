import { methods } from '@/lib/api/methods';
import { personRoute } from '@/lib/api/routes';
import { doneSchema } from '@/lib/schemas/account';
import { askAgain } from '@/lib/services/confirm-email';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  POST: personRoute({ reply: doneSchema, handle: askAgain }),
});
