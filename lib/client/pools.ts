'use client';

import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { doneSchema } from '@/lib/schemas/account';
import { type SetupAnswer, type SetupState, setupStateSchema } from '@/lib/schemas/pool-profile';
import type { UnitSystem } from '@/lib/units/unit';
import { fetchJson } from './fetch-json';
import { weekKeys } from './week';

const setupKey = ['pool'] as const;

/** Where the first run stands, with everything that was answered. */
export function setupOptions() {
  return queryOptions({
    queryKey: setupKey,
    queryFn: ({ signal }) => fetchJson('/api/pool', setupStateSchema, { signal }),
  });
}

/** Saves one part of the profile; the reply is the whole of it, as it now stands. */
export function useSaveSetup() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (answer: SetupAnswer) => fetchJson('/api/pool', setupStateSchema, { method: 'PUT', body: answer }),
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
      fetchJson('/api/households', doneSchema, { method: 'PATCH', body: { unitSystem } }),
  });
}
