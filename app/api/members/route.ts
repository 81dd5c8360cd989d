import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { householdPeopleSchema } from '@/lib/schemas/member';
import { showPeople } from '@/lib/services/show-people';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  GET: householdRoute({ may: 'look', reply: householdPeopleSchema, handle: showPeople }),
});
