import type {
  AccountDeletion,
  EmailChange,
  Entered,
  InvitedSignUp,
  PasswordChange,
  PasswordReset,
  ResetRequest,
  SignIn,
  SignUp,
} from '@/lib/schemas/account';
import type { NewHousehold } from '@/lib/schemas/household';
import type { LanguageChoice } from '@/lib/schemas/language-choice';
import { fetchJson, type ReplyParser } from './fetch-json';
import { forgetDevice } from './forget-device';

/**
 * Where to go after signing in or up: an address of our own, never another site's. Checked by hand, because the schema
 * would bring all of zod to the start page.
 */
const whereNext: ReplyParser<Entered> = {
  parse(value) {
    const next = typeof value === 'object' && value !== null && 'next' in value ? value.next : undefined;
    if (typeof next !== 'string' || !/^\/(?!\/)/.test(next))
      throw new TypeError('The reply names no address of our own');
    return { next };
  },
};

/** The zone this browser lives in. */
export function browserTimeZone(): string {
  // eslint-disable-next-line no-restricted-syntax -- it is asked for its name, nothing is formatted
  return Intl.DateTimeFormat().resolvedOptions().timeZone;
}

const nothing: ReplyParser<undefined> = { parse: () => undefined };

export function signIn(entry: SignIn): Promise<Entered> {
  return fetchJson('/api/sign-in', whereNext, { method: 'POST', body: entry });
}

export function signUp(entry: SignUp): Promise<Entered> {
  return fetchJson('/api/sign-up', whereNext, { method: 'POST', body: entry });
}

/** Signs up and joins the household of an invitation. */
export function signUpInvited(entry: InvitedSignUp): Promise<Entered> {
  return fetchJson('/api/invitations/sign-up', whereNext, { method: 'POST', body: entry });
}

/** Joins the household of an invitation with the account that is signed in. */
export function acceptInvitation(accepted: { token: string }): Promise<Entered> {
  return fetchJson('/api/invitations/accept', whereNext, { method: 'POST', body: accepted });
}

/** Makes a household of one's own, and looks at it on this device. */
export function makeHousehold(household: NewHousehold): Promise<Entered> {
  return fetchJson('/api/households', whereNext, { method: 'POST', body: household });
}

/** Deletes the account of whoever is signed in; they are signed out by it everywhere. */
export async function deleteAccount(deletion: AccountDeletion): Promise<void> {
  await fetchJson('/api/account', nothing, { method: 'DELETE', body: deletion });
  await forgetDevice();
}

/** Another password; every other device is signed out by it. */
export async function changePassword(change: PasswordChange): Promise<void> {
  await fetchJson('/api/account/password', nothing, { method: 'PUT', body: change });
}

/** Asks for a link to another password. */
export async function requestReset(request: ResetRequest): Promise<void> {
  await fetchJson('/api/password-resets', nothing, { method: 'POST', body: request });
}

/** Another password, by the link that was sent. */
export async function resetPassword(reset: PasswordReset): Promise<void> {
  await fetchJson('/api/password-resets', nothing, { method: 'PUT', body: reset });
}

/** Says that an address is one's own, by the link that was sent there. */
export async function confirmEmail(opened: { token: string }): Promise<void> {
  await fetchJson('/api/email-confirmations', nothing, { method: 'POST', body: opened });
}

/** Another address to sign in with. */
export async function changeEmail(change: EmailChange): Promise<void> {
  await fetchJson('/api/account/email', nothing, { method: 'PUT', body: change });
}

/** Asks for another mail that asks whether the address is one's own. */
export async function askForConfirmation(): Promise<void> {
  await fetchJson('/api/account/confirmation', nothing, { method: 'POST' });
}

/** Signs out on every device but this one. */
export async function signOutElsewhere(): Promise<void> {
  await fetchJson('/api/sessions', nothing, { method: 'DELETE' });
}

export async function signOut(): Promise<void> {
  await fetchJson('/api/sign-out', nothing, { method: 'POST' });
  await forgetDevice();
}

/** Speaks another language to whoever is signed in, on all of their devices. */
export async function chooseLanguage(choice: LanguageChoice): Promise<void> {
  await fetchJson('/api/language', nothing, { method: 'PUT', body: choice });
}

/** Opens a private copy of the demo household; the cookie comes with the reply. */
export async function lookRound(): Promise<void> {
  await fetchJson('/api/look-round', nothing, { method: 'POST' });
}

/**
 * Leaves by loading the page anew and not by a soft navigation: who is signed in has changed, so nothing that was kept
 * in memory for the one before may be shown to the next.
 */
export function leaveFor(address: string): void {
  window.location.assign(address);
}
