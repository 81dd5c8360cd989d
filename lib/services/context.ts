import 'server-only';
import type { Database } from '@/db/client';
import type { HouseholdAccess } from '@/lib/auth/household-access';

/** What every service of a household is handed: where to write, who is asking, and what time it is. */
export type ServiceContext = { db: Database; access: HouseholdAccess; now: Date };
