import { methods } from '@/lib/api/methods';
import { publicRoute } from '@/lib/api/routes';
import { enteredSchema } from '@/lib/schemas/account';
import { passkeySignInSchema } from '@/lib/schemas/passkey';
import { signInWithPasskey } from '@/lib/services/sign-in-with-passkey';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  POST: publicRoute({ input: passkeySignInSchema, reply: enteredSchema, handle: signInWithPasskey }),
});
