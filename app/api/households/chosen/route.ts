import { methods } from '@/lib/api/methods';
import { personRoute } from '@/lib/api/routes';
import { chosenHouseholdSchema, householdListSchema } from '@/lib/schemas/household';
import { chooseHousehold } from '@/lib/services/choose-household';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  PUT: personRoute({ input: chosenHouseholdSchema, reply: householdListSchema, handle: chooseHousehold }),
});
