import { AppError } from '@/lib/errors';

/** Where a page could not be told what it shows: the browser asks again, and says in words what is wrong. */
export function browserAsksAgain(problem: unknown): undefined {
  if (problem instanceof AppError) return undefined;
  throw problem;
}
