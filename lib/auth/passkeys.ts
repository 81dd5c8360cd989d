import 'server-only';
import {
  generateAuthenticationOptions,
  generateRegistrationOptions,
  verifyAuthenticationResponse,
  verifyRegistrationResponse,
} from '@simplewebauthn/server';
import { decodeAttestationObject } from '@simplewebauthn/server/helpers';
import { environment } from '@/lib/env';
import { AppError } from '@/lib/errors';
import type {
  NewPasskey,
  PasskeyCreation,
  PasskeyObstacle,
  PasskeyRequest,
  PasskeySignIn,
} from '@/lib/schemas/passkey';
import { type PasskeyPlace, passkeyPlace } from './passkey-place';

/** How long a device may take to answer. */
export const challengeMilliseconds = 5 * 60_000;

/** EdDSA, ES256 and RS256, by their numbers in COSE: every device knows one of them, and every runtime checks them all. */
const algorithms = [-8, -7, -257];

/**
 * Nothing is asked of a device about who made it, and browsers take that out of what it says; some programs sign with their
 * own key instead. Other forms carry certificates, which could send the server to addresses that stand in them.
 */
const attestations = ['none', 'packed'];

const obstacleWords: Record<PasskeyObstacle, string> = {
  number: 'Wadewell is opened by a number here, and passkeys need a name. Sign in with your password.',
  'in-the-clear': 'Passkeys need an address that begins with https. Sign in with your password.',
};

/** Where the passkeys of this server belong to. Error: `not-allowed` where there can be none. */
export function ownPasskeyPlace(): PasskeyPlace {
  const place = passkeyPlace(environment().origin);
  if ('obstacle' in place) throw new AppError('not-allowed', obstacleWords[place.obstacle]);
  return place;
}

/** What a device calls the person: the bytes of their id, which name nobody. */
export function userHandleOf(personId: string): string {
  return Buffer.from(personId).toString('base64url');
}

type Account = { personId: string; name: string; email: string };
type Known = { id: string; transports: string[] };

/** What to ask of a device that is to make a passkey: one that it can find by itself, and opens for its owner alone. */
export async function askForNewPasskey(
  { rpId }: PasskeyPlace,
  { personId, name, email }: Account,
  known: readonly Known[],
): Promise<PasskeyCreation> {
  const { challenge, user } = await generateRegistrationOptions({
    rpName: 'Wadewell',
    rpID: rpId,
    userID: new Uint8Array(Buffer.from(personId)),
    userName: email,
    userDisplayName: name,
  });
  return {
    rp: { id: rpId, name: 'Wadewell' },
    user,
    challenge,
    pubKeyCredParams: algorithms.map((alg) => ({ type: 'public-key', alg })),
    timeout: challengeMilliseconds,
    attestation: 'none',
    excludeCredentials: known.map(({ id, transports }) => ({ id, type: 'public-key', transports })),
    authenticatorSelection: { residentKey: 'required', requireResidentKey: true, userVerification: 'required' },
  };
}

/** What to ask of a device that is to sign somebody in: it knows by itself whose passkeys it has. */
export async function askForPasskey({ rpId }: PasskeyPlace): Promise<PasskeyRequest> {
  const { challenge } = await generateAuthenticationOptions({ rpID: rpId });
  return { rpId, challenge, timeout: challengeMilliseconds, userVerification: 'required' };
}

/** The challenge that an answer claims to be for; null when it claims none. */
export function challengeIn({ clientDataJSON }: { clientDataJSON: string }): string | null {
  try {
    const said: unknown = JSON.parse(Buffer.from(clientDataJSON, 'base64url').toString('utf8'));
    const challenge = typeof said === 'object' && said !== null && 'challenge' in said ? said.challenge : null;
    return typeof challenge === 'string' ? challenge : null;
  } catch {
    return null;
  }
}

/** A key that is proven to be the device's. */
export type ProvenPasskey = { id: string; publicKey: Buffer; counter: number; transports: string[]; backedUp: boolean };

/** What a device made, proven to be for this challenge, this place and by its owner's leave; null when it is not. */
export async function proveNewPasskey(
  { rpId, origin }: PasskeyPlace,
  challenge: string,
  { id, clientDataJSON, attestationObject, transports }: NewPasskey,
): Promise<ProvenPasskey | null> {
  if (!attestations.includes(attestationOf(attestationObject) ?? '')) return null;
  const response = { clientDataJSON, attestationObject, transports };
  const checked = await verifyRegistrationResponse({
    response: { id, rawId: id, type: 'public-key', clientExtensionResults: {}, response },
    expectedChallenge: challenge,
    expectedOrigin: origin,
    expectedRPID: rpId,
    requireUserVerification: true,
    supportedAlgorithmIDs: algorithms,
  }).catch(() => null);
  if (!checked?.verified) return null;
  const { credential, credentialBackedUp } = checked.registrationInfo;
  const { publicKey, counter } = credential;
  // What is proven is the id inside the answer; the one beside it is only said.
  return credential.id === id
    ? { id, publicKey: Buffer.from(publicKey), counter, transports, backedUp: credentialBackedUp }
    : null;
}

function attestationOf(attestationObject: string): string | null {
  try {
    return decodeAttestationObject(new Uint8Array(Buffer.from(attestationObject, 'base64url'))).get('fmt');
  } catch {
    return null;
  }
}

type Kept = { id: string; personId: string; publicKey: Buffer; counter: number };

/** That whoever answers holds this passkey, now and with their own finger, face or number; null when it is not proven. */
export async function proveHolder(
  { rpId, origin }: PasskeyPlace,
  challenge: string,
  kept: Kept,
  { id, userHandle, ...response }: PasskeySignIn,
): Promise<{ counter: number; backedUp: boolean } | null> {
  if (userHandle !== userHandleOf(kept.personId)) return null;
  const checked = await verifyAuthenticationResponse({
    response: { id, rawId: id, type: 'public-key', clientExtensionResults: {}, response: { ...response, userHandle } },
    expectedChallenge: challenge,
    expectedOrigin: origin,
    expectedRPID: rpId,
    credential: { id: kept.id, publicKey: new Uint8Array(kept.publicKey), counter: kept.counter },
    requireUserVerification: true,
  }).catch(() => null);
  if (!checked?.verified) return null;
  const { newCounter, credentialBackedUp } = checked.authenticationInfo;
  return { counter: newCounter, backedUp: credentialBackedUp };
}
