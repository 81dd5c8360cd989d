import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { setupAnswerSchema, setupStateSchema } from '@/lib/schemas/pool-profile';
import { readPool } from '@/lib/services/read-pool';
import { savePool } from '@/lib/services/save-pool';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  GET: householdRoute({ may: 'look', reply: setupStateSchema, handle: readPool }),
  PUT: householdRoute({ may: 'change-pool', input: setupAnswerSchema, reply: setupStateSchema, handle: savePool }),
});
