'use client';

import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { SetupAnswer, SetupState } from '@/lib/schemas/pool-profile';
import type { UnitSystem } from '@/lib/units/unit';
import { doneReply } from './done-reply';
import { fetchJson } from './fetch-json';
import { weekKeys } from './week';

const setupReply = () => import('@/lib/schemas/pool-profile').then(({ setupStateSchema }) => setupStateSchema);

const setupKey = ['pool'] as const;

/** Where the first run stands, with everything that was answered. */
export function setupOptions() {
  return queryOptions({
    queryKey: setupKey,
    queryFn: ({ signal }) => fetchJson('/api/pool', setupReply, { signal }),
  });
}

/** Saves one part of the profile; the reply is the whole of it, as it now stands. */
export function useSaveSetup() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (answer: SetupAnswer) => fetchJson('/api/pool', setupReply, { method: 'PUT', body: answer }),
    onSuccess: async (state: SetupState) => {
      client.setQueryData(setupKey, state);
      await client.invalidateQueries({ queryKey: weekKeys.all });
    },
  });
}

/** The household's measures. What is typed meanwhile is carried over on the device, so nothing waits for the answer. */
export function useSaveUnitSystem() {
  return useMutation({
    mutationFn: (unitSystem: UnitSystem) =>
      fetchJson('/api/households', doneReply, { method: 'PATCH', body: { unitSystem } }),
  });
}
