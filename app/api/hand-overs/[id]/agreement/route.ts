import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { handOverAgreementSchema, handOversSchema } from '@/lib/schemas/hand-over';
import { idSchema } from '@/lib/schemas/id';
import { agreeToHandOver } from '@/lib/services/hand-over';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  // Whoever is asked may be one who only looks: the service looks at whose it is.
  PUT: householdRoute({
    may: 'look',
    input: handOverAgreementSchema,
    params: idSchema,
    reply: handOversSchema,
    handle: agreeToHandOver,
  }),
});
