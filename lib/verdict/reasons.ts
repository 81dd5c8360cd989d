import { limits } from '@/lib/standards/limits';
import { byWeight, type SwimReason, type SwimReasonCode } from './codes';
import type { MeasuredValue, SwimVerdictInput } from './input';
import { rainBy, swimmerHoursByDay } from './load';
import { HOUR, type Outlook, outlookAt } from './outlook';

/**
 * Everything that speaks against swimming at an instant (now or later), worst first. "Under" and "over" are strict: a value
 * exactly at a limit keeps it, a reading of exactly 48 hours is not yet older.
 */
export function reasonsAt(input: SwimVerdictInput, instant: number): SwimReason[] {
  const outlook = outlookAt(input, instant);
  return [
    ...openTroubles(input),
    ...waitingTimes(input, instant),
    ...chlorineReasons(input, instant, outlook),
    ...pHReasons(input, instant, outlook),
    ...combinedChlorineReasons(input),
    ...readingReasons(input, instant),
    ...eventReasons(input, instant),
    ...(outlook ? [] : [{ code: 'no-outlook' } as const]),
  ].sort(byWeight);
}

function openTroubles({ open }: SwimVerdictInput): SwimReason[] {
  return named([
    ['water-cloudy', open.cloudy],
    ['water-green', open.green],
    ['accident-open', open.accident],
    ['situation-open', open.situationOpen],
    ['drain-cover-broken', open.drainCoverBroken],
    ['electricity-suspected', open.electricitySuspected],
    ['suspected-double-dose', open.suspectedDoubleDose],
    ['false-zero-open', open.falseZero],
  ]);
}

function waitingTimes({ waits }: SwimVerdictInput, instant: number): SwimReason[] {
  const running = waits.filter(({ from, until }) => !(instant < from || instant >= until));
  if (running.length === 0) return [];
  return [{ code: 'dose-waiting-time', until: Math.max(...running.map(({ until }) => until)) }];
}

function chlorineReasons(input: SwimVerdictInput, instant: number, outlook: Outlook | undefined): SwimReason[] {
  const { codeMinimum, lowestLevel, swimLimit } = input.limits;
  const maximum = limits.freeChlorineMaximum.value;
  const reading = standing(usableChlorine(input), instant, outlook);
  const middles: Middle[] = [
    ...(reading ? [{ value: reading.value, lowestLevel, swimLimit, measured: true }] : []),
    ...(outlook ? [{ ...outlook, value: outlook.p50, measured: false }] : []),
  ];
  return [
    ...firstOutside('chlorine-under-code-minimum', middles, 'under', () => codeMinimum),
    ...firstOutside('chlorine-over-maximum', middles, 'over', () => maximum),
    ...firstOutside('chlorine-over-swim-limit', middles, 'over', (middle) => middle.swimLimit),
    ...firstOutside('chlorine-under-lowest-level', middles, 'under', (middle) => middle.lowestLevel),
    ...(outlook
      ? [
          ...firstOutside('low-edge-under-code-minimum', [projected(outlook.p10)], 'under', () => codeMinimum),
          ...firstOutside('high-edge-over-maximum', [projected(outlook.p90)], 'over', () => maximum),
        ]
      : []),
  ];
}

function pHReasons(input: SwimVerdictInput, instant: number, outlook: Outlook | undefined): SwimReason[] {
  const pH = usablePH(input);
  if (!pH) return [];
  const reading = standing(pH, instant, outlook);
  const middles = [
    ...(reading ? [{ value: reading.value, measured: true }] : []),
    ...(outlook ? [projected(outlook.pH)] : []),
  ];
  return [
    ...firstOutside('ph-too-low', middles, 'under', () => limits.pHLowest.value),
    ...firstOutside('ph-too-high', middles, 'over', () => limits.pHHighest.value),
    ...firstOutside('ph-below-range', middles, 'under', () => limits.pHRangeLow.value),
    ...firstOutside('ph-above-range', middles, 'over', () => limits.pHRangeHigh.value),
  ];
}

/** Stays until it is measured again: nothing in the outlook promises that it has gone. */
function combinedChlorineReasons({ readings }: SwimVerdictInput): SwimReason[] {
  const { combinedChlorine } = readings;
  if (!combinedChlorine) return [];
  const middle = { value: combinedChlorine.value, measured: true };
  return firstOutside('combined-chlorine-high', [middle], 'over', () => limits.combinedChlorineAct.value);
}

function readingReasons(input: SwimVerdictInput, instant: number): SwimReason[] {
  const limit = limits.verdictReadingAge.value;
  const judge = (reading: MeasuredValue | undefined, unknown: SwimReasonCode, old: SwimReasonCode): SwimReason[] => {
    if (!reading) return [{ code: unknown }];
    const age = (instant - reading.takenAt) / HOUR;
    return age > limit ? [{ code: old, value: age, limit }] : [];
  };
  return [
    ...judge(usableChlorine(input), 'chlorine-not-known', 'chlorine-reading-old'),
    ...judge(usablePH(input), 'ph-not-known', 'ph-reading-old'),
  ];
}

function eventReasons(input: SwimVerdictInput, instant: number): SwimReason[] {
  const { storm, pumpFailure, dueDoseOpen, doubtfulTick, coverOffAfterAWeek, situationEndedEarly } = input.sinceReading;
  const rain = { value: rainBy(input, instant), limit: limits.rainEndsVerdict.value };
  const swimmers = { value: Math.max(...swimmerHoursByDay(input, instant)), limit: swimmerHoursLimit(input) };
  return [
    // Turned round, so that a number that is none counts as too much.
    ...(rain.value <= rain.limit ? [] : [{ code: 'much-rain', ...rain } as const]),
    ...(swimmers.value <= swimmers.limit ? [] : [{ code: 'many-swimmers', ...swimmers } as const]),
    ...named([
      ['storm', storm],
      ['pump-failure', pumpFailure],
      ['due-dose-open', dueDoseOpen],
      ['doubtful-tick', doubtfulTick],
      ['cover-off-after-a-week', coverOffAfterAWeek],
      ['situation-ended-early', situationEndedEarly],
    ]),
  ];
}

/** Swimmer-hours in a day above which the verdict ends: one for every 4 m3. */
export function swimmerHoursLimit({ volume }: SwimVerdictInput): number {
  return volume / limits.waterPerSwimmerHour.value;
}

/** A reading of the future is a wrong clock; more than an hour of it is no ground for a verdict. */
function usableChlorine({ readings, now }: SwimVerdictInput): MeasuredValue | undefined {
  const { freeChlorine } = readings;
  return freeChlorine && isSound(freeChlorine, now) ? freeChlorine : undefined;
}

/** Chlorine over 10 mg/L bleaches the colour of the pH test: a pH read together with it is ignored (care.md 2). */
function usablePH(input: SwimVerdictInput): MeasuredValue | undefined {
  const { pH } = input.readings;
  if (!pH || !isSound(pH, input.now)) return undefined;
  const chlorine = usableChlorine(input);
  const bleached = chlorine?.takenAt === pH.takenAt && chlorine.value > limits.freeChlorineMaximum.value;
  return bleached ? undefined : pH;
}

function isSound({ value, takenAt }: MeasuredValue, now: number): boolean {
  return Number.isFinite(value) && takenAt <= now + HOUR;
}

/**
 * A reading that speaks for itself: within the first hour beside the outlook, so that the line after saving a test agrees
 * with the number just entered; without an outlook as long as a reading counts at all.
 */
function standing(
  reading: MeasuredValue | undefined,
  instant: number,
  outlook: Outlook | undefined,
): MeasuredValue | undefined {
  const longest = outlook ? STANDS_BESIDE_OUTLOOK : limits.verdictReadingAge.value * HOUR;
  return reading && instant - reading.takenAt <= longest ? reading : undefined;
}

/** One step of the projection [ms]. */
export const STANDS_BESIDE_OUTLOOK = HOUR;

type Middle = { value: number; measured: boolean; lowestLevel: number; swimLimit: number };

function projected(value: number) {
  return { value, measured: false };
}

function firstOutside<M extends { value: number; measured: boolean }>(
  code: SwimReasonCode,
  middles: readonly M[],
  side: 'under' | 'over',
  limitOf: (middle: M) => number,
): SwimReason[] {
  const outside = middles.find((middle) =>
    side === 'under' ? !(middle.value >= limitOf(middle)) : !(middle.value <= limitOf(middle)),
  );
  return outside ? [{ code, value: outside.value, limit: limitOf(outside), measured: outside.measured }] : [];
}

function named(facts: readonly (readonly [SwimReasonCode, boolean])[]): SwimReason[] {
  return facts.filter(([, holds]) => holds).map(([code]) => ({ code }));
}
