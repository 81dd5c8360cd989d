'use client';

import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { NewPhoto, PhotoSize } from '@/lib/schemas/photo';
import { fetchJson } from './fetch-json';

const photosReply = () => import('@/lib/schemas/photo').then(({ photosSchema }) => photosSchema);

const photosKey = ['photos'] as const;

/** The photos of the household, without their pictures. */
export function photosOptions() {
  return queryOptions({
    queryKey: photosKey,
    queryFn: ({ signal }) => fetchJson('/api/photos', photosReply, { signal }),
  });
}

/** Where a picture is fetched from. */
export function pictureAddress(id: string, size: PhotoSize): string {
  return `/api/photos/${id}?size=${size}`;
}

export type PhotoFile = Omit<NewPhoto, 'bytes'> & { file: File };

/** Sends a photo; the server encodes it anew. */
export function useAddPhoto() {
  const client = useQueryClient();
  return useMutation({
    // Without a connection it fails in words rather than wait in silence.
    networkMode: 'always',
    mutationFn: ({ file, id, kind, about, caption }: PhotoFile) => {
      const query = new URLSearchParams({ id, kind, ...(about && { about }), ...(caption && { caption }) });
      return fetchJson(`/api/photos?${query}`, photosReply, { method: 'POST', file });
    },
    onSuccess: (photos) => client.setQueryData(photosKey, photos),
  });
}

export function useRemovePhoto() {
  const client = useQueryClient();
  return useMutation({
    networkMode: 'always',
    mutationFn: (id: string) => fetchJson(`/api/photos/${id}`, photosReply, { method: 'DELETE' }),
    onSuccess: (photos) => client.setQueryData(photosKey, photos),
  });
}
