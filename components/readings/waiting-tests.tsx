'use client';

import dynamic from 'next/dynamic';
import { untilFetched } from '@/components/ui/until-fetched';
import { useHydrated } from '@/components/ui/use-hydrated';
import { mayWait } from '@/lib/client/unsent-readings-key';
import { type ReadingHousehold, ReadingSettingProvider } from './reading-setting';

const UnsentTests = dynamic(() => untilFetched(() => import('./unsent-tests')).then((part) => part.UnsentTests), {
  ssr: false,
});

/** Tests that wait on this device, on a page that is not about entering one: they are sent from there as well. */
export function WaitingTests({ household }: { household: ReadingHousehold }) {
  // The device's store is not known to the server.
  const hydrated = useHydrated();
  if (household.role === 'viewer' || !hydrated || !mayWait(household)) return null;
  return (
    <ReadingSettingProvider household={household}>
      <div className="mx-margin mt-3 empty:hidden">
        <UnsentTests />
      </div>
    </ReadingSettingProvider>
  );
}
