import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { newSituationSchema, situationsSchema } from '@/lib/schemas/situation';
import { openSituation } from '@/lib/services/open-situation';
import { showSituations } from '@/lib/services/show-situations';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  GET: householdRoute({ may: 'look', reply: situationsSchema, handle: showSituations }),
  POST: householdRoute({
    may: 'open-situations',
    input: newSituationSchema,
    reply: situationsSchema,
    handle: openSituation,
  }),
});
