import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { newVisitSchema, visitsSchema } from '@/lib/schemas/visit';
import { recordVisit } from '@/lib/services/record-visit';
import { showVisits } from '@/lib/services/show-visits';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  GET: householdRoute({ may: 'look', reply: visitsSchema, handle: showVisits }),
  POST: householdRoute({ may: 'keep-house-notes', input: newVisitSchema, reply: visitsSchema, handle: recordVisit }),
});
