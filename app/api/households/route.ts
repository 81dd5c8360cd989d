import { methods } from '@/lib/api/methods';
import { householdRoute, personRoute } from '@/lib/api/routes';
import { doneSchema } from '@/lib/schemas/account';
import { householdChangesSchema, householdListSchema } from '@/lib/schemas/household';
import { listHouseholds } from '@/lib/services/list-households';
import { saveHousehold } from '@/lib/services/save-household';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  GET: personRoute({ reply: householdListSchema, handle: listHouseholds }),
  PATCH: householdRoute({
    may: 'change-household',
    input: householdChangesSchema,
    reply: doneSchema,
    handle: saveHousehold,
  }),
});
