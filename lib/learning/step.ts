import { WaterRangeError } from '@/lib/errors';
import { settingOf } from '@/lib/projection';
import { MILLISECONDS_PER_HOUR } from '@/lib/projection/forcing';
import type { CourseSetting } from '@/lib/projection/integrate';
import { middleOf } from '@/lib/projection/reading-error';
import {
  type FilterState,
  learnableParameters,
  type LearningNote,
  type PosteriorStep,
  uncertainQuantities,
} from '@/lib/schemas/posterior';
import type { Reading } from '@/lib/schemas/reading';
import { assimilate, takeAsRead } from './assimilate';
import { drift } from './drift';
import { feederAt, feederLoad, type FeederLoad, timerBetween } from './feeder';
import { untaught, waterAnew } from './fresh-start';
import { forcingBetween } from './gap';
import type { Dated, PoolHistory, TabletsLeft } from './history';
import { errorOf } from './measurement';
import { posteriorOf } from './posterior-of';
import { type Expected, propagate } from './propagate';
import { placeOf } from './state';
import { learnFromTabletsLeft } from './tablets-left';

const MILLISECONDS_PER_DAY = 24 * MILLISECONDS_PER_HOUR;
/** After so long without a test [days] the water is anybody's guess; only what the pool itself taught is kept. */
export const LONGEST_GAP = 21;
/** Tablets from so long before a reading [days] may still be in the feeder. */
export const TABLETS_LAST = 30;
/** A reading counts for a parameter when it takes away this share of its variance. */
const SHARE_THAT_COUNTS = 0.05;

/**
 * One reading's step: the feeder first, then the way through the gap, then the reading itself.
 *
 * @param before the state after the reading before it, or null; it is not changed
 * @param at     instant of the reading [ms]
 * @param found  tablets found in the feeder, in order of time
 * @param log    what is already known of the reading; the step writes on
 */
export function stepTo(
  before: FilterState | null,
  at: number,
  reading: Reading,
  history: PoolHistory,
  found: readonly Dated<TabletsLeft>[],
  log: LearningNote[],
): PosteriorStep {
  const known = before ? structuredClone(before) : untaught();
  const temperature = reading.temperature === undefined ? known.temperature : middleOf(reading.temperature);
  const setting = settingOf(history.pool, temperature);
  if (before) lookIntoFeeder(known, at, history, setting, found, log);
  const expected = before && expectedAt(known, at, temperature, history, setting, log);
  const state = expected?.state ?? startAnew(known, before, at, reading, history, log);
  state.temperature = temperature;
  if (reading.combinedChlorine !== undefined) state.combinedChlorine = middleOf(reading.combinedChlorine);
  const unusual = history.unusual?.some(({ from, until }) => at >= from && at <= until) ?? false;
  if (expected) weigh(expected, reading, log, unusual);
  if (before) countFor(state, before);
  return { readingAt: reading.takenAt, state, posterior: posteriorOf(state, reading, setting.parameters), log };
}

/** Takes every measured value into what is known. */
function weigh({ state, chlorineLoss }: Expected, reading: Reading, log: LearningNote[], unusual: boolean): void {
  for (const quantity of uncertainQuantities) {
    const value = reading[quantity];
    if (value === undefined) continue;
    const sigma = errorOf(quantity, value, reading.method, state.mean[placeOf[quantity]]!);
    if (unusual) takeAsRead(state, quantity, middleOf(value), sigma);
    else log.push(assimilate(state, quantity, middleOf(value), sigma, chlorineLoss));
    state.mean[placeOf.freeChlorine] = Math.max(0, state.mean[placeOf.freeChlorine]!);
  }
}

/** Counts the reading for each parameter that it made clearer. */
function countFor(state: FilterState, before: FilterState): void {
  for (const name of learnableParameters) {
    const place = placeOf[name];
    const left = state.covariance[place]![place]! / before.covariance[place]![place]!;
    if (left < 1 - SHARE_THAT_COUNTS) state.readingsThatCounted[name]++;
  }
}

/** What was found in the feeder since the last reading: it tells how long tablets last. */
function lookIntoFeeder(
  state: FilterState,
  to: number,
  { pool, doses }: PoolHistory,
  { parameters, floater }: CourseSetting,
  found: readonly Dated<TabletsLeft>[],
  log: LearningNote[],
): void {
  for (const { at, what } of found) {
    if (at < state.at || at >= to || at - state.at > LONGEST_GAP * MILLISECONDS_PER_DAY) continue;
    const loads = feederAt(state.loads, doses, timerBetween(pool, state.at, at), floater, state.at, at);
    log.push(learnFromTabletsLeft(state, loads, what.tablets, parameters.tabletLife));
  }
}

/** What the model expects at a reading; null where it can expect nothing. */
function expectedAt(
  state: FilterState,
  at: number,
  temperature: number,
  history: PoolHistory,
  setting: CourseSetting,
  log: LearningNote[],
): Expected | null {
  if (at === state.at) return { state, chlorineLoss: 0 };
  if (at - state.at > LONGEST_GAP * MILLISECONDS_PER_DAY) {
    log.push({ kind: 'fresh-start', reason: 'long-gap' });
    return null;
  }
  const forcing = forcingBetween(history, state.at, at, { first: state.temperature, last: temperature });
  try {
    return propagate(state, { forcing, doses: history.doses, setting, to: at });
  } catch (error) {
    if (!(error instanceof WaterRangeError || error instanceof RangeError)) throw error;
    log.push({ kind: 'fresh-start', reason: 'impossible-water' });
    return null;
  }
}

/** The water of a reading with nothing to expect of it; what the pool itself taught is kept, and drifts. */
function startAnew(
  known: FilterState,
  before: FilterState | null,
  at: number,
  reading: Reading,
  { pool, doses, loads: found }: PoolHistory,
  log: LearningNote[],
): FilterState {
  if (!before) log.push({ kind: 'fresh-start', reason: 'first-reading' });
  else drift(known, (at - before.at) / MILLISECONDS_PER_DAY);
  const since = at - TABLETS_LAST * MILLISECONDS_PER_DAY;
  const floater = pool.feeder.kind === 'floating';
  const older: FeederLoad[] = before ? [] : found.map((load) => feederLoad(load, 0));
  const recent = feederAt([], doses, timerBetween(pool, since, at), floater, since, at);
  return waterAnew(known, at, reading, [...older, ...recent]);
}
