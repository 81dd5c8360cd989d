import 'server-only';
import { AppError } from '@/lib/errors';

/** What a page brings along. Refused, it comes without: the browser asks again and says in words what is wrong. */
export async function forPage<Reply>(reply: Promise<Reply>): Promise<Reply | undefined> {
  try {
    return await reply;
  } catch (problem) {
    if (problem instanceof AppError) return undefined;
    throw problem;
  }
}
