import 'server-only';
import { randomUUID } from 'node:crypto';
import pino, { type DestinationStream, type Logger, type LoggerOptions } from 'pino';

const shared = globalThis as { wadewellLog?: Logger };

const secretFields = [
  ...[
    'password',
    'current',
    'passwordHash',
    'email',
    'cookie',
    'set-cookie',
    'authorization',
    'token',
    'secret',
    'key',
  ],
];
const neverLogged = secretFields.flatMap((field) => ['', '*.', '*.*.'].map((depth) => withDepth(depth, field)));

function withDepth(depth: string, field: string): string {
  return /^\w+$/.test(field) ? `${depth}${field}` : `${depth.replace(/\.$/, '')}["${field}"]`;
}

/** The log of this process: JSON on standard output, without what could sign somebody in or name them. */
export function log(): Logger {
  shared.wadewellLog ??= logTo();
  return shared.wadewellLog;
}

/** The same into another place than standard output. */
export function logTo(place?: DestinationStream): Logger {
  const settings: LoggerOptions = {
    name: 'wadewell',
    serializers: { err: (error: unknown) => withoutParameters(pino.stdSerializers.err(asError(error))) },
    redact: { paths: neverLogged, censor: '[left out]' },
  };
  return place ? pino(settings, place) : pino(settings);
}

/** Logs a fault that nobody foresaw. @returns the id to show, so that a report finds its line */
export function logFault(error: unknown, about: Record<string, unknown>): string {
  const errorId = randomUUID();
  log().error({ ...about, errorId, err: error }, 'fault');
  return errorId;
}

/** A failed query carries the values it was called with: e-mail addresses, notes, hashes. None of them is logged. */
export function withoutParameters<Told extends { message: string; stack: string }>(told: Told) {
  // A mail server that refuses says whom it does not know.
  const cut = (text: string) =>
    text
      .replace(/\nparams:[\s\S]*?(?=\n\s+at |\ncaused by:|$)/g, '')
      .replace(/[\w.+-]+@[\w-]+(?:\.[\w-]+)+/g, '[left out]');
  const { type, code } = { type: undefined, code: undefined, ...told };
  return { type, code, message: cut(told.message), stack: cut(told.stack) };
}

function asError(error: unknown): Error {
  return error instanceof Error ? error : new Error(String(error));
}
