/** From worst to best. */
export const swimStates = ['stay-out', 'wait', 'test-first', 'fine'] as const;
export type SwimState = (typeof swimStates)[number];

/**
 * Every reason a verdict can have and the state it asks for: care.md 2, row by row. Words stand in the messages. The first
 * of those that hold is the headline: a drain cover leads, because it alone asks for an act this minute.
 */
export const swimReasons = {
  'drain-cover-broken': 'stay-out',
  'electricity-suspected': 'stay-out',
  'chlorine-under-code-minimum': 'stay-out',
  'chlorine-over-maximum': 'stay-out',
  'ph-too-low': 'stay-out',
  'ph-too-high': 'stay-out',
  'water-cloudy': 'stay-out',
  'water-green': 'stay-out',
  'accident-open': 'stay-out',
  'situation-open': 'stay-out',
  'suspected-double-dose': 'stay-out',
  'dose-waiting-time': 'wait',
  'chlorine-over-swim-limit': 'wait',
  'chlorine-under-lowest-level': 'wait',
  'ph-below-range': 'wait',
  'ph-above-range': 'wait',
  'combined-chlorine-high': 'wait',
  'chlorine-not-known': 'test-first',
  'ph-not-known': 'test-first',
  'chlorine-reading-old': 'test-first',
  'ph-reading-old': 'test-first',
  'low-edge-under-code-minimum': 'test-first',
  'high-edge-over-maximum': 'test-first',
  'false-zero-open': 'test-first',
  'much-rain': 'test-first',
  storm: 'test-first',
  'many-swimmers': 'test-first',
  'pump-failure': 'test-first',
  'due-dose-open': 'test-first',
  'doubtful-tick': 'test-first',
  'cover-off-after-a-week': 'test-first',
  'situation-ended-early': 'test-first',
  'no-outlook': 'test-first',
} as const satisfies Record<string, Exclude<SwimState, 'fine'>>;

export type SwimReasonCode = keyof typeof swimReasons;

/**
 * One reason with the numbers its sentence needs. `value` and `limit` share a unit: mg/L for chlorine, pH, hours for the
 * age of a reading, mm for rain, swimmer-hours in a day for swimmers. `measured`: the value was read, not projected.
 * `until`: end of a waiting time [ms].
 */
export type SwimReason = {
  code: SwimReasonCode;
  value?: number;
  limit?: number;
  measured?: boolean;
  until?: number;
};

const codeOrder = Object.keys(swimReasons);

/** The worst state first, within it in the order of the list. */
export function byWeight(a: SwimReason, b: SwimReason): number {
  return codeOrder.indexOf(a.code) - codeOrder.indexOf(b.code);
}

export function worstState(reasons: readonly SwimReason[]): SwimState {
  return swimStates.find((state) => reasons.some(({ code }) => swimReasons[code] === state)) ?? 'fine';
}
