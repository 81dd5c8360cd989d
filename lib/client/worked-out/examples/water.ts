import type { WaterAnalysis } from '@/lib/chemistry';

/** An ordinary pool where an example does not say otherwise. */
export const ordinaryWater: WaterAnalysis = {
  freeChlorine: 3,
  pH: 7.5,
  totalAlkalinity: 90,
  calciumHardness: 250,
  cyanuricAcid: 40,
  temperature: 27,
};
