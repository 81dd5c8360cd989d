/** Every code a plan can carry; the words for each stand in lib/messages. */
export const companionReasons = [
  'raises-alkalinity',
  'lowers-pH',
  'raises-pH',
  'raises-hardness',
  'raises-stabilizer',
] as const;
export type CompanionReason = (typeof companionReasons)[number];

export function isCompanionReason(reason: string): reason is CompanionReason {
  return companionReasons.some((each) => each === reason);
}

export const doseReasons = [
  'slow-supply',
  'closes-gap',
  'quick-raise',
  'first-dose-halved',
  /** Asked for by an open situation. */
  'treatment-evening',
  'raise-to-limit',
  'pH-before-treatment',
  /** Stands as the household wished it. */
  'wished',
  ...companionReasons,
] as const;
export type DoseReason = (typeof doseReasons)[number];

export const checkReasons = [
  'swim-day-after-two-days',
  'band-reaches-code-minimum',
  'after-halved-dose',
  'after-large-dose',
  'after-companion',
  'mid-week-pays',
  'after-treatment',
  'next-week',
] as const;
export type CheckReason = (typeof checkReasons)[number];

export const limitCodes = [
  'code-minimum',
  'lowest-level',
  'swim-limit',
  'free-chlorine-maximum',
  'pH-low',
  'pH-high',
  'stabilizer-too-high-for-swim-limit',
] as const;
export type LimitCode = (typeof limitCodes)[number];

export const reasonCodes = [
  /** First sentences when the week cannot be kept in range. */
  'replace-water-first',
  'few-open-hours',
  /** The household changed this plan. */
  'wished',
  /** An open situation leads: its doses take the place of the week's, or nothing is dosed. */
  'situation-treats',
  'situation-holds',
  /** Why tablets, how many, or why none. */
  'tablets-carry',
  'no-tablets-stabilizer-high',
  'no-tablets-stabilizer-unknown',
  'no-tablets-strip-alone',
  'no-tablets-label-unknown',
  'no-tablets-pH-low',
  'no-tablets-feeder',
  'no-tablets-on-shelf',
  'no-tablets-avoided',
  'no-tablets-pool-small',
  'no-tablets-week-full',
  'no-tablets-feeder-full',
  'no-tablets-better-without',
  /** Why this fast product, or why none. */
  'fast-closes-gap',
  'nothing-fast-needed',
  'no-fast-on-shelf',
  /** What was compared. */
  'cheaper-than',
  'lowest-level-follows-stabilizer',
  /** What goes in beside chlorine. */
  ...companionReasons,
  /** What was never measured, and the value taken in its place. */
  'water-values-assumed',
] as const;
export type ReasonCode = (typeof reasonCodes)[number];

export const cautionCodes = [
  'pH-out-of-range',
  'combined-chlorine-high',
  'label-way-unknown',
  'liquid-past-half-strength',
  'liquid-age-unknown',
  'feeder-ingredient-other',
  'granules-not-for-surface',
  'stock-short',
  'dose-after-dark',
  /** What the household changed no longer keeps to the limits: the plan is made without it. */
  'wishes-set-aside',
  'volume-estimated',
  'free-chlorine-over-swim-limit',
  /** Something is needed beside chlorine and has to wait: for a test, or for an evening that chlorine can spare. */
  'companion-waits',
  'hardness-outside-surface-range',
] as const;
export type CautionCode = (typeof cautionCodes)[number];

export const needCodes = ['reading-too-old', 'never-measured', 'measured-long-ago'] as const;
export type NeedCode = (typeof needCodes)[number];
