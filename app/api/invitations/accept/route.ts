import { methods } from '@/lib/api/methods';
import { personRoute } from '@/lib/api/routes';
import { enteredSchema } from '@/lib/schemas/account';
import { acceptedInvitationSchema } from '@/lib/schemas/member';
import { acceptInvitation } from '@/lib/services/join-household';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  POST: personRoute({ input: acceptedInvitationSchema, reply: enteredSchema, handle: acceptInvitation }),
});
