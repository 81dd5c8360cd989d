'use client';

import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { Entered } from '@/lib/schemas/account';
import type { PasskeyList } from '@/lib/schemas/passkey';
import { fetchJson } from './fetch-json';

// All of it comes when somebody presses: neither the package nor zod is part of a page's first load.
const library = () => import('@simplewebauthn/browser');
const listReply = () => import('@/lib/schemas/passkey').then(({ passkeyListSchema }) => passkeyListSchema);
const creationReply = () => import('@/lib/schemas/passkey').then(({ passkeyCreationSchema }) => passkeyCreationSchema);
const requestReply = () => import('@/lib/schemas/passkey').then(({ passkeyRequestSchema }) => passkeyRequestSchema);
const enteredReply = () => import('@/lib/schemas/account').then(({ enteredSchema }) => enteredSchema);

/** Why browser or device gave no passkey. */
export type PasskeyProblemCode = 'cancelled' | 'unsupported' | 'known' | 'address' | 'failed';

export class PasskeyProblem extends Error {
  constructor(
    readonly code: PasskeyProblemCode,
    options?: ErrorOptions,
  ) {
    super(`The device gave no passkey: ${code}`, options);
    this.name = new.target.name;
  }
}

/** By the names that the standard gives its errors. */
const codes: Readonly<Record<string, PasskeyProblemCode>> = {
  NotAllowedError: 'cancelled',
  AbortError: 'cancelled',
  NotSupportedError: 'unsupported',
  ConstraintError: 'unsupported',
  InvalidStateError: 'known',
  SecurityError: 'address',
};

/** Has the device do something; what it throws is a PasskeyProblem. */
async function onDevice<Answer>(act: () => Promise<Answer>): Promise<Answer> {
  if (typeof globalThis.PublicKeyCredential !== 'function') throw new PasskeyProblem('unsupported');
  try {
    return await act();
  } catch (cause) {
    const name = typeof cause === 'object' && cause !== null && 'name' in cause ? String(cause.name) : '';
    throw new PasskeyProblem(codes[name] ?? 'failed', { cause });
  }
}

const passkeysKey = ['passkeys'] as const;

/** The passkeys of whoever is signed in. */
export function passkeysOptions() {
  return queryOptions({
    queryKey: passkeysKey,
    queryFn: ({ signal }) => fetchJson('/api/passkeys', listReply, { signal }),
  });
}

function useKeepPasskeys() {
  const client = useQueryClient();
  return (list: PasskeyList) => client.setQueryData<PasskeyList>(passkeysKey, list);
}

/** Has this device make a passkey, and keeps it under a name. */
export function useAddPasskey() {
  const keep = useKeepPasskeys();
  return useMutation({
    networkMode: 'always',
    mutationFn: async ({ name, password }: { name: string; password: string }) => {
      const [{ startRegistration }, optionsJSON] = await Promise.all([
        library(),
        fetchJson('/api/passkeys/options', creationReply, { method: 'POST', body: { password } }),
      ]);
      const { id, response } = await onDevice(() => startRegistration({ optionsJSON }));
      const { clientDataJSON, attestationObject, transports = [] } = response;
      const body = { name, id, clientDataJSON, attestationObject, transports };
      return fetchJson('/api/passkeys', listReply, { method: 'POST', body });
    },
    onSuccess: keep,
  });
}

export function useForgetPasskey() {
  const keep = useKeepPasskeys();
  return useMutation({
    networkMode: 'always',
    mutationFn: (id: string) => fetchJson(`/api/passkeys/${id}`, listReply, { method: 'DELETE' }),
    onSuccess: keep,
  });
}

/** Signs in with a passkey of this device, whichever its owner chooses there. */
export async function signInWithPasskey(): Promise<Entered> {
  const [{ startAuthentication }, optionsJSON] = await Promise.all([
    library(),
    fetchJson('/api/sign-in/passkey/options', requestReply, { method: 'POST' }),
  ]);
  const { id, response } = await onDevice(() => startAuthentication({ optionsJSON }));
  const { clientDataJSON, authenticatorData, signature, userHandle = '' } = response;
  const body = { id, clientDataJSON, authenticatorData, signature, userHandle };
  return fetchJson('/api/sign-in/passkey', enteredReply, { method: 'POST', body });
}
