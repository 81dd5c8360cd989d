import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { newInvitationSchema, sentInvitationSchema } from '@/lib/schemas/member';
import { sendInvitation } from '@/lib/services/invite';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  POST: householdRoute({
    may: 'invite',
    input: newInvitationSchema,
    reply: sentInvitationSchema,
    handle: sendInvitation,
  }),
});
