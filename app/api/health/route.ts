import { methods } from '@/lib/api/methods';
import { publicRoute } from '@/lib/api/routes';
import { healthSchema } from '@/lib/schemas/health';
import { checkHealth } from '@/lib/services/check-health';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  GET: publicRoute({ reply: healthSchema, handle: checkHealth }),
});
