import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { idSchema } from '@/lib/schemas/id';
import { answerSituationSchema, situationsSchema } from '@/lib/schemas/situation';
import { answerSituation } from '@/lib/services/answer-situation';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  PUT: householdRoute({
    may: 'open-situations',
    params: idSchema,
    input: answerSituationSchema,
    reply: situationsSchema,
    handle: (context, { situation }, { id: situationId }) => answerSituation(context, { situationId, situation }),
  }),
});
