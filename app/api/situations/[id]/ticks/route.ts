import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { idSchema } from '@/lib/schemas/id';
import { situationTickSchema, situationsSchema } from '@/lib/schemas/situation';
import { tickSituationStep } from '@/lib/services/tick-situation-step';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  POST: householdRoute({
    may: 'open-situations',
    params: idSchema,
    input: situationTickSchema,
    reply: situationsSchema,
    handle: (context, tick, { id: situationId }) => tickSituationStep(context, { situationId, ...tick }),
  }),
});
