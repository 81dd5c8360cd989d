import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { idSchema } from '@/lib/schemas/id';
import { doseTickSchema } from '@/lib/schemas/plan-dose';
import { weekSheetSchema } from '@/lib/schemas/week-sheet';
import { tickDose } from '@/lib/services/tick-dose';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  POST: householdRoute({
    may: 'tick-doses',
    params: idSchema,
    input: doseTickSchema,
    reply: weekSheetSchema,
    handle: (context, tick, { id }) => tickDose(context, id, tick),
  }),
});
