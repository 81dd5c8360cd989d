import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { doneSchema } from '@/lib/schemas/account';
import { newPoolEventSchema } from '@/lib/schemas/pool-event';
import { reportPoolEvent } from '@/lib/services/report-pool-event';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  POST: householdRoute({ may: 'report-events', input: newPoolEventSchema, reply: doneSchema, handle: reportPoolEvent }),
});
