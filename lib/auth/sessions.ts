import 'server-only';
import { createHmac } from 'node:crypto';
import { DrizzleSQLiteAdapter } from '@lucia-auth/adapter-drizzle';
import { generateIdFromEntropySize, Lucia, TimeSpan } from 'lucia';
import type { Database } from '@/db/client';
import { people, sessions } from '@/db/schema';
import type { Language } from '@/lib/schemas/languages';

declare module 'lucia' {
  interface Register {
    Lucia: Lucia<{ householdId: string | null }, { language: Language }>;
    DatabaseUserAttributes: { language: Language };
    DatabaseSessionAttributes: { householdId: string | null };
  }
}

/** Who is signed in on this device. */
export type SignedIn = { sessionId: string; personId: string; householdId: string | null };

/** Sessions in cookies. Everything that knows the session package is in this file. */
export type Sessions = {
  /** @returns who the cookies belong to, what they speak, and the cookie to send when the session was prolonged */
  find(cookies: string | null): Promise<{ signedIn: SignedIn; language: Language; prolonged: string | null } | null>;
  /** @returns the new session and its cookie */
  start(personId: string, householdId: string | null): Promise<{ signedIn: SignedIn; cookie: string }>;
  /** @returns the cookie that forgets the session */
  end(sessionId: string | null): Promise<string>;
  /** Ends every session of a person, on all devices. */
  endAll(personId: string): Promise<void>;
  deleteExpired(): Promise<void>;
};

const tokenShape = /^[a-z2-7]{40}$/;

/** Cookies by origin: over https they are bound to the host and never sent in the clear; plain http can have neither. */
function sessionCookieName(secure: boolean): string {
  return secure ? '__Host-wadewell' : 'wadewell';
}

/**
 * What is stored is a keyed digest of the token: who reads the table, or a backup of it, cannot sign in with it. The
 * session package keeps its own time, the machine's: a test clock moves pools, not sign-ins.
 */
export function sessionsOf(db: Database, { secure, secret }: { secure: boolean; secret: string }): Sessions {
  const name = sessionCookieName(secure);
  const lucia = new Lucia(new DrizzleSQLiteAdapter(db, sessions, people), {
    sessionExpiresIn: new TimeSpan(30, 'd'),
    sessionCookie: { name, attributes: { secure, sameSite: 'lax', path: '/' } },
    getSessionAttributes: ({ householdId }) => ({ householdId }),
    getUserAttributes: ({ language }) => ({ language }),
  });
  const digest = (token: string) => createHmac('sha256', secret).update(`session ${token}`).digest('base64url');
  const cookieOf = (token: string) => lucia.createSessionCookie(token).serialize();

  return {
    async find(cookies) {
      const token = tokenIn(cookies, name);
      if (token === null) return null;
      const { session, user } = await lucia.validateSession(digest(token));
      if (session === null) return null;
      const { id, userId, householdId, fresh } = session;
      return {
        signedIn: { sessionId: id, personId: userId, householdId },
        language: user.language,
        prolonged: fresh ? cookieOf(token) : null,
      };
    },
    async start(personId, householdId) {
      const token = generateIdFromEntropySize(25);
      const { id } = await lucia.createSession(personId, { householdId }, { sessionId: digest(token) });
      return { signedIn: { sessionId: id, personId, householdId }, cookie: cookieOf(token) };
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
