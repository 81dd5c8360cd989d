import { methods } from '@/lib/api/methods';
import { publicRoute } from '@/lib/api/routes';
import { passkeyRequestSchema } from '@/lib/schemas/passkey';
import { askToSignIn } from '@/lib/services/sign-in-with-passkey';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  POST: publicRoute({ reply: passkeyRequestSchema, handle: askToSignIn }),
});
