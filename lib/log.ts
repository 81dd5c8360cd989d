import 'server-only';
import { randomUUID } from 'node:crypto';
import pino, { type Logger } from 'pino';

const shared = globalThis as { wadewellLog?: Logger };

/** The log of this process: JSON on standard output, without what could sign somebody in or name them. */
export function log(): Logger {
  shared.wadewellLog ??= pino({
    name: 'wadewell',
    serializers: { err: (error: unknown) => withoutParameters(pino.stdSerializers.err(asError(error))) },
    redact: { paths: ['*.password', '*.passwordHash', '*.email', '*.cookie', '*.token'], censor: '[left out]' },
  });
  return shared.wadewellLog;
}

/** Logs a fault that nobody foresaw. @returns the id to show, so that a report finds its line */
export function logFault(error: unknown, about: Record<string, unknown>): string {
  const errorId = randomUUID();
  log().error({ ...about, errorId, err: error }, 'fault');
  return errorId;
}

/** A failed query carries the values it was called with: e-mail addresses, notes, hashes. None of them is logged. */
export function withoutParameters<Told extends { message: string; stack: string }>(told: Told) {
  const cut = (text: string) => text.replace(/\nparams:[\s\S]*?(?=\n\s+at |\ncaused by:|$)/g, '');
  const { type, code } = { type: undefined, code: undefined, ...told };
  return { type, code, message: cut(told.message), stack: cut(told.stack) };
}

function asError(error: unknown): Error {
  return error instanceof Error ? error : new Error(String(error));
}
