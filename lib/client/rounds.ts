'use client';

import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { NewRound } from '@/lib/schemas/round';
import { fetchJson } from './fetch-json';
import { weekKeys } from './week';

const roundsReply = () => import('@/lib/schemas/round').then(({ roundsSchema }) => roundsSchema);

const roundsKey = ['rounds'] as const;

/** The last round, and the clean filter's pressure. */
export function roundsOptions() {
  return queryOptions({
    queryKey: roundsKey,
    queryFn: ({ signal }) => fetchJson('/api/rounds', roundsReply, { signal }),
  });
}

/** Keeps a round; a drain cover that is not whole shows in the verdict of the sheet. */
export function useRecordRound() {
  const client = useQueryClient();
  return useMutation({
    // Without a connection it fails in words rather than wait in silence.
    networkMode: 'always',
    mutationFn: (round: NewRound) => fetchJson('/api/rounds', roundsReply, { method: 'POST', body: round }),
    onSuccess: async (rounds) => {
      client.setQueryData(roundsKey, rounds);
      await client.invalidateQueries({ queryKey: weekKeys.all });
    },
  });
}
