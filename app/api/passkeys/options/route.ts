import { methods } from '@/lib/api/methods';
import { personRoute } from '@/lib/api/routes';
import { passkeyCreationSchema, passkeyWishSchema } from '@/lib/schemas/passkey';
import { askForPasskeyOf } from '@/lib/services/add-passkey';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  POST: personRoute({ input: passkeyWishSchema, reply: passkeyCreationSchema, handle: askForPasskeyOf }),
});
