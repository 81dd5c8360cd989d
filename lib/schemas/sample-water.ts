/** The pool that somebody tries the sheet on before they have one: size [m3], sunshine [h a day], stabilizer [mg/L]. */
export type SampleWater = { volume: number; sunshine: number; stabilizer: number };

/** What each may be, in which steps, and with what it begins. */
export const sampleWaters = {
  volume: { least: 20, most: 120, step: 5, start: 50 },
  sunshine: { least: 2, most: 14, step: 1, start: 11 },
  stabilizer: { least: 10, most: 100, step: 5, start: 40 },
} as const satisfies Record<keyof SampleWater, { least: number; most: number; step: number; start: number }>;

export const startingSample: SampleWater = {
  volume: sampleWaters.volume.start,
  sunshine: sampleWaters.sunshine.start,
  stabilizer: sampleWaters.stabilizer.start,
};

export function isSameWater(a: SampleWater, b: SampleWater): boolean {
  return a.volume === b.volume && a.sunshine === b.sunshine && a.stabilizer === b.stabilizer;
}

/** What goes in on an evening of the week: days from Monday, 0, to Sunday, 6; hours from Monday's midnight. */
export type SampleDose = {
  hour: number;
  form: 'tablet' | 'granular' | 'liquid' | 'other';
  unit: 'tablet' | 'g' | 'mL';
  amount: number;
  /** Free chlorine that it adds, tablets over the whole of their life [mg/L]. */
  rise: number;
};

/** The week that the engine planned for a sample water, as it is drawn: hours from Monday's midnight, levels in mg/L. */
export type SampleWeek = {
  water: SampleWater;
  tested: number;
  /** Free chlorine at every full hour from Monday's midnight to the end of the plan, its likely range, the lowest level. */
  course: { low: number[]; middle: number[]; high: number[]; lowest: number[] };
  swimLimit: number;
  swims: { from: number; to: number };
  sun: { rises: number; sets: number };
  /** How strong the sun is in each hour of a day, as a share of the reference sun. */
  sunByHour: number[];
  doses: SampleDose[];
  /** When the quick check of a swim day is due. */
  quickChecks: number[];
  /** How the week stands: planned, with few of its swim hours open, or with water to replace first [m3, mg/L]. */
  standing:
    | { code: 'planned' }
    | { code: 'few-open-hours'; share: number; visits: number }
    | { code: 'replace-water'; volume: number; days: number; target: number };
};
