import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { handOversSchema, newHandOverSchema } from '@/lib/schemas/hand-over';
import { handOver } from '@/lib/services/hand-over';
import { showHandOvers } from '@/lib/services/show-hand-overs';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  GET: householdRoute({ may: 'look', reply: handOversSchema, handle: showHandOvers }),
  POST: householdRoute({ may: 'hand-over', input: newHandOverSchema, reply: handOversSchema, handle: handOver }),
});
