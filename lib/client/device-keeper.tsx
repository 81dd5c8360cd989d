'use client';

import { useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { type DeviceOwner, settleDevice } from './device-owner';
import { forgetDevice, forgotten } from './forget-device';
import { refused } from './fetch-json';

/** Looks after what this device keeps: at each page it may turn out that somebody is no longer who they were. */
export function DeviceKeeper({ owner }: { owner: DeviceOwner }) {
  const client = useQueryClient();
  useEffect(() => void settleDevice(owner), [owner]);
  useEffect(() => {
    // What the page still shows is on the screen, and would be asked for again: it goes with the page.
    const forget = () => client.removeQueries({ type: 'inactive' });
    let asked = false;
    const look = (event: Event) => {
      // Once for a page: what is on it says by itself that nothing can be fetched.
      if (asked || owner === null) return;
      asked = true;
      if ((event as CustomEvent<string>).detail === 'signed-out') void forgetDevice({ keepUnsent: true });
      else
        void standing()
          .then((households) => households && settleDevice({ ...owner, households }))
          .finally(() => (asked = false));
    };
    window.addEventListener(forgotten, forget);
    window.addEventListener(refused, look);
    return () => {
      window.removeEventListener(forgotten, forget);
      window.removeEventListener(refused, look);
    };
  }, [client, owner]);
  return null;
}

/** What somebody is in each household by now; undefined when that cannot be learnt. */
async function standing(): Promise<NonNullable<DeviceOwner>['households'] | undefined> {
  const answer = await fetch('/api/households', { headers: { accept: 'application/json' } }).catch(() => undefined);
  if (!answer?.ok) return undefined;
  const { householdListSchema } = await import('@/lib/schemas/household');
  const parsed = householdListSchema.safeParse(await answer.json().catch(() => undefined));
  return parsed.success ? parsed.data.map(({ id, role }) => ({ id, role })) : undefined;
}
