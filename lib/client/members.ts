'use client';

import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { Closing } from '@/lib/schemas/household';
import type { HouseholdPeople, MemberChange, NewInvitation, SentInvitation } from '@/lib/schemas/member';
import { doneReply } from './done-reply';
import { fetchJson } from './fetch-json';
import { weekKeys } from './week';

const peopleReply = () => import('@/lib/schemas/member').then(({ householdPeopleSchema }) => householdPeopleSchema);
const sentReply = () => import('@/lib/schemas/member').then(({ sentInvitationSchema }) => sentInvitationSchema);
const householdsReply = () => import('@/lib/schemas/household').then(({ householdListSchema }) => householdListSchema);

const deletionReply = () => import('@/lib/schemas/account').then(({ deletionPreviewSchema }) => deletionPreviewSchema);

const peopleKey = ['people'] as const;

/** Who belongs to the household, and for owners whoever is invited. */
export function peopleOptions() {
  return queryOptions({
    queryKey: peopleKey,
    queryFn: ({ signal }) => fetchJson('/api/members', peopleReply, { signal }),
  });
}

/** The households of whoever is signed in. */
export function householdsOptions() {
  return queryOptions({
    queryKey: ['households'] as const,
    queryFn: ({ signal }) => fetchJson('/api/households', householdsReply, { signal }),
  });
}

/** Makes this device look at another household. */
export function chooseHousehold(householdId: string) {
  return fetchJson('/api/households/chosen', householdsReply, { method: 'PUT', body: { householdId } });
}

/** What deleting the account of whoever is signed in would do; asked anew each time, since others come and go. */
export function deletionOptions() {
  return queryOptions({
    queryKey: ['account-deletion'] as const,
    queryFn: ({ signal }) => fetchJson('/api/account/deletion', deletionReply, { signal }),
    staleTime: 0,
    gcTime: 0,
  });
}

/** Deletes the household that this device looks at, for everybody. */
export function closeHousehold(closing: Closing) {
  return fetchJson('/api/households/current', doneReply, { method: 'DELETE', body: closing });
}

function useKeepPeople() {
  const client = useQueryClient();
  return ({ members, invitations, mailFrom }: HouseholdPeople | SentInvitation) =>
    client.setQueryData<HouseholdPeople>(peopleKey, { members, invitations, mailFrom });
}

/** Invites somebody; the reply carries the link, this once. */
export function useInvite() {
  const keep = useKeepPeople();
  return useMutation({
    networkMode: 'always',
    mutationFn: (invitation: NewInvitation) =>
      fetchJson('/api/invitations', sentReply, { method: 'POST', body: invitation }),
    onSuccess: keep,
  });
}

/** Another link for an invitation that is open. */
export function useInviteAgain() {
  const keep = useKeepPeople();
  return useMutation({
    networkMode: 'always',
    mutationFn: (id: string) => fetchJson(`/api/invitations/${id}`, sentReply, { method: 'PUT' }),
    onSuccess: keep,
  });
}

export function useUninvite() {
  const keep = useKeepPeople();
  return useMutation({
    networkMode: 'always',
    mutationFn: (id: string) => fetchJson(`/api/invitations/${id}`, peopleReply, { method: 'DELETE' }),
    onSuccess: keep,
  });
}

export function useChangeMember() {
  const client = useQueryClient();
  const keep = useKeepPeople();
  return useMutation({
    networkMode: 'always',
    mutationFn: ({ id, ...change }: MemberChange & { id: string }) =>
      fetchJson(`/api/members/${id}`, peopleReply, { method: 'PUT', body: change }),
    onSuccess: async (people) => {
      keep(people);
      await client.invalidateQueries({ queryKey: weekKeys.all });
    },
  });
}

/** Removes a member, or leaves. */
export function useEndMember() {
  const keep = useKeepPeople();
  return useMutation({
    networkMode: 'always',
    mutationFn: (id: string) => fetchJson(`/api/members/${id}`, peopleReply, { method: 'DELETE' }),
    onSuccess: keep,
  });
}

/** Says that whoever is signed in is an adult and has just read the safety card. */
export function useConfirmCard() {
  const client = useQueryClient();
  return useMutation({
    networkMode: 'always',
    mutationFn: () => fetchJson('/api/safety-card', doneReply, { method: 'POST', body: { adult: true, read: true } }),
    onSuccess: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: peopleKey }),
        client.invalidateQueries({ queryKey: weekKeys.all }),
      ]),
  });
}
