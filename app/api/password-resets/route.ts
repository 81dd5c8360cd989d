import { methods } from '@/lib/api/methods';
import { publicRoute } from '@/lib/api/routes';
import { doneSchema, passwordResetSchema, resetRequestSchema } from '@/lib/schemas/account';
import { requestReset, resetPassword } from '@/lib/services/reset-password';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  POST: publicRoute({ input: resetRequestSchema, reply: doneSchema, handle: requestReset }),
  PUT: publicRoute({ input: passwordResetSchema, reply: doneSchema, handle: resetPassword }),
});
