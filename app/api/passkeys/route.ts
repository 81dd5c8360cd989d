import { methods } from '@/lib/api/methods';
import { personRoute } from '@/lib/api/routes';
import { newPasskeySchema, passkeyListSchema } from '@/lib/schemas/passkey';
import { addPasskey } from '@/lib/services/add-passkey';
import { showPasskeys } from '@/lib/services/show-passkeys';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  GET: personRoute({ reply: passkeyListSchema, handle: showPasskeys }),
  POST: personRoute({ input: newPasskeySchema, reply: passkeyListSchema, handle: addPasskey }),
});
