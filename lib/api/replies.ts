import 'server-only';
import { AppError, type ErrorCode, type FieldProblem } from '@/lib/errors';
import { logFault } from '@/lib/log';
import { answerIn } from '@/lib/messages/answers';
import type { Language } from '@/lib/schemas/languages';
import { apiHeaders } from './headers';

/** Complete by construction: a new code without a status does not compile. */
const statusOf: Record<ErrorCode, number> = {
  'invalid-input': 422,
  'signed-out': 401,
  'wrong-sign-in': 401,
  'not-allowed': 403,
  'not-found': 404,
  conflict: 409,
  'too-many-requests': 429,
  'water-out-of-range': 422,
  'target-unreachable': 422,
  'plan-refused': 422,
  'engine-busy': 503,
};

/** Seconds after which another try makes sense. */
const tryAgainAfter: Partial<Record<ErrorCode, string>> = { 'too-many-requests': '900', 'engine-busy': '5' };

export function jsonReply(value: unknown, status = 200, headers: Record<string, string> = {}): Response {
  return Response.json(value, { status, headers: { ...apiHeaders, ...headers } });
}

export type FileReply = { bytes: Uint8Array<ArrayBuffer>; type: string; tag: string };

/** A file of a household. A browser may keep it for this person, and has to ask each time whether it may still be shown. */
export function fileReply({ bytes, type, tag }: FileReply, request: Request): Response {
  const headers = { ...apiHeaders, 'cache-control': 'private, no-cache', etag: tag };
  if (request.headers.get('if-none-match') === tag) return new Response(null, { status: 304, headers });
  return new Response(bytes, { headers: { ...headers, 'content-type': type } });
}

/** A refusal that HTTP has a number of its own for. */
export class RequestRefusal extends Error {
  constructor(
    readonly status: number,
    readonly code: ErrorCode,
    message: string,
  ) {
    super(message);
    this.name = new.target.name;
  }
}

export function invalidInput(problems: readonly FieldProblem[]): AppError {
  return new AppError('invalid-input', 'Some fields need another look.', { problems });
}

/** Turns whatever was thrown into HTTP. What nobody foresaw says nothing about itself but an id to ask for. */
export function problemReply(error: unknown, about: { method: string; path: string }, language: Language): Response {
  if (error instanceof RequestRefusal) {
    const { code, message, status } = error;
    return jsonReply({ error: { code, message: answerIn(language, message), problems: [] } }, status);
  }
  if (error instanceof AppError) {
    const { code } = error;
    const message = answerIn(language, error.message);
    const problems = error.problems.map((problem) => ({ ...problem, message: answerIn(language, problem.message) }));
    const wait = error.retryAfterSeconds === undefined ? tryAgainAfter[code] : `${error.retryAfterSeconds}`;
    return jsonReply({ error: { code, message, problems } }, statusOf[code], wait ? { 'retry-after': wait } : {});
  }
  const id = logFault(error, about);
  return jsonReply(
    { error: { code: 'unexpected', message: answerIn(language, 'Something went wrong on our side.'), id } },
    500,
  );
}
