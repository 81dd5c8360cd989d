'use client';

import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { HandOvers, NewHandOver } from '@/lib/schemas/hand-over';
import { fetchJson } from './fetch-json';
import { fromPage } from './from-page';
import { peopleOptions } from './members';
import { weekKeys } from './week';

const handOversReply = () => import('@/lib/schemas/hand-over').then(({ handOversSchema }) => handOversSchema);

const handOversKey = ['hand-overs'] as const;

/** Who looks after the pool now, and who will. */
export function handOversOptions(initial?: HandOvers) {
  return queryOptions({
    queryKey: handOversKey,
    queryFn: ({ signal }) => fetchJson('/api/hand-overs', handOversReply, { signal }),
    ...fromPage(initial),
  });
}

/** What a member may do hangs on hand-overs, so the rest of the page asks again. */
function useKeepHandOvers() {
  const client = useQueryClient();
  return async (handOvers: HandOvers) => {
    client.setQueryData(handOversKey, handOvers);
    await Promise.all([
      client.invalidateQueries({ queryKey: peopleOptions().queryKey }),
      client.invalidateQueries({ queryKey: weekKeys.all }),
    ]);
  };
}

/** Asks a member to look after the pool for some days. */
export function useHandOver() {
  const keep = useKeepHandOvers();
  return useMutation({
    networkMode: 'always',
    mutationFn: (handOver: NewHandOver) =>
      fetchJson('/api/hand-overs', handOversReply, { method: 'POST', body: handOver }),
    onSuccess: keep,
  });
}

/** The yes of whoever is asked. */
export function useAgreeToHandOver() {
  const keep = useKeepHandOvers();
  return useMutation({
    networkMode: 'always',
    mutationFn: ({ id, cardRead }: { id: string; cardRead: boolean }) =>
      fetchJson(`/api/hand-overs/${id}/agreement`, handOversReply, { method: 'PUT', body: { cardRead } }),
    onSuccess: keep,
  });
}

/** Takes it back, or declines. */
export function useEndHandOver() {
  const keep = useKeepHandOvers();
  return useMutation({
    networkMode: 'always',
    mutationFn: (id: string) => fetchJson(`/api/hand-overs/${id}`, handOversReply, { method: 'DELETE' }),
    onSuccess: keep,
  });
}
