'use client';

import { useHydrated } from '@/components/ui/use-hydrated';
import { type ReadingHousehold, ReadingSettingProvider } from './reading-setting';
import { UnsentTests } from './unsent-tests';

/** Tests that wait on this device, on a page that is not about entering one: they are sent from there as well. */
export function WaitingTests({ household }: { household: ReadingHousehold }) {
  // The device's store is not known to the server.
  const hydrated = useHydrated();
  if (household.role === 'viewer' || !hydrated) return null;
  return (
    <ReadingSettingProvider household={household}>
      <div className="mx-margin mt-3 empty:hidden">
        <UnsentTests />
      </div>
    </ReadingSettingProvider>
  );
}
