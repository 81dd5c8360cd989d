import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { doneSchema } from '@/lib/schemas/account';
import { tryOutSchema, tryOutStartSchema } from '@/lib/schemas/try-out';
import { showTryOutStart } from '@/lib/services/show-try-out-start';
import { takeTryOut } from '@/lib/services/take-try-out';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  GET: householdRoute({ may: 'look', reply: tryOutStartSchema, handle: showTryOutStart }),
  POST: householdRoute({ may: 'plan', input: tryOutSchema, reply: doneSchema, handle: takeTryOut }),
});
