import { methods } from '@/lib/api/methods';
import { personRoute } from '@/lib/api/routes';
import { passkeyListSchema, passkeyPathSchema } from '@/lib/schemas/passkey';
import { forgetPasskey } from '@/lib/services/forget-passkey';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  DELETE: personRoute({
    params: passkeyPathSchema,
    reply: passkeyListSchema,
    handle: (visit, _, passkey) => forgetPasskey(visit, passkey),
  }),
});
