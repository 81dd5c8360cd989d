import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { doneSchema } from '@/lib/schemas/account';
import { idSchema } from '@/lib/schemas/id';
import { endPoolEvent } from '@/lib/services/end-pool-event';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  DELETE: householdRoute({
    may: 'report-events',
    params: idSchema,
    reply: doneSchema,
    handle: (context, _input, { id }) => endPoolEvent(context, { id }),
  }),
});
