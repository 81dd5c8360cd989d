'use client';

import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { NewHouseNotes } from '@/lib/schemas/house-note';
import { fetchJson } from './fetch-json';

const houseNotesReply = () => import('@/lib/schemas/house-note').then(({ houseNotesSchema }) => houseNotesSchema);

const houseNotesKey = ['house-notes'] as const;

/** Whom to call and where things are. */
export function houseNotesOptions() {
  return queryOptions({
    queryKey: houseNotesKey,
    queryFn: ({ signal }) => fetchJson('/api/house-notes', houseNotesReply, { signal }),
  });
}

/** Replaces the notes; sent twice they are the same. */
export function useSaveHouseNotes() {
  const client = useQueryClient();
  return useMutation({
    // Without a connection it fails in words rather than wait in silence.
    networkMode: 'always',
    mutationFn: (notes: NewHouseNotes) =>
      fetchJson('/api/house-notes', houseNotesReply, { method: 'PUT', body: notes }),
    onSuccess: (notes) => client.setQueryData(houseNotesKey, notes),
  });
}
