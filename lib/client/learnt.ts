'use client';

import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { fetchJson } from './fetch-json';
import { weekKeys } from './week';

const learntReply = () => import('@/lib/schemas/learnt').then(({ learntSchema }) => learntSchema);

const learntKey = ['learnt'] as const;

/** What the pool has taught so far. */
export function learntOptions() {
  return queryOptions({
    queryKey: learntKey,
    queryFn: ({ signal }) => fetchJson('/api/learnt', learntReply, { signal }),
  });
}

/** Lets the pool be learnt anew; the plan goes by the usual pool again. */
export function useForgetLearnt() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => fetchJson('/api/learnt', learntReply, { method: 'DELETE' }),
    onSuccess: async (learnt) => {
      await client.cancelQueries({ queryKey: learntKey });
      client.setQueryData(learntKey, learnt);
      await client.invalidateQueries({ queryKey: weekKeys.all });
    },
  });
}
