import 'server-only';
import { giveBackPoints, takePoint } from '@/db/queries/rate-limits';
import { AppError } from '@/lib/errors';
import type { Visit } from './visit';

const minute = 60_000;

/** How often what may be tried, in which time. Counts survive a restart. */
const limits = {
  /** A family behind one address signs in seldom; a list of stolen passwords is tried fast. */
  'sign-in-address': { most: 100, windowMilliseconds: 15 * minute },
  'sign-in-email': { most: 10, windowMilliseconds: 15 * minute },
  'password-person': { most: 10, windowMilliseconds: 15 * minute },
  /** A family has a few pools; a program would have thousands. */
  'new-household-person': { most: 20, windowMilliseconds: 60 * minute },
  /** Asked for and answered: two each time. */
  'passkey-address': { most: 200, windowMilliseconds: 15 * minute },
  'sign-up-address': { most: 60, windowMilliseconds: 60 * minute },
  'reset-address': { most: 30, windowMilliseconds: 60 * minute },
  'reset-email': { most: 5, windowMilliseconds: 60 * minute },
  'mailbox-address': { most: 30, windowMilliseconds: 15 * minute },
  'mail-person': { most: 5, windowMilliseconds: 60 * minute },
} as const;

/** What counting needs of a visit. */
type Counted = Pick<Visit, 'db' | 'now' | 'keyOf'>;

export type RateLimit = keyof typeof limits;

/** Counts one try. Error: `too-many-requests` once there were too many. */
export async function countTry(visit: Counted, limit: RateLimit, value: string): Promise<void> {
  const { most, windowMilliseconds } = limits[limit];
  const { points } = await takePoint(visit.db, { key: visit.keyOf(limit, value), windowMilliseconds, now: visit.now });
  if (points > most)
    throw new AppError(
      'too-many-requests',
      'Too many tries in a short time. Wait a quarter of an hour, then try again.',
    );
}

/** Forgets the tries after one that was right. */
export function forgetTries(visit: Visit, limit: RateLimit, value: string): Promise<void> {
  return giveBackPoints(visit.db, visit.keyOf(limit, value));
}
