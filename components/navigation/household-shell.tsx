import { HouseholdBar } from './household-bar';
import type { HouseholdFrame } from './member';
import { PhoneTabs } from './phone-tabs';
import { PhoneTop } from './phone-top';
import { contentId, SkipLink } from './skip-link';

/** The bars round every page of a household: one line of places on a desk, a head and five tabs on a phone. */
export function HouseholdShell({ frame, children }: { frame: HouseholdFrame; children: React.ReactNode }) {
  return (
    <>
      <SkipLink />
      <div className="print:hidden">
        <HouseholdBar frame={frame} />
        <PhoneTop frame={frame} />
      </div>
      <main id={contentId} tabIndex={-1} className="pb-tabs outline-none md:pb-0 print:pb-0">
        {children}
      </main>
      <PhoneTabs frame={frame} />
    </>
  );
}
