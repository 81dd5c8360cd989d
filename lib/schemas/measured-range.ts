/** What the water model permits for each measured quantity [mg/L, pH, degrees C], as engine and forms both check it. */
export const measuredRange = {
  freeChlorine: [0, 200],
  combinedChlorine: [0, 50],
  pH: [5, 10.5],
  totalAlkalinity: [0, 1000],
  calciumHardness: [0, 2000],
  cyanuricAcid: [0, 500],
  temperature: [-2, 60],
} as const satisfies Record<string, readonly [low: number, high: number]>;

export type MeasuredQuantity = keyof typeof measuredRange;
export const measuredQuantities = Object.keys(measuredRange) as MeasuredQuantity[];
