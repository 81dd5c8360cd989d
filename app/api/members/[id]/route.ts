import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { idSchema } from '@/lib/schemas/id';
import { householdPeopleSchema, memberChangeSchema } from '@/lib/schemas/member';
import { changeMember, endMember } from '@/lib/services/change-member';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  PUT: householdRoute({
    may: 'invite',
    input: memberChangeSchema,
    params: idSchema,
    reply: householdPeopleSchema,
    handle: changeMember,
  }),
  // Whoever leaves ends their own membership: the service looks at whose it is.
  DELETE: householdRoute({
    may: 'look',
    params: idSchema,
    reply: householdPeopleSchema,
    handle: (visit, _, member) => endMember(visit, member),
  }),
});
