import type { ErrorCode, FieldProblem } from '@/lib/errors';

/** What can go wrong with a request, seen from the browser: the server's own codes, no answer at all, or a bug. */
export type RequestProblemCode = ErrorCode | 'no-connection' | 'unexpected';

export class RequestProblem extends Error {
  readonly code: RequestProblemCode;
  /** One per field, worded for the person who typed it. */
  readonly problems: readonly FieldProblem[];

  constructor(
    code: RequestProblemCode,
    message: string,
    problems: readonly FieldProblem[] = [],
    options?: ErrorOptions,
  ) {
    super(message, options);
    this.name = new.target.name;
    this.code = code;
    this.problems = problems;
  }

  /** The words for one field, or undefined when that field is fine. */
  at(path: string): string | undefined {
    return this.problems.find((problem) => problem.path === path)?.message;
  }
}

/** Told to this page when the server no longer knows somebody, or no longer lets them do something. */
export const refused = 'wadewell-refused';

export type JsonRequest = {
  method?: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  body?: unknown;
  /** Sent as it is, instead of a body written as JSON. */
  file?: File;
  signal?: AbortSignal;
};

/** Anything that checks a reply and returns it typed; the zod schemas of lib/schemas do. */
export type ReplyParser<Reply> = { parse(value: unknown): Reply };
/** Most of them come with zod when they are first asked for, so that no page waits for them before it is drawn. */
export type Reply<Form> = ReplyParser<Form> | (() => Promise<ReplyParser<Form>>);

const PATIENCE_MS = 20_000;
/** A picture travels slowly from the pool. */
const PATIENCE_WITH_FILES_MS = 120_000;

/** Sends JSON, checks the reply, and turns every failure into a RequestProblem. */
export async function fetchJson<Form>(
  address: string,
  reply: Reply<Form>,
  { method = 'GET', body, file, signal }: JsonRequest = {},
): Promise<Form> {
  const parser = parserOf(reply, address);
  // A request that fails first is what is told.
  parser.catch(() => undefined);
  const patience = AbortSignal.timeout(file === undefined ? PATIENCE_MS : PATIENCE_WITH_FILES_MS);
  const response = await fetch(address, {
    method,
    headers: { accept: 'application/json', ...typeOf(body, file) },
    signal: signal === undefined ? patience : AbortSignal.any([signal, patience]),
    ...bodyOf(body, file),
  }).catch((cause: unknown) => {
    // A request that the caller gave up is not a problem to show.
    if (signal?.aborted) throw cause;
    throw new RequestProblem('no-connection', `No answer from ${address}`, [], { cause });
  });

  const answer: unknown = response.status === 204 ? undefined : await response.json().catch(() => undefined);
  if (!response.ok) {
    const problem = problemOf(answer, address, response.status);
    if (problem.code === 'signed-out' || problem.code === 'not-allowed')
      globalThis.dispatchEvent?.(new CustomEvent(refused, { detail: problem.code }));
    throw problem;
  }
  const known = await parser;
  try {
    return known.parse(answer);
  } catch (cause) {
    throw new RequestProblem('unexpected', `The reply of ${address} has an unknown form`, [], { cause });
  }
}

function typeOf(body: unknown, file: File | undefined): Record<string, string> {
  // A file of a kind that the browser does not know says nothing of it.
  if (file !== undefined) return { 'content-type': file.type || 'application/octet-stream' };
  return body === undefined ? {} : { 'content-type': 'application/json' };
}

function bodyOf(body: unknown, file: File | undefined): { body?: BodyInit } {
  if (file !== undefined) return { body: file };
  return body === undefined ? {} : { body: JSON.stringify(body) };
}

/** Fetched beside the request itself. One that cannot be fetched is a connection that is gone. */
async function parserOf<Form>(reply: Reply<Form>, address: string): Promise<ReplyParser<Form>> {
  if (typeof reply !== 'function') return reply;
  try {
    return await reply();
  } catch (cause) {
    throw new RequestProblem('no-connection', `No form for the reply of ${address}`, [], { cause });
  }
}

function problemOf(answer: unknown, address: string, status: number): RequestProblem {
  if (isRecord(answer) && isRecord(answer.error) && isErrorCode(answer.error.code)) {
    const { code, message, problems } = answer.error;
    return new RequestProblem(
      code,
      typeof message === 'string' ? message : `${address} answered ${status}`,
      Array.isArray(problems) ? problems.filter(isFieldProblem) : [],
    );
  }
  return new RequestProblem('unexpected', `${address} answered ${status}`);
}

/** Complete by construction: the compiler asks for every code of lib/errors. */
const errorCodes: Record<ErrorCode, true> = {
  'invalid-input': true,
  'signed-out': true,
  'wrong-sign-in': true,
  'not-allowed': true,
  'not-found': true,
  conflict: true,
  'too-many-requests': true,
  'water-out-of-range': true,
  'target-unreachable': true,
  'plan-refused': true,
  'engine-busy': true,
};

function isErrorCode(value: unknown): value is ErrorCode {
  return typeof value === 'string' && Object.hasOwn(errorCodes, value);
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null;
}

function isFieldProblem(value: unknown): value is FieldProblem {
  return isRecord(value) && typeof value.path === 'string' && typeof value.message === 'string';
}
