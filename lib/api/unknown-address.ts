import 'server-only';
import { visitLanguage } from '@/lib/auth/visit-language';
import { AppError } from '@/lib/errors';
import { problemReply } from './replies';
import type { Handler } from './routes';

export const unknownAddress: Handler = (request) =>
  Promise.resolve(
    problemReply(
      new AppError('not-found', 'There is nothing at this address.'),
      { method: request.method, path: new URL(request.url).pathname },
      visitLanguage(request.headers),
    ),
  );
