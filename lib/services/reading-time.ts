import 'server-only';
import { AppError } from '@/lib/errors';

/** How far the clock of a device may run ahead of ours. */
const clockTolerance = 5 * 60_000;

/**
 * When the water was tested, never later than it was written down. A device whose clock runs a little ahead means now.
 *
 * Error: `invalid-input` for a test of the future.
 */
export function takenAtOf(claimed: string, latest: Date): string {
  return pastInstant(claimed, latest, 'takenAt', 'A test cannot be later than now.');
}

/** When something happened, likewise. Error: `invalid-input` for what is still to come. */
export function happenedAtOf(claimed: string, latest: Date, path = 'happenedAt'): string {
  return pastInstant(claimed, latest, path, 'What happened cannot be later than now.');
}

function pastInstant(claimed: string, latest: Date, path: string, message: string): string {
  const instant = Date.parse(claimed);
  if (instant <= latest.getTime()) return claimed;
  if (instant > latest.getTime() + clockTolerance)
    throw new AppError('invalid-input', message, {
      problems: [{ path, message: `${message} Check the day and the hour.` }],
    });
  return latest.toISOString();
}
