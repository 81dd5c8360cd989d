import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { learntSchema } from '@/lib/schemas/learnt';
import { forgetLearnt } from '@/lib/services/forget-learnt';
import { showLearnt } from '@/lib/services/show-learnt';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  GET: householdRoute({ may: 'look', reply: learntSchema, handle: showLearnt }),
  DELETE: householdRoute({ may: 'reset-learning', reply: learntSchema, handle: forgetLearnt }),
});
