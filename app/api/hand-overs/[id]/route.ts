import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { handOversSchema } from '@/lib/schemas/hand-over';
import { idSchema } from '@/lib/schemas/id';
import { endHandOver } from '@/lib/services/hand-over';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  // An owner takes it back, whoever is asked declines: the service looks at who it is.
  DELETE: householdRoute({
    may: 'look',
    params: idSchema,
    reply: handOversSchema,
    handle: (visit, _, handOver) => endHandOver(visit, handOver),
  }),
});
