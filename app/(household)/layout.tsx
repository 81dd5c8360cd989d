import { HouseholdShell } from '@/components/navigation/household-shell';
import type { HouseholdFrame } from '@/components/navigation/member';
import { SignedOutShell } from '@/components/navigation/signed-out-shell';
import { findHousehold } from '@/lib/auth/page-gate';
import type { HouseholdVisit } from '@/lib/auth/visit';
import type { Member } from '@/lib/schemas/member';
import { listPeople } from '@/lib/services/show-people';

/**
 * Draws the bars for whoever is here. Nobody is sent away: the emergency card and the safety card stand below this layout
 * and are for everyone, and a layout is not drawn again on the way from one page to the next. Each page of a household
 * calls `requireHousehold` itself, beside the data it shows.
 */
export default async function HouseholdLayout({ children }: { children: React.ReactNode }) {
  const visit = await findHousehold();
  if (!visit?.access.poolCompleted) return <SignedOutShell signedIn={visit !== null}>{children}</SignedOutShell>;
  const members = await listPeople(visit);
  return <HouseholdShell frame={frameOf(visit, members)}>{children}</HouseholdShell>;
}

/** Whose faces are shown: yours first. */
function frameOf({ access }: HouseholdVisit, members: readonly Member[]): HouseholdFrame {
  const you = { name: access.personName, role: access.role };
  const others = members.filter((member) => !member.you).map(({ name, role }) => ({ name, role }));
  return { householdName: access.householdName, you, people: [you, ...others] };
}
