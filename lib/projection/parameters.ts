import type { LearnableParameter } from '@/lib/schemas/posterior';
import type { ParameterOverrides } from '@/lib/schemas/scenario';

/** What a week depends on beside the entered facts; rates per hour. */
export type Parameters = {
  /** Loss of cyanurate-bound chlorine under the reference sun, k_B [1/h]. */
  boundPhotolysis: number;
  /** Strength of the sun over this pool, lambda_sun [1]. */
  sunStrength: number;
  /** Dark demand at 27 degrees C, k_D [1/h]. */
  darkDemand: number;
  /** Chlorine used by one swimmer in an hour [g]. */
  chlorinePerSwimmerHour: number;
  /** Running hours that a tablet of 200 to 230 g lasts [h]. */
  tabletLife: number;
  /** Pool water carried out by one swimmer in an hour [L]. */
  waterPerSwimmerHour: number;
  /** Leak [m3/day]. */
  leak: number;
  /** Speed at which CO2 leaves through the surface [m/h]. */
  carbonDioxideTransfer: number;
  /** Volume of the water [m3]. */
  volume: number;
};

/**
 * Sigma of the natural logarithm of each parameter's log-normal prior. A leak has no prior: it is 0 until somebody finds
 * one.
 */
export const priorSigma = {
  boundPhotolysis: 0.5,
  sunStrength: 0.25,
  darkDemand: 0.5,
  chlorinePerSwimmerHour: 0.4,
  tabletLife: 0.35,
  waterPerSwimmerHour: 0.5,
  carbonDioxideTransfer: 0.5,
  volume: 0.1,
} as const satisfies Record<LearnableParameter, number>;

export type { LearnableParameter };

/**
 * The median parameters of a pool, with what is known better put in their place.
 *
 * Defaults: k_B fitted to practice; swimmers from published medians of 4 to 5.5 g a visit (Bradford 2014, Int. J. Aquat.
 * Res. Educ. 8:168; Berg, Fang and Tang 2019, J. Water Health 17:227) at less than two hours a visit; the others practice.
 */
export function parametersOf(
  pool: { volume: number; waterFeatures: boolean },
  overrides: ParameterOverrides = {},
): Parameters {
  return {
    boundPhotolysis: overrides.boundPhotolysis ?? 0.006,
    sunStrength: overrides.sunStrength ?? 1,
    darkDemand: overrides.darkDemand ?? 0.1 / 24,
    chlorinePerSwimmerHour: overrides.chlorinePerSwimmerHour ?? 2.5,
    tabletLife: overrides.tabletLife ?? 48,
    waterPerSwimmerHour: overrides.waterPerSwimmerHour ?? 8,
    leak: overrides.leak ?? 0,
    carbonDioxideTransfer: overrides.carbonDioxideTransfer ?? (pool.waterFeatures ? 0.025 : 0.009),
    volume: overrides.volume ?? pool.volume,
  };
}
