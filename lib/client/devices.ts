'use client';

import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { fetchJson } from './fetch-json';
import { signOutElsewhere } from './session';

const devicesReply = () => import('@/lib/schemas/device').then(({ signedInDevicesSchema }) => signedInDevicesSchema);

const devicesKey = ['devices'] as const;

/** Where whoever is signed in is so, this device included. */
export function devicesOptions() {
  return queryOptions({
    queryKey: devicesKey,
    queryFn: ({ signal }) => fetchJson('/api/sessions', devicesReply, { signal }),
  });
}

/** Signs out on one other device. */
export function useSignOutDevice() {
  const client = useQueryClient();
  return useMutation({
    networkMode: 'always',
    mutationFn: (id: string) => fetchJson(`/api/sessions/${id}`, devicesReply, { method: 'DELETE' }),
    onSuccess: (devices) => client.setQueryData(devicesKey, devices),
    // Signed out there by itself meanwhile: the list was old.
    onError: () => client.invalidateQueries({ queryKey: devicesKey }),
  });
}

/** Signs out on every device but this one, which gets another session by it. */
export function useSignOutElsewhere() {
  const client = useQueryClient();
  return useMutation({
    networkMode: 'always',
    mutationFn: signOutElsewhere,
    onSuccess: () => client.invalidateQueries({ queryKey: devicesKey }),
  });
}
