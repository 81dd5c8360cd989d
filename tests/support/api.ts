/// <reference types="vite/client" />
import type { Database } from '@/db/client';
import { type HouseholdAccess } from '@/lib/auth/household-access';
import { sessionsOf } from '@/lib/auth/sessions';
import { environment } from '@/lib/env';
import { freshDatabase } from './test-database';

export const writeMethods = ['POST', 'PUT', 'PATCH', 'DELETE'] as const;
export type WriteMethod = (typeof writeMethods)[number];
type Method = 'GET' | WriteMethod;
type Handler = (request: Request, segment: { params: Promise<Record<string, string | string[]>> }) => Promise<Response>;
type RouteModule = Partial<Record<Method, Handler>>;

const files = import.meta.glob<RouteModule>('../../app/api/**/route.ts');

/** The pattern of every route that there is: "/api/shelf-products/[productId]". */
export const routePatterns = Object.keys(files)
  .map((file) => file.replace(/^.*\/app/, '').replace(/\/route\.ts$/, ''))
  .sort();

/** Makes the routes of this test file serve a database of its own. Once per file: they keep the one they opened first. */
export function serveFreshDatabase(): Database & { url: string } {
  const db = freshDatabase();
  process.env.DATABASE_URL = db.url;
  return db;
}

export type Call = {
  body?: unknown;
  cookie?: string;
  headers?: Record<string, string>;
  /** Sent as it is, instead of a body written as JSON. */
  text?: string;
  /** The same for a file. */
  bytes?: Uint8Array<ArrayBuffer>;
  path?: Record<string, string>;
  query?: string;
};

/** Calls a route as Next.js would, from a page of the same origin unless the headers say otherwise. */
export async function call(
  method: Method,
  pattern: string,
  { body, cookie, headers, text, bytes, path = {}, query = '' }: Call = {},
): Promise<Response> {
  const load = files[`../../app${pattern}/route.ts`];
  if (!load) throw new Error(`There is no route ${pattern}.`);
  const handler = (await load())[method];
  if (!handler) throw new Error(`${pattern} has no ${method}.`);
  const address = pattern.replace(/\[(?:\.{3})?(\w+)\]/g, (_, name: string) => path[name] ?? 'none');
  const sent = bytes ?? text ?? (body === undefined ? undefined : JSON.stringify(body));
  const request = new Request(`http://127.0.0.1:3000${address}${query}`, {
    method,
    headers: {
      'sec-fetch-site': 'same-origin',
      ...(sent === undefined ? {} : { 'content-type': 'application/json' }),
      ...(cookie === undefined ? {} : { cookie }),
      ...headers,
    },
    ...(sent === undefined ? {} : { body: sent }),
  });
  return handler(request, { params: Promise.resolve(path) });
}

/** The cookie of a device on which a member is signed in. */
export async function signedInAs(db: Database, { personId, householdId }: HouseholdAccess): Promise<string> {
  const { cookie } = await sessionsOf(db, environment()).start(personId, householdId);
  return cookieOf(cookie);
}

/** What a browser sends back of a Set-Cookie header. */
export function cookieOf(setCookie: string | null): string {
  return setCookie?.split(';')[0] ?? '';
}
