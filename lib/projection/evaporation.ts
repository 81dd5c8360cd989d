import { WaterRangeError } from '@/lib/errors';
import type { Pool } from '@/lib/schemas/pool';
import { coverPasses } from './forcing';

/** The air over a pool, as the season's defaults know it. */
export type EvaporationInputs = {
  /** degrees C, -2 to 60. */
  waterTemperature: number;
  /** degrees C, -40 to 60. */
  airTemperature: number;
  /** Share of saturation, 0 to 1. */
  relativeHumidity: number;
  /** Over the water [m/s], 0 to 20. What a weather service gives for 10 m in the open is two to three times that of a garden. */
  windSpeed: number;
  /** The cover that lies all day; none when left out. */
  cover?: Pool['cover'];
};

const permitted = {
  waterTemperature: [-2, 60],
  airTemperature: [-40, 60],
  relativeHumidity: [0, 1],
  windSpeed: [0, 20],
} as const;

/** 95 Btu/(h ft2 inHg), and 0.425 more for each ft/min of wind, in kW/(m2 kPa) and kW/(m2 kPa) for each m/s. */
export const STILL_AIR = 0.0885;
export const PER_WIND = 0.0779;
/** A pool that nobody stirs gives off less than the equation for open vessels. */
export const QUIET_POOL = 0.74;
const SECONDS_PER_DAY = 86_400;

/**
 * Water that evaporates from a pool nobody swims in [mm/day].
 *
 *     W = 0.74 (0.0885 + 0.0779 v) (p_w - p_a) / Y
 *
 * in kg/(m2 s), 1 kg/m2 being 1 mm: p_w is the saturation pressure at the water's temperature and p_a the vapour pressure
 * of the air [kPa], v the wind [m/s], Y the latent heat [kJ/kg]. Swimmers add 40 to 70 % while they are in it. Where air is
 * moister than the water's surface nothing evaporates, and dew counts as nothing. A cover that lies all day leaves its share
 * (0.1 floating, 0.05 opaque).
 *
 * Range: measured from 20 to 30 degrees C at winds up to 2 m/s; extrapolated beyond. Errors: WaterRangeError outside the
 * permitted ranges. Uncertainty: about 10 % where all four inputs are known; published daily figures for pools span a
 * factor of three.
 * Source: Smith, Lof & Jones 1998, ASHRAE Transactions 104(1A), their factor of 0.74 on the equation of Carrier 1918.
 */
export function evaporationRate({ cover = 'none', ...air }: EvaporationInputs): number {
  for (const [field, [low, high]] of Object.entries(permitted)) {
    const value = air[field as keyof typeof permitted];
    if (!(value >= low && value <= high)) throw new WaterRangeError(field, value, low, high);
  }
  const { waterTemperature, airTemperature, relativeHumidity, windSpeed } = air;
  const deficit = saturationPressure(waterTemperature) - relativeHumidity * saturationPressure(airTemperature);
  const fromOpenVessel = openVesselRate(deficit, windSpeed, latentHeat(waterTemperature));
  return Math.max(0, QUIET_POOL * fromOpenVessel * SECONDS_PER_DAY * coverPasses[cover].evaporation);
}

/**
 * What evaporates from an open vessel [kg/(m2 s)] by the equation of Carrier 1918.
 *
 * @param deficit   vapour pressure at the water less that of the air [kPa]
 * @param windSpeed m/s
 * @param heat      latent heat of the water [kJ/kg]
 */
export function openVesselRate(deficit: number, windSpeed: number, heat: number): number {
  return ((STILL_AIR + PER_WIND * windSpeed) * deficit) / heat;
}

/**
 * Saturation pressure of water vapour [kPa]: 0.61094 exp(17.625 t / (t + 243.04)), within 0.4 % from -40 to 50 degrees C.
 * Source: Alduchov & Eskridge 1996, J. Appl. Meteorol. 35:601.
 */
export function saturationPressure(celsius: number): number {
  return 0.61094 * Math.exp((17.625 * celsius) / (celsius + 243.04));
}

/** Latent heat of evaporation [kJ/kg]: 2501 - 2.361 t, 0 to 60 degrees C. Source: FAO Irrigation and Drainage Paper 56, equation 3-1. */
export function latentHeat(celsius: number): number {
  return 2501 - 2.361 * celsius;
}
