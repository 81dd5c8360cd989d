import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { auditPageSchema, auditQuerySchema } from '@/lib/schemas/audit-entry';
import { showAuditTrail } from '@/lib/services/show-audit-trail';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  GET: householdRoute({
    may: 'read-audit-trail',
    input: auditQuerySchema,
    reply: auditPageSchema,
    handle: showAuditTrail,
  }),
});
