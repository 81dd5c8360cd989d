import { methods } from '@/lib/api/methods';
import { publicRoute } from '@/lib/api/routes';
import { doneSchema } from '@/lib/schemas/account';
import { openedLinkSchema } from '@/lib/schemas/account-link';
import { confirmEmail } from '@/lib/services/confirm-email';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  POST: publicRoute({ input: openedLinkSchema, reply: doneSchema, handle: confirmEmail }),
});
