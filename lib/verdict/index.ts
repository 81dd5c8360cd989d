import { AppError } from '@/lib/errors';
import { limits } from '@/lib/standards/limits';
import { type SwimReason, swimReasons, type SwimState, worstState } from './codes';
import type { SwimVerdictInput } from './input';
import { HOUR } from './outlook';
import { reasonsAt } from './reasons';
import { stretchesAhead } from './stretches';

export type { SwimReason, SwimReasonCode, SwimState } from './codes';
export type { MeasuredValue, SpreadAmount, SwimProjection, SwimVerdictInput } from './input';

/**
 * What may be said about swimming. `reasons` holds all of them, worst first; none when the state is fine.
 *
 * `until` [ms]: for fine the first limit ahead, for wait the end of everything that asks to wait; left out when the end of
 * a wait cannot be told. `then` is what the water's state will be from there, as far as it can be seen from now: a wait may
 * well end in a test. `adviseDailyCheck`: a reading of 24 hours or more on a day of swimming.
 */
export type SwimVerdict = {
  state: SwimState;
  reasons: SwimReason[];
  until?: number;
  then?: { state: SwimState; reasons: SwimReason[] };
  adviseDailyCheck: boolean;
};

/**
 * The swim verdict (care.md 2) at the moment of display: four states, the worst one wins (stay out, wait, test first,
 * fine), from plain data.
 *
 * Values between the hours of the projection lie on straight lines; beyond it nothing is assumed: no outlook means test
 * first. Waiting times include their first instant and exclude their last.
 *
 * Range: any input; a number that is not finite never reads as fine. Error: `invalid-input` when `now` is no instant.
 * Uncertainty: the band's edges are p10 and p90 of the projection.
 * Source: care.md 2; every limit with its own source in lib/standards/limits.ts.
 */
export function swimVerdict(input: SwimVerdictInput): SwimVerdict {
  if (!Number.isFinite(input.now)) throw new AppError('invalid-input', `${input.now} is not an instant.`);
  const reasons = reasonsAt(input, input.now);
  const state = worstState(reasons);
  const verdict: SwimVerdict = { state, reasons, adviseDailyCheck: state === 'fine' && wantsDailyCheck(input) };
  if (state !== 'fine' && state !== 'wait') return verdict;
  for (const { from, reasons: later } of stretchesAhead(input)) {
    const next = worstState(later);
    if (state === 'fine' ? next === 'fine' : next === 'wait' || next === 'stay-out') continue;
    // Where only the outlook ends, the water was not seen to get better.
    if (state === 'wait' && lacksOutlook(later) && !lacksOutlook(reasons)) return verdict;
    return {
      ...verdict,
      until: state === 'fine' ? Math.floor(from) : Math.ceil(from),
      then: { state: next, reasons: later.filter(({ code }) => swimReasons[code] === next) },
    };
  }
  return verdict;
}

function lacksOutlook(reasons: readonly SwimReason[]): boolean {
  return reasons.some(({ code }) => code === 'no-outlook');
}

function wantsDailyCheck({ now, swimDay, readings }: SwimVerdictInput): boolean {
  const oldest = Math.min(readings.freeChlorine?.takenAt ?? now, readings.pH?.takenAt ?? now);
  return swimDay && now - oldest >= limits.dailyCheckAdvice.value * HOUR;
}
