import 'server-only';
import { createHmac } from 'node:crypto';
import { type Database, database } from '@/db/client';
import { sessionHousehold } from '@/db/queries/sessions';
import { environment, now as wallClock, type TrustedProxies } from '@/lib/env';
import { AppError } from '@/lib/errors';
import type { Language } from '@/lib/schemas/languages';
import { type HouseholdAccess, proveHousehold } from './household-access';
import { deviceOf } from './device';
import { type ListedSession, type SignedIn, sessionsOf } from './sessions';
import { languageCookieOf, visitLanguage } from './visit-language';
import { countedAddress, visitorAddress } from './visitor-address';

/** One request, as services that know no household see it. */
export type Visit = {
  db: Database;
  now: Date;
  /** Who is signed in on this device; null for nobody. */
  signedIn: SignedIn | null;
  /** Signs a person in on this device, in place of whoever was. */
  enter(personId: string, householdId: string | null): Promise<void>;
  /** Signs a person out on every device, whoever asks. */
  leaveAll(personId: string): Promise<void>;
  /** Signs out on every device but this one, which gets another session. Nothing for nobody. */
  leaveElsewhere(): Promise<void>;
  /** Another session for whoever is signed in, in the household it looks at by now; the one before is over. */
  renew(): Promise<void>;
  /** Signs out on this device. */
  leave(): Promise<void>;
  /** Every device on which whoever is signed in is so, this one included. */
  devices(): Promise<ListedSession[]>;
  /** Signs out on one of those devices. */
  leaveOn(session: ListedSession): Promise<void>;
  /** What to speak: the language of who is signed in, else what this device asks for. */
  language: Language;
  /** Keeps another language for this device. */
  speak(language: Language): void;
  /** Names something that is counted, such as an e-mail or the address of the visitor, without giving it away. */
  keyOf(what: string, value: string): string;
  /** Network address, as far as it can be known: the socket's, unless proxies in front are trusted. */
  address: string;
};

/** What a service of a household is handed. */
export type HouseholdVisit = { db: Database; access: HouseholdAccess; now: Date };
/** The same for one that asks for the password again, and counts how often. */
export type HouseholdRequest = HouseholdVisit & { visit: Visit };

/** A visit with the cookies it wants to set, for whoever writes the reply. */
export type OpenVisit = Visit & {
  readonly cookies: readonly string[];
  /** Whether the device is to forget what it keeps: whoever was signed in on it is so no longer. */
  readonly forgets: boolean;
};

type Surroundings = {
  db: Database;
  now: Date;
  secure: boolean;
  secret: string;
  trustedProxies?: TrustedProxies | null;
};

/** Looks at the headers of a request, once: who is asking, and from where. */
export async function openVisit(
  headers: Headers,
  { db, now, secure, secret, trustedProxies = null }: Surroundings = surroundings(),
): Promise<OpenVisit> {
  const sessions = sessionsOf(db, { secure, secret, now });
  const found = await sessions.find(headers.get('cookie'));
  const cookies = found?.prolonged ? [found.prolonged] : [];
  const visit = {
    db,
    now,
    cookies,
    forgets: false,
    signedIn: found?.signedIn ?? null,
    language: found?.language ?? visitLanguage(headers),
    speak: (language: Language) => void cookies.push(languageCookieOf(language, { secure })),
    address: countedAddress(visitorAddress(headers, trustedProxies)),
    keyOf: (what: string, value: string) =>
      `${what} ${createHmac('sha256', secret).update(`${what} ${value}`).digest('base64url')}`,
    async enter(personId: string, householdId: string | null) {
      if (visit.signedIn) await sessions.end(visit.signedIn.sessionId);
      const started = await sessions.start(personId, householdId, deviceOf(headers.get('user-agent')));
      visit.signedIn = started.signedIn;
      cookies.splice(0, cookies.length, started.cookie);
    },
    async leaveElsewhere() {
      if (!visit.signedIn) return;
      const { personId, householdId } = visit.signedIn;
      await sessions.endAll(personId);
      await visit.enter(personId, householdId);
    },
    async renew() {
      const before = visit.signedIn;
      if (!before) return;
      await visit.enter(before.personId, await sessionHousehold(db, before.sessionId));
    },
    leaveAll: (personId: string) => sessions.endAll(personId),
    devices: async () => (visit.signedIn ? sessions.list(visit.signedIn.personId) : []),
    async leaveOn({ sessionId }: ListedSession) {
      if (sessionId === visit.signedIn?.sessionId) await visit.leave();
      else await sessions.end(sessionId);
    },
    async leave() {
      cookies.splice(0, cookies.length, await sessions.end(visit.signedIn?.sessionId ?? null));
      visit.signedIn = null;
      visit.forgets = true;
    },
  };
  return visit;
}

function surroundings(): Surroundings {
  const { secure, secret, trustedProxies } = environment();
  return { db: database(), now: wallClock(), secure, secret, trustedProxies };
}

/** Error: `signed-out` when nobody is signed in. */
export function signedInOf({ signedIn }: Visit): SignedIn {
  if (!signedIn) throw new AppError('signed-out', 'You are signed out. Sign in, then try again.');
  return signedIn;
}

/**
 * The household that this visit is about, proven now. A device whose household was closed is about none until a page has
 * shown it another: what is still sent from a page of the former must not land there. Errors: `signed-out`, `not-allowed`.
 */
export async function householdVisitOf(visit: Visit): Promise<HouseholdVisit> {
  const { personId, householdId } = signedInOf(visit);
  if (householdId === null)
    throw new AppError('not-allowed', 'You do not belong to a household, or your time there is over. Ask its owner.');
  const { db, now } = visit;
  return { db, now, access: await proveHousehold(db, { personId, householdId, now }) };
}
