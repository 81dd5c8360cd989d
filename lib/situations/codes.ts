import type { SituationKind } from '@/lib/schemas/situation';

/** Every code a procedure can carry; the words for each stand in lib/messages. */

/** Which way the answers and the water lead, and what that means for the plan. */
export const branches = {
  accident: [
    /** Formed stool, vomit, a dead animal in water without stabilizer that is warm and not over pH 7.5. */
    'published-time',
    /** The same where no published time applies: chlorine to the swim limit, out until the next day. */
    'next-day',
    'health-department',
    'no-extra-step',
  ],
  clearing: ['treatment-evenings', 'pH-first', 'water-first', 'wait-a-day', 'professional', 'settling'],
  'combined-chlorine': ['treatment-evenings', 'never-measured', 'not-high', 'professional'],
  'drain-cover': ['pump-off'],
  'quick-raise': ['one-evening', 'high-enough'],
  storm: ['look-round', 'electrician-first'],
  cover: ['air-first', 'air-and-test'],
  stain: ['professional'],
  away: ['alone', 'with-adult', 'closed'],
  'stabilizer-high': ['replace-water', 'ask-before-lowering', 'never-measured', 'not-high'],
  'hardness-high': ['replace-water', 'ask-before-lowering', 'never-measured', 'not-high', 'fill-water-hard'],
  opening: ['list'],
  closing: ['list'],
} as const satisfies Record<SituationKind, readonly string[]>;

export const headlines = [
  /** Stay out. */
  'out-accident',
  'out-health-department',
  'out-clearing',
  'out-one-good-morning',
  'out-settling',
  'out-drain-cover',
  /** What is next. */
  'dose-tonight',
  'dose-on',
  'test-next',
  'steps-next',
  'wait-a-day',
  'replace-water',
  'ask-professional',
  'nothing-to-do',
  'done',
] as const;
export type Headline = (typeof headlines)[number];

/** Cautions by how much harm they keep away. */
const cautionsBySeverity = {
  stop: [
    'everyone-out',
    'nobody-in-cloudy',
    'no-time-for-loose-stool',
    'drain-holds',
    'thunder',
    'shock',
    'wet-pump-room',
    'shell-can-float',
    'half-open-cover',
    'never-mix',
  ],
  care: [
    'gloves-and-net',
    'liquid-low',
    'granules-into-water',
    'acid-alone',
    'no-metal-ladder',
    'pump-before-skimmer',
    'outlet',
    'no-floater-under-cover',
    'metals',
    'nobody-ill-swims',
  ],
  note: ['nothing-of-ours', 'bottle-and-gate'],
} as const;
export type Severity = keyof typeof cautionsBySeverity;
export type Caution = (typeof cautionsBySeverity)[Severity][number];
export const cautions: readonly Caution[] = Object.values(cautionsBySeverity).flat();

export function severityOf(caution: Caution): Severity {
  const has = (list: readonly string[]) => list.includes(caution);
  return has(cautionsBySeverity.stop) ? 'stop' : has(cautionsBySeverity.care) ? 'care' : 'note';
}

/** What a step asks for; figures stand beside. */
export const steps = [
  /** Tests: they tick themselves when a reading is entered. */
  'test-now',
  'test-before-dose',
  'morning-reading',
  /** Tick by hand beside it: the bottom drain was plainly seen. */
  'drain-seen',
  'test-next-day',
  'test-after-time',
  'test-combined',
  'test-stabilizer',
  'test-hardness',
  'test-full',
  'test-on-return',
  'test-before-swim',
  /** A dose of the plan. */
  'dose',
  /** By hand. */
  'everyone-out',
  'lift-out',
  'net-in-water',
  'double-bag',
  'call-health-department',
  'health-department-done',
  'filter-running',
  'leaves-and-brush',
  'brush-again',
  'pump-day-and-night',
  'clean-filter',
  'open-cover-and-sun',
  'pump-off',
  'cover-replaced',
  'keep-out-sign',
  'thunder-over',
  'electrician',
  'earth-leakage-test',
  'skim',
  'level',
  'baskets',
  'air-cover',
  'floater-out',
  'ask-professional',
  'metal-test',
  'professional-done',
  'replace-water',
  'ask-before-lowering',
  'fill-elsewhere',
  /** Going away. */
  'dose-before-leaving',
  'level-and-baskets',
  'timer',
  'house-sheet',
  'adult-tests-weekly',
  'gate-locked',
  'cover-on',
  /** Opening and closing. */
  'drain-cover-looked-at',
  'electrician-tested',
  'ladder',
  'gate',
  'kit-dates',
  'old-products',
  'cover-off-clean',
  'level-up',
  'filter-and-pump',
  'drips',
  'leaves-out',
  'bottom-seen',
  'skim-and-brush',
  'balance-before-closing',
  'filter-rested',
  'pump-by-its-paper',
  'feeder-empty',
  'floater-away',
  'level-for-cover',
  'breaker-off',
  'liquid-used-up',
  'products-dry',
] as const;
export type StepCode = (typeof steps)[number];

export const reasons = [
  'stabilizer-under',
  'stabilizer-over',
  'stabilized',
  'not-stabilized',
  'stabilizer-unknown',
  'pH-first',
  'pH-unknown',
  'chlorine-enough',
  'combined',
  'evening-of',
  'evenings-used-up',
  'cold-or-high-pH',
  'water-to-replace',
  'water-in-rounds',
  'fill-water-hard',
  'days-away',
] as const;
export type Reason = (typeof reasons)[number];

/** When a procedure ends, one rule for each way. */
export const endings = [
  'thirty-minutes-and-test',
  'next-day-and-test',
  'health-department-and-test',
  'test-in-range',
  'two-mornings-and-two-tests',
  'clear-after-a-day',
  'professional-and-test',
  'combined-low',
  'cover-replaced',
  'test-after-dose',
  'ticks-and-test',
  'stabilizer-low',
  'hardness-low',
  'back-and-tested',
] as const;
export type Ending = (typeof endings)[number];

export const calls = [
  'health-department',
  'doctor-first',
  'four-evenings',
  'three-evenings',
  'spots-or-slime',
  'filter-climbs',
  'drain-cover',
  'electrician',
  'tingle',
  'ground-water',
  'level-falls',
  'fill-water',
  'metals',
  'winter-lines',
  'still-low-next-day',
] as const;
export type Call = (typeof calls)[number];
