import 'server-only';
import { randomUUID } from 'node:crypto';
import pino, { type Logger } from 'pino';

const shared = globalThis as { wadewellLog?: Logger };

/** The log of this process: JSON on standard output, without what could sign somebody in or name them. */
export function log(): Logger {
  shared.wadewellLog ??= pino({
    name: 'wadewell',
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
