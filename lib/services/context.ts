import 'server-only';
import type { HouseholdVisit } from '@/lib/auth/visit';

/** What every service of a household is handed: where to write, who is asking, and what time it is. */
export type ServiceContext = HouseholdVisit;
