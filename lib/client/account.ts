'use client';

import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { fetchJson } from './fetch-json';
import { askForConfirmation, changeEmail } from './session';

const accountReply = () => import('@/lib/schemas/account').then(({ shownAccountSchema }) => shownAccountSchema);
const accountKey = ['account'] as const;

/** What belongs to whoever is signed in. */
export function accountOptions() {
  return queryOptions({
    queryKey: accountKey,
    queryFn: ({ signal }) => fetchJson('/api/account', accountReply, { signal }),
  });
}

export function useChangeEmail() {
  const client = useQueryClient();
  return useMutation({
    networkMode: 'always',
    mutationFn: changeEmail,
    onSuccess: () => client.invalidateQueries({ queryKey: accountKey }),
  });
}

export function useAskForConfirmation() {
  const client = useQueryClient();
  return useMutation({
    networkMode: 'always',
    mutationFn: askForConfirmation,
    onSuccess: () => client.invalidateQueries({ queryKey: accountKey }),
  });
}
