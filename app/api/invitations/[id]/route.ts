import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { idSchema } from '@/lib/schemas/id';
import { householdPeopleSchema, sentInvitationSchema } from '@/lib/schemas/member';
import { sendInvitationAgain, uninvite } from '@/lib/services/invite';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  PUT: householdRoute({
    may: 'invite',
    params: idSchema,
    reply: sentInvitationSchema,
    handle: (visit, _, invitation) => sendInvitationAgain(visit, invitation),
  }),
  DELETE: householdRoute({
    may: 'invite',
    params: idSchema,
    reply: householdPeopleSchema,
    handle: (visit, _, invitation) => uninvite(visit, invitation),
  }),
});
