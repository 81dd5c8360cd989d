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
  const instant = Date.parse(claimed);
  if (instant <= latest.getTime()) return claimed;
  if (instant > latest.getTime() + clockTolerance)
    throw new AppError('invalid-input', 'A test cannot be later than now.', {
      problems: [{ path: 'takenAt', message: 'A test cannot be later than now. Check the day and the hour.' }],
    });
  return latest.toISOString();
}
