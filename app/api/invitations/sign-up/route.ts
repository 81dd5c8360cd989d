import { methods } from '@/lib/api/methods';
import { publicRoute } from '@/lib/api/routes';
import { enteredSchema, invitedSignUpSchema } from '@/lib/schemas/account';
import { signUpInvited } from '@/lib/services/sign-up';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  POST: publicRoute({ input: invitedSignUpSchema, reply: enteredSchema, handle: signUpInvited }),
});
