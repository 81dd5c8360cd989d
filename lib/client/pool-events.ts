import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { NewPoolEvent } from '@/lib/schemas/pool-event';
import { doneReply } from './done-reply';
import { fetchJson } from './fetch-json';
import { weekKeys } from './week';

/** Writes down what happened to the pool; the verdict of the sheet follows. */
export function useReportPoolEvent() {
  const client = useQueryClient();
  return useMutation({
    // Without a connection it fails in words rather than wait in silence.
    networkMode: 'always',
    mutationFn: (event: NewPoolEvent) => fetchJson('/api/pool-events', doneReply, { method: 'POST', body: event }),
    onSuccess: () => client.invalidateQueries({ queryKey: weekKeys.all }),
  });
}

/** Says that it is over, or never was. */
export function useEndPoolEvent() {
  const client = useQueryClient();
  return useMutation({
    // Without a connection it fails in words rather than wait in silence.
    networkMode: 'always',
    mutationFn: (id: string) => fetchJson(`/api/pool-events/${id}`, doneReply, { method: 'DELETE' }),
    onSuccess: () => client.invalidateQueries({ queryKey: weekKeys.all }),
  });
}
