import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { doneSchema } from '@/lib/schemas/account';
import { safetyCardSchema } from '@/lib/schemas/household';
import { readSafetyCard } from '@/lib/services/read-safety-card';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  POST: householdRoute({ may: 'read-safety-card', input: safetyCardSchema, reply: doneSchema, handle: readSafetyCard }),
});
