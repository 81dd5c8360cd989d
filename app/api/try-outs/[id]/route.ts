import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { doneSchema } from '@/lib/schemas/account';
import { idSchema } from '@/lib/schemas/id';
import { putBackTryOut } from '@/lib/services/put-back-try-out';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  DELETE: householdRoute({
    may: 'plan',
    params: idSchema,
    reply: doneSchema,
    handle: (context, _input, { id }) => putBackTryOut(context, { id }),
  }),
});
