'use client';

import { infiniteQueryOptions } from '@tanstack/react-query';
import { fetchJson } from './fetch-json';

const auditReply = () => import('@/lib/schemas/audit-entry').then(({ auditPageSchema }) => auditPageSchema);

/** Who changed what, newest first, a page at a time. */
export function auditTrailOptions() {
  return infiniteQueryOptions({
    queryKey: ['audit-trail'] as const,
    initialPageParam: null as string | null,
    queryFn: ({ pageParam, signal }) =>
      fetchJson(`/api/audit-trail${pageParam === null ? '' : `?before=${pageParam}`}`, auditReply, { signal }),
    getNextPageParam: ({ before }) => before,
  });
}
