import { methods } from '@/lib/api/methods';
import { publicRoute } from '@/lib/api/routes';
import { enteredSchema, signInSchema } from '@/lib/schemas/account';
import { signIn } from '@/lib/services/sign-in';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  POST: publicRoute({ input: signInSchema, reply: enteredSchema, handle: signIn }),
});
