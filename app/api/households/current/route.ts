import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { doneSchema } from '@/lib/schemas/account';
import { closingSchema } from '@/lib/schemas/household';
import { closeHousehold } from '@/lib/services/close-household';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  DELETE: householdRoute({
    may: 'close-household',
    input: closingSchema,
    reply: doneSchema,
    handle: closeHousehold,
  }),
});
