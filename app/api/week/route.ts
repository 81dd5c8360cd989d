import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { weekQuerySchema } from '@/lib/schemas/week-query';
import { weekSheetSchema } from '@/lib/schemas/week-sheet';
import { showWeek } from '@/lib/services/show-week';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  GET: householdRoute({ may: 'look', input: weekQuerySchema, reply: weekSheetSchema, handle: showWeek }),
});
