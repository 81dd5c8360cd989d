import { methods } from '@/lib/api/methods';
import { publicRoute } from '@/lib/api/routes';
import { enteredSchema, signUpSchema } from '@/lib/schemas/account';
import { signUp } from '@/lib/services/sign-up';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  POST: publicRoute({ input: signUpSchema, reply: enteredSchema, handle: signUp }),
});
