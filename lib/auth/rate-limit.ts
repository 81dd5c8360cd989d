import 'server-only';
import { countedPoints, giveBackPoints, takePoint } from '@/db/queries/rate-limits';
import { AppError } from '@/lib/errors';
import type { Visit } from './visit';

const minute = 60_000;
const hour = 60 * minute;
const day = 24 * hour;

/** How often what may be tried, in which time. Counts survive a restart. */
export const limits = {
  /** A family behind one address signs in seldom; a list of stolen passwords is tried fast. */
  'sign-in-address': { most: 100, windowMilliseconds: 15 * minute },
  'sign-in-email': { most: 10, windowMilliseconds: 15 * minute },
  'password-person': { most: 10, windowMilliseconds: 15 * minute },
  /** A family has a few pools; a program would have thousands. */
  'new-household-person': { most: 20, windowMilliseconds: hour },
  /** Asked for and answered: two each time. */
  'passkey-address': { most: 200, windowMilliseconds: 15 * minute },
  'sign-up-address': { most: 60, windowMilliseconds: hour },
  /** Each of them sends a mail to that address, where mail leaves. */
  'sign-up-email': { most: 10, windowMilliseconds: hour },
  /** Somebody may have forgotten which of their addresses it was; where no mail leaves, the answer tells. */
  'taken-address': { most: 5, windowMilliseconds: hour },
  'reset-address': { most: 30, windowMilliseconds: hour },
  'reset-email': { most: 5, windowMilliseconds: hour },
  'mailbox-address': { most: 30, windowMilliseconds: 15 * minute },
  'mail-person': { most: 5, windowMilliseconds: hour },
  /** Opening the page of a link counts, and so does using it. */
  'link-address': { most: 60, windowMilliseconds: 15 * minute },
  'invitation-address': { most: 60, windowMilliseconds: 15 * minute },
  /** Links that are passed on by hand; mail has a limit of its own. */
  'invite-person': { most: 60, windowMilliseconds: day },
  /** A shelf has a dozen labels, a test one strip; each picture costs the server work. */
  'upload-person': { most: 60, windowMilliseconds: hour },
  'upload-address': { most: 200, windowMilliseconds: hour },
  /** A copy of the demo household is some hundred rows, and there are 200 for everybody. */
  'look-round-address': { most: 20, windowMilliseconds: hour },
} as const satisfies Record<string, { most: number; windowMilliseconds: number }>;

const tooMany = {
  [15 * minute]: 'Too many tries in a short time. Wait a quarter of an hour, then try again.',
  [hour]: 'Too many tries in a short time. Wait an hour, then try again.',
  [day]: 'That was too often for one day. Try again tomorrow.',
};

/** What counting needs of a visit. */
export type Counted = Pick<Visit, 'db' | 'now' | 'keyOf'>;

export type RateLimit = keyof typeof limits;

/** Counts one try. Error: `too-many-requests` once there were too many. */
export async function countTry(visit: Counted, limit: RateLimit, value: string): Promise<void> {
  const { most, windowMilliseconds } = limits[limit];
  const key = visit.keyOf(limit, value);
  const { points, expiresAt } = await takePoint(visit.db, { key, windowMilliseconds, now: visit.now });
  if (points > most) throw refusal(limit, visit.now, expiresAt);
}

/** Refuses where nothing is left, and counts nothing: for what is known to count only later. Error: `too-many-requests`. */
export async function refuseWhenUsedUp(visit: Counted, limit: RateLimit, value: string): Promise<void> {
  const { points, expiresAt } = await countedPoints(visit.db, { key: visit.keyOf(limit, value), now: visit.now });
  if (points >= limits[limit].most) throw refusal(limit, visit.now, expiresAt);
}

/** The same as a question. */
export async function isUsedUp(visit: Counted, limit: RateLimit, value: string): Promise<boolean> {
  const { points } = await countedPoints(visit.db, { key: visit.keyOf(limit, value), now: visit.now });
  return points >= limits[limit].most;
}

/** Whether a try may go on, counted all the same: for a page, which says it in its own words. */
export async function mayTry(visit: Counted, limit: RateLimit, value: string): Promise<boolean> {
  try {
    await countTry(visit, limit, value);
    return true;
  } catch (error) {
    if (error instanceof AppError && error.code === 'too-many-requests') return false;
    throw error;
  }
}

/** Forgets the tries after one that was right. */
export function forgetTries(visit: Counted, limit: RateLimit, value: string): Promise<void> {
  return giveBackPoints(visit.db, visit.keyOf(limit, value));
}

function refusal(limit: RateLimit, now: Date, until: Date): AppError {
  const retryAfterSeconds = Math.max(1, Math.ceil((until.getTime() - now.getTime()) / 1000));
  const message = tooMany[limits[limit].windowMilliseconds];
  if (message === undefined) throw new Error(`There are no words for a limit such as ${limit}`);
  return new AppError('too-many-requests', message, { retryAfterSeconds });
}
