import type { Source } from './limits';

type Range = readonly [low: number, high: number];

const practice = (text: string): Source => ({ kind: 'practice', text });

/** Total alkalinity aimed at [mg/L as CaCO3]: tablets are acid and want more of it. */
export const alkalinityAim = {
  tablets: { value: [100, 120] as Range },
  fast: { value: [80, 100] as Range },
  source: { kind: 'code', text: 'ideal columns of Montana ARM 37.115.1308, Table 6' } satisfies Source,
} as const;

/** How far under its aim a quantity lies before something is added: a weekly test reads it no better [mg/L]. */
export const alkalinityDeadBand = {
  value: 25,
  source: practice('two steps of a drop kit of 10 mg/L, and what a week takes'),
} as const;

/** Hardness outside which the surface asks to act [mg/L as CaCO3]; no lower end where there is nothing to dissolve. */
export const hardnessAct = {
  plaster: [150, 450],
  tile: [150, 450],
  vinyl: [0, 400],
  fibreglass: [0, 350],
  painted: [120, 400],
  source: practice("the surface maker's paper comes first"),
} as const;

/** Soda ash clouds hard water, and overshoots where pH is not low [mg/L as CaCO3; pH]. */
export const sodaAshLimits = {
  hardness: 300,
  pH: 7.5,
  source: practice('calcium carbonate comes out of solution'),
} as const;

/** What one dose aims at: the middle of where pH is kept, the low end and a little of the stabilizer band. */
export const companionAim = {
  pH: 7.5,
  stabilizerAboveLow: 5,
  /** Acid lowers pH by so much at most. */
  largestFallOfPH: 0.4,
  source: practice('half way, then test again'),
} as const;

/** Hours after which a dose shows in a test [h]; nothing else is added before it. */
export const retestHours = {
  'hydrochloric-acid': 12,
  'sodium-bisulfate': 12,
  'sodium-bicarbonate': 24,
  'sodium-carbonate': 24,
  'calcium-chloride': 24,
  'cyanuric-acid': 168,
} as const;

/** From this stabilizer on some water is replaced [mg/L], by the swim limit of the label [mg/L]. */
export const replaceWaterFrom = [
  { swimLimit: 4, stabilizer: 70 },
  { swimLimit: 5, stabilizer: 80 },
  { swimLimit: 10, stabilizer: 90 },
] as const;

/** Water level that is let out and filled up again in one day [m]: more may lift a shell or a liner. */
export const waterExchangeADay = { value: 0.15, source: practice('the builder knows the ground water') } as const;
