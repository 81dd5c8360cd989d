import { methods } from '@/lib/api/methods';
import { publicRoute } from '@/lib/api/routes';
import { doneSchema } from '@/lib/schemas/account';
import { signOut } from '@/lib/services/sign-out';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  POST: publicRoute({ reply: doneSchema, handle: signOut }),
});
