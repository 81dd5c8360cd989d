import { parametersOf, priorSigma } from '@/lib/projection/parameters';
import type { Pool } from '@/lib/schemas/pool';
import { type LearnableParameter, learnableParameters, type Posterior } from '@/lib/schemas/posterior';
import { QUANTILE_90 } from './assimilate';
import { dailyLoss, type LikelyRange } from './daily-loss';

/** A parameter counts as clear when its range is this share of the prior's or less. */
const CLEAR = 0.75;

/** How people say each parameter: unit, and what one unit of the engine is in it. */
const inWords = {
  /** Of the chlorine held by stabilizer, in an hour of the reference sun. */
  boundPhotolysis: { unit: 'percent-per-hour', factor: 100 },
  /** Of what place, shade and sky let expect. */
  sunStrength: { unit: 'percent', factor: 100 },
  darkDemand: { unit: 'percent-per-day', factor: 100 * 24 },
  chlorinePerSwimmerHour: { unit: 'g', factor: 1 },
  tabletLife: { unit: 'running-hours', factor: 1 },
  waterPerSwimmerHour: { unit: 'L', factor: 1 },
  carbonDioxideTransfer: { unit: 'cm-per-hour', factor: 100 },
  volume: { unit: 'm3', factor: 1 },
} as const satisfies Record<LearnableParameter, { unit: string; factor: number }>;

export type LearntUnit = (typeof inWords)[LearnableParameter]['unit'];

/** One bar beside another: what pools like this one are like, and what this one has taught. */
export type LearntParameter = {
  parameter: LearnableParameter;
  unit: LearntUnit;
  prior: LikelyRange;
  learnt: LikelyRange;
  /** How many readings made it clearer. */
  readingsThatCounted: number;
  clear: boolean;
};

export type LearntDescription = {
  parameters: LearntParameter[];
  /** Free chlorine gone of 3 mg/L in a day of the season [mg/L], see `dailyLoss`. */
  dailyLoss: { prior: LikelyRange; learnt: LikelyRange };
  /** The learnt volume lies further from the entered one than it may be used. */
  measureVolumeAgain: boolean;
};

/**
 * What a pool has taught, for people: prior beside posterior in units of the trade, 10th, 50th and 90th percentile.
 *
 * @param pool the same as in the history; volume in m3
 */
export function describeLearnt(posterior: Posterior, pool: Pool): LearntDescription {
  const usual = parametersOf(pool);
  const parameters = learnableParameters.map((parameter): LearntParameter => {
    const { unit, factor } = inWords[parameter];
    const sigma = posterior.sigmas[parameter];
    return {
      parameter,
      unit,
      prior: logNormalRange(usual[parameter] * factor, priorSigma[parameter]),
      learnt: logNormalRange(posterior.medians[parameter] * factor, sigma),
      readingsThatCounted: posterior.readingsThatCounted[parameter],
      clear: sigma <= CLEAR * priorSigma[parameter],
    };
  });
  return { parameters, dailyLoss: dailyLoss(posterior, pool), measureVolumeAgain: posterior.volumeBeyondReach };
}

function logNormalRange(median: number, sigma: number): LikelyRange {
  const factor = Math.exp(QUANTILE_90 * sigma);
  return { p10: median / factor, p50: median, p90: median * factor };
}
