'use client';

import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { NewVisit } from '@/lib/schemas/visit';
import { fetchJson } from './fetch-json';

const visitsReply = () => import('@/lib/schemas/visit').then(({ visitsSchema }) => visitsSchema);

const visitsKey = ['visits'] as const;

/** The newest visits of a professional. */
export function visitsOptions() {
  return queryOptions({
    queryKey: visitsKey,
    queryFn: ({ signal }) => fetchJson('/api/visits', visitsReply, { signal }),
  });
}

/** Keeps a visit. */
export function useRecordVisit() {
  const client = useQueryClient();
  return useMutation({
    // Without a connection it fails in words rather than wait in silence.
    networkMode: 'always',
    mutationFn: (visit: NewVisit) => fetchJson('/api/visits', visitsReply, { method: 'POST', body: visit }),
    onSuccess: (visits) => client.setQueryData(visitsKey, visits),
  });
}
