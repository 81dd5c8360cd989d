import 'server-only';
import type { z } from 'zod';
import type { Permission } from '@/lib/auth/permissions';
import { assertMay } from '@/lib/auth/permissions';
import {
  type HouseholdRequest,
  type HouseholdVisit,
  householdVisitOf,
  type OpenVisit,
  openVisit,
  signedInOf,
  type Visit,
} from '@/lib/auth/visit';
import type { SignedIn } from '@/lib/auth/sessions';
import { visitLanguage } from '@/lib/auth/visit-language';
import { checkInput } from '@/lib/schemas/problems';
import { readFile, readJson } from './read-body';
import { type FileReply, fileReply, invalidInput, jsonReply, problemReply } from './replies';
import { assertSameOrigin } from './same-origin';

/** What Next.js hands a route beside the request. */
type Segment = { params: Promise<Record<string, string | string[] | undefined>> };
export type Handler = (request: Request, segment?: Segment) => Promise<Response>;

/**
 * What may come in, what goes out, and which service. `input` is read from the body, in a GET from the query; `params`
 * from the path. The reply is parsed as well, so that a new column of a table cannot leak.
 */
export type RouteOf<Context, Input extends z.ZodType, Params extends z.ZodType, Reply extends z.ZodType> = {
  input?: Input;
  params?: Params;
  reply: Reply;
  handle: (context: Context, input: z.output<Input>, params: z.output<Params>) => Promise<z.input<Reply>>;
};

/** A visit of somebody who is signed in, whichever household it is about. */
export type PersonVisit = Visit & { signedIn: SignedIn };

/** For anybody: signing up, signing in. */
export function publicRoute<Input extends z.ZodType, Params extends z.ZodType, Reply extends z.ZodType>(
  route: RouteOf<Visit, Input, Params, Reply>,
): Handler {
  return answering(inJson(route), (visit) => Promise.resolve(visit));
}

/** For whoever is signed in, in no household in particular. */
export function personRoute<Input extends z.ZodType, Params extends z.ZodType, Reply extends z.ZodType>(
  route: RouteOf<PersonVisit, Input, Params, Reply>,
): Handler {
  return answering(inJson(route), (visit) => Promise.resolve(Object.assign(visit, { signedIn: signedInOf(visit) })));
}

/**
 * For members of a household. `may` is checked before anything that was sent is looked at; the service checks again what
 * it needs, because it has other callers.
 */
export function householdRoute<Input extends z.ZodType, Params extends z.ZodType, Reply extends z.ZodType>(
  route: RouteOf<HouseholdRequest, Input, Params, Reply> & { may: Permission },
): Handler {
  return answering(inJson(route), householdContext(route.may));
}

/** For members who send a file: `input` is read from the query, with the file as `bytes`, no more of them than `most`. */
export function uploadRoute<Input extends z.ZodType, Params extends z.ZodType, Reply extends z.ZodType>(
  route: RouteOf<HouseholdRequest, Input, Params, Reply> & { may: Permission; most: number },
): Handler {
  const receive = async (request: Request) => ({
    ...queryOf(request),
    bytes: await readFile(request, route.most),
  });
  return answering({ ...inJson(route), receive }, householdContext(route.may));
}

/** For members who fetch a file, which the browser may keep and has to ask about each time. */
export function fileRoute<Input extends z.ZodType, Params extends z.ZodType>(
  route: Pick<RouteOf<HouseholdVisit, Input, Params, z.ZodType>, 'input' | 'params'> & {
    may: Permission;
    handle: (context: HouseholdVisit, input: z.output<Input>, params: z.output<Params>) => Promise<FileReply>;
  },
): Handler {
  return answering({ ...route, answer: fileReply }, householdContext(route.may));
}

function householdContext(permission: Permission) {
  return async (visit: OpenVisit): Promise<HouseholdRequest> => {
    const household = await householdVisitOf(visit);
    assertMay(household.access, permission);
    return { ...household, visit };
  };
}

type Answering<Context, Input extends z.ZodType, Params extends z.ZodType, Result> = {
  input?: Input;
  params?: Params;
  handle: (context: Context, input: z.output<Input>, params: z.output<Params>) => Promise<Result>;
  /** What was sent, and how the result goes out. */
  receive?: (request: Request) => Promise<unknown>;
  answer: (result: Result, request: Request) => Response;
};

function answering<Context, Input extends z.ZodType, Params extends z.ZodType, Result>(
  { receive = sent, ...route }: Answering<Context, Input, Params, Result>,
  contextOf: (visit: OpenVisit) => Promise<Context>,
): Handler {
  return async (request, segment) => {
    let language = visitLanguage(request.headers);
    try {
      assertSameOrigin(request);
      const visit = await openVisit(request.headers);
      language = visit.language;
      const context = await contextOf(visit);
      const params = checked(route.params, (await segment?.params) ?? {});
      const input = checked(route.input, route.input && (await receive(request)));
      const reply = route.answer(await route.handle(context, input, params), request);
      for (const cookie of visit.cookies) reply.headers.append('set-cookie', cookie);
      // Also where the page that asked is closed before it can tidy up. Cookies are not named: a language stays chosen.
      if (visit.forgets) reply.headers.set('clear-site-data', '"cache", "storage"');
      return reply;
    } catch (error) {
      return problemReply(error, { method: request.method, path: new URL(request.url).pathname }, language);
    }
  };
}

/** Answers in JSON, parsed by the schema of the reply. */
function inJson<Context, Input extends z.ZodType, Params extends z.ZodType, Reply extends z.ZodType>(
  route: RouteOf<Context, Input, Params, Reply>,
) {
  return { ...route, answer: (result: z.input<Reply>) => jsonReply(route.reply.parse(result)) };
}

function sent(request: Request): Promise<unknown> {
  return ['GET', 'HEAD'].includes(request.method) ? Promise.resolve(queryOf(request)) : readJson(request);
}

function queryOf(request: Request): Record<string, string> {
  return Object.fromEntries(new URL(request.url).searchParams);
}

/** A route that names no schema gets nothing, whatever was sent. */
function checked<Schema extends z.ZodType>(schema: Schema | undefined, value: unknown): z.output<Schema> {
  if (!schema) return undefined as z.output<Schema>;
  const checkedValue = checkInput(schema, value);
  if (!checkedValue.sound) throw invalidInput(checkedValue.problems);
  return checkedValue.value;
}
