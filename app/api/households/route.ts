import { methods } from '@/lib/api/methods';
import { householdRoute, personRoute } from '@/lib/api/routes';
import { doneSchema, enteredSchema } from '@/lib/schemas/account';
import { householdChangesSchema, householdListSchema, newHouseholdSchema } from '@/lib/schemas/household';
import { listHouseholds } from '@/lib/services/list-households';
import { makeHousehold } from '@/lib/services/make-household';
import { saveHousehold } from '@/lib/services/save-household';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  GET: personRoute({ reply: householdListSchema, handle: listHouseholds }),
  POST: personRoute({ input: newHouseholdSchema, reply: enteredSchema, handle: makeHousehold }),
  PATCH: householdRoute({
    may: 'change-household',
    input: householdChangesSchema,
    reply: doneSchema,
    handle: saveHousehold,
  }),
});
