import 'server-only';
import type { ProvenHouseholdId, SystemScope, SystemTask } from '@/lib/schemas/scope';

/** Leave for one of the server's own tasks. Never for anything that a request names a household in. */
export function systemScope(task: SystemTask): SystemScope {
  return { task } as SystemScope;
}

/** A household that one of the server's own tasks has made or found itself. */
export function householdOfSystem(_scope: SystemScope, householdId: string): ProvenHouseholdId {
  return householdId as ProvenHouseholdId;
}
