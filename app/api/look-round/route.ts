import { methods } from '@/lib/api/methods';
import { publicRoute } from '@/lib/api/routes';
import { enteredSchema } from '@/lib/schemas/account';
import { lookRound } from '@/lib/services/look-round';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  POST: publicRoute({ reply: enteredSchema, handle: lookRound }),
});
