import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { doneSchema } from '@/lib/schemas/account';
import { newStopConfirmationSchema } from '@/lib/schemas/stop-confirmation';
import { confirmStop } from '@/lib/services/confirm-stop';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  POST: householdRoute({ may: 'tick-doses', input: newStopConfirmationSchema, reply: doneSchema, handle: confirmStop }),
});
