import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { newRoundSchema, roundsSchema } from '@/lib/schemas/round';
import { recordRound } from '@/lib/services/record-round';
import { showRounds } from '@/lib/services/show-rounds';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  GET: householdRoute({ may: 'look', reply: roundsSchema, handle: showRounds }),
  POST: householdRoute({ may: 'do-rounds', input: newRoundSchema, reply: roundsSchema, handle: recordRound }),
});
