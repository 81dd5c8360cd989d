import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { idSchema } from '@/lib/schemas/id';
import { endSituationSchema, situationsSchema } from '@/lib/schemas/situation';
import { endSituation } from '@/lib/services/end-situation';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  POST: householdRoute({
    may: 'open-situations',
    params: idSchema,
    input: endSituationSchema,
    reply: situationsSchema,
    handle: (context, { ending }, { id: situationId }) => endSituation(context, { situationId, ending }),
  }),
});
