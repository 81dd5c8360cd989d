import 'server-only';
import { createHmac } from 'node:crypto';
import { DrizzleSQLiteAdapter } from '@lucia-auth/adapter-drizzle';
import { generateIdFromEntropySize, Lucia, TimeSpan } from 'lucia';
import type { Database } from '@/db/client';
import { markSessionSeen } from '@/db/queries/sessions';
import { people, sessions } from '@/db/schema';
import { now as wallClock } from '@/lib/env';
import type { Device } from '@/lib/schemas/device';
import type { Language } from '@/lib/schemas/languages';

declare module 'lucia' {
  interface Register {
    Lucia: Lucia<SessionAttributes, PersonAttributes>;
    DatabaseUserAttributes: PersonAttributes;
    DatabaseSessionAttributes: SessionAttributes;
  }
}

type PersonAttributes = { language: Language; deletedAt: Date | null };
type SessionAttributes = {
  householdId: string | null;
  device: Device | null;
  startedAt: Date | null;
  lastSeenAt: Date | null;
};

/** Who is signed in on this device. */
export type SignedIn = { sessionId: string; personId: string; householdId: string | null };

/** A session as its person sees it in the list of their own. */
export type ListedSession = {
  /** A digest of the stored id, which stays here: it serves to end the session and for nothing else. */
  publicId: string;
  sessionId: string;
  device: Device | null;
  startedAt: Date | null;
  lastSeenAt: Date | null;
};

/** Sessions in cookies. Everything that knows the session package is in this file. */
export type Sessions = {
  /** @returns who the cookies belong to, what they speak, and the cookie to send when the session was prolonged */
  find(cookies: string | null): Promise<{ signedIn: SignedIn; language: Language; prolonged: string | null } | null>;
  /** @returns the new session and its cookie */
  start(
    personId: string,
    householdId: string | null,
    device?: Device | null,
  ): Promise<{ signedIn: SignedIn; cookie: string }>;
  /** The sessions of a person that still run. */
  list(personId: string): Promise<ListedSession[]>;
  /** @returns the cookie that forgets the session */
  end(sessionId: string | null): Promise<string>;
  /** Ends every session of a person, on all devices. */
  endAll(personId: string): Promise<void>;
  deleteExpired(): Promise<void>;
};

/** So long somebody stays signed in who comes back; then they sign in again. Whoever stays away is out sooner [ms]. */
const LONGEST_SESSION = 90 * 24 * 3_600_000;

/** How exactly it is known when somebody was there: no session is written at each request. */
const seenWithin = 3_600_000;

const tokenShape = /^[a-z2-7]{40}$/;

/** Cookies by origin: over https they are bound to the host and never sent in the clear; plain http can have neither. */
function sessionCookieName(secure: boolean): string {
  return secure ? '__Host-wadewell' : 'wadewell';
}

/**
 * What is stored is a keyed digest of the token: who reads the table, or a backup of it, cannot sign in with it. The
 * session package keeps its own time, the machine's: a test clock moves pools, not sign-ins. When a session began and was
 * seen is only shown, beside other times of the household, so that goes by the clock of the visit.
 */
export function sessionsOf(
  db: Database,
  { secure, secret, now = wallClock() }: { secure: boolean; secret: string; now?: Date },
): Sessions {
  const name = sessionCookieName(secure);
  const lucia = new Lucia(new DrizzleSQLiteAdapter(db, sessions, people), {
    sessionExpiresIn: new TimeSpan(30, 'd'),
    sessionCookie: { name, attributes: { secure, sameSite: 'lax', path: '/' } },
    getSessionAttributes: ({ householdId, device, startedAt, lastSeenAt }) => ({
      ...{ householdId, device, startedAt, lastSeenAt },
    }),
    getUserAttributes: ({ language, deletedAt }) => ({ language, deletedAt }),
  });
  const digest = (token: string) => createHmac('sha256', secret).update(`session ${token}`).digest('base64url');
  const publicId = (id: string) => createHmac('sha256', secret).update(`listed session ${id}`).digest('base64url');
  const cookieOf = (token: string) => lucia.createSessionCookie(token).serialize();

  return {
    async find(cookies) {
      const token = tokenIn(cookies, name);
      if (token === null) return null;
      const { session, user } = await lucia.validateSession(digest(token));
      if (session === null) return null;
      const { id, userId, householdId, fresh, startedAt, lastSeenAt } = session;
      const isOver = startedAt === null || now.getTime() - startedAt.getTime() >= LONGEST_SESSION;
      // Somebody may have signed in in the very moment in which the account was deleted on another device.
      if (isOver || user.deletedAt !== null) {
        await lucia.invalidateSession(id);
        return null;
      }
      if (lastSeenAt === null || now.getTime() - lastSeenAt.getTime() >= seenWithin)
        await markSessionSeen(db, { sessionId: id, at: now });
      return {
        signedIn: { sessionId: id, personId: userId, householdId },
        language: user.language,
        prolonged: fresh ? cookieOf(token) : null,
      };
    },
    async start(personId, householdId, device = null) {
      const token = generateIdFromEntropySize(25);
      const attributes = { householdId, device, startedAt: now, lastSeenAt: now };
      const { id } = await lucia.createSession(personId, attributes, { sessionId: digest(token) });
      return { signedIn: { sessionId: id, personId, householdId }, cookie: cookieOf(token) };
    },
    async list(personId) {
      const running = await lucia.getUserSessions(personId);
      return running.map(({ id, device, startedAt, lastSeenAt }) => ({
        ...{ publicId: publicId(id), sessionId: id, device, startedAt, lastSeenAt },
      }));
    },
    async end(sessionId) {
      if (sessionId !== null) await lucia.invalidateSession(sessionId);
      return lucia.createBlankSessionCookie().serialize();
    },
    endAll: (personId) => lucia.invalidateUserSessions(personId),
    deleteExpired: () => lucia.deleteExpiredSessions(),
  };
}

/** Reads only our own cookie: what another program on this host wrote, however garbled, is none of our business. */
function tokenIn(cookies: string | null, name: string): string | null {
  const values = (cookies ?? '')
    .split(';')
    .map((cookie) => cookie.trim())
    .filter((cookie) => cookie.startsWith(`${name}=`));
  const token = values[0]?.slice(name.length + 1) ?? '';
  return tokenShape.test(token) ? token : null;
}
