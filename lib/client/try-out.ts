'use client';

import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { TryOut } from '@/lib/schemas/try-out';
import { doneReply } from './done-reply';
import { fetchJson } from './fetch-json';
import { weekKeys } from './week';

const startReply = () => import('@/lib/schemas/try-out').then(({ tryOutStartSchema }) => tryOutStartSchema);

const tryOutKeys = {
  all: ['try-out'] as const,
  on: (planId: string) => [...tryOutKeys.all, planId] as const,
};

/** What trying out starts from. Asked once for each plan. */
export function tryOutStart(planId: string) {
  return queryOptions({
    queryKey: tryOutKeys.on(planId),
    queryFn: ({ signal }) => fetchJson('/api/try-outs', startReply, { signal }),
    staleTime: Infinity,
    retry: false,
  });
}

/**
 * Takes a try-out into the plan; the sheet follows with its new plan.
 *
 * @param onTaken called before the new plan is on the screen
 */
export function useTakeTryOut(onTaken: () => void) {
  const client = useQueryClient();
  return useMutation({
    // Without a connection it fails in words rather than wait in silence.
    networkMode: 'always',
    mutationFn: (tryOut: TryOut) => fetchJson('/api/try-outs', doneReply, { method: 'POST', body: tryOut }),
    onSuccess: () => {
      onTaken();
      return client.invalidateQueries({ queryKey: weekKeys.all });
    },
    // The plan has moved on: what is on the screen is no longer true.
    onError: (problem) => sheetAnew(client, problem),
  });
}

/** Puts a try-out back that was taken into the plan. */
export function usePutBackTryOut() {
  const client = useQueryClient();
  return useMutation({
    networkMode: 'always',
    mutationFn: (id: string) => fetchJson(`/api/try-outs/${id}`, doneReply, { method: 'DELETE' }),
    onSuccess: () => client.invalidateQueries({ queryKey: weekKeys.all }),
    onError: (problem) => sheetAnew(client, problem),
  });
}

function sheetAnew(client: ReturnType<typeof useQueryClient>, problem: Error) {
  return 'code' in problem && problem.code === 'conflict'
    ? client.invalidateQueries({ queryKey: weekKeys.all })
    : undefined;
}
