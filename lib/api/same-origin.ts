import 'server-only';
import { environment } from '@/lib/env';
import { AppError } from '@/lib/errors';

const readingMethods = ['GET', 'HEAD', 'OPTIONS'];

/**
 * Refuses a write that another site started. The browser says so itself: `Sec-Fetch-Site` where it is sent, else
 * `Origin`, which comes with every write. A program that sends neither carries nobody's cookies by accident, but an old
 * browser might: it is refused too.
 */
export function assertSameOrigin(request: Request): void {
  if (readingMethods.includes(request.method)) return;
  const site = request.headers.get('sec-fetch-site');
  if (site !== null ? site === 'same-origin' : isOurs(request.headers.get('origin'), request.headers.get('host')))
    return;
  throw new AppError('not-allowed', 'This was sent from another site, so nothing was changed.');
}

function isOurs(origin: string | null, host: string | null): boolean {
  if (origin === null || !URL.canParse(origin)) return false;
  const { secure, origin: own } = environment();
  return origin === own || (!secure && new URL(origin).host === host);
}
