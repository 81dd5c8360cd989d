'use client';

import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { NewSituation, Situation, SituationEnding, Situations } from '@/lib/schemas/situation';
import { fetchJson } from './fetch-json';
import { weekKeys } from './week';

const situationsReply = () => import('@/lib/schemas/situation').then(({ situationsSchema }) => situationsSchema);

const situationsKey = ['situations'] as const;

/** What is open, what was, and the water that a procedure asks about. */
export function situationsOptions() {
  return queryOptions({
    queryKey: situationsKey,
    queryFn: ({ signal }) => fetchJson('/api/situations', situationsReply, { signal }),
  });
}

/** Begins a procedure; the same id again begins nothing more. */
export function useOpenSituation() {
  return useChange((situation: NewSituation) => ({ path: '', method: 'POST', body: situation }));
}

/** Gives an open procedure other answers. */
export function useAnswerSituation() {
  return useChange(({ id, situation }: { id: string; situation: Situation }) => ({
    path: `/${id}`,
    method: 'PUT',
    body: { situation },
  }));
}

/** Ticks a step, or takes the tick back. */
export function useTickStep() {
  return useChange(({ id, step, done }: { id: string; step: string; done: boolean }) => ({
    path: `/${id}/ticks`,
    method: 'POST',
    body: { step, done },
  }));
}

/** Ends a procedure: its rule is met, it was a mistake, or a licensed person has taken over. */
export function useEndSituation() {
  return useChange(({ id, ending }: { id: string; ending: Exclude<SituationEnding, 'set-aside'> }) => ({
    path: `/${id}/end`,
    method: 'POST',
    body: { ending },
  }));
}

type Request = { path: string; method: 'POST' | 'PUT'; body: object };

function useChange<Change>(requestOf: (change: Change) => Request) {
  const client = useQueryClient();
  return useMutation({
    // Without a connection it fails in words rather than wait in silence.
    networkMode: 'always',
    mutationFn: (change: Change): Promise<Situations> => {
      const { path, method, body } = requestOf(change);
      return fetchJson(`/api/situations${path}`, situationsReply, { method, body });
    },
    onSuccess: async (situations) => {
      client.setQueryData(situationsKey, situations);
      // A situation leads the plan and the verdict.
      await client.invalidateQueries({ queryKey: weekKeys.all });
    },
  });
}
