import { z } from 'zod';
import { daysBetween } from '@/lib/calendar/household-day';
import { handling } from '@/lib/standards/handling';
import { calendarDaySchema, instantSchema } from './time';

/** Guided procedures of the care rules, part 7: for when the week sheet alone is not enough. */
export const situationKinds = [
  'accident',
  'clearing',
  'combined-chlorine',
  'drain-cover',
  'quick-raise',
  'storm',
  'cover',
  'stain',
  'away',
  'stabilizer-high',
  'hardness-high',
  'opening',
  'closing',
] as const;
export type SituationKind = (typeof situationKinds)[number];

export const situationKindSchema = z.enum(situationKinds);

const yesOrNo = z.enum(['no', 'yes']);
const mayBeSo = z.enum(['no', 'yes', 'unsure']);

/** What each procedure has to be told; everything else it knows from the readings and the profile. */
export const situationAnswers = {
  accident: z.discriminatedUnion('what', [
    z.strictObject({ what: z.literal('formed-stool') }),
    z.strictObject({ what: z.literal('loose-stool') }),
    z.strictObject({ what: z.literal('vomit'), moreThanSwallowedWater: yesOrNo }),
    z.strictObject({ what: z.literal('blood') }),
    z.strictObject({ what: z.literal('dead-animal'), animal: z.enum(['raccoon-calf-lamb', 'other']) }),
  ]),
  clearing: z.strictObject({
    drain: z.enum(['plainly', 'hazy', 'not-at-all']),
    look: z.enum(['milky', 'green', 'spots-or-stain']),
    /** Granules, soda or calcium in the last day. */
    addedInLastDay: yesOrNo,
  }),
  'combined-chlorine': z.strictObject({}),
  'drain-cover': z.strictObject({}),
  'quick-raise': z.strictObject({}),
  storm: z.strictObject({ pumpRoom: z.enum(['dry', 'wet']), shock: yesOrNo }),
  cover: z.strictObject({ covered: z.enum(['days', 'week-or-more']), floaterUnder: yesOrNo }),
  stain: z.strictObject({}),
  away: z
    .strictObject({
      leavesOn: calendarDaySchema,
      backOn: calendarDaySchema,
      /** Nobody for up to seven days; longer needs a named adult with a weekly test, or a closed pool. */
      care: z.enum(['nobody', 'adult', 'closed']),
      name: z.string().trim().max(80, 'Keep the name under 80 characters.').optional(),
    })
    .superRefine(({ leavesOn, backOn, care, name }, context) => {
      const problem = (path: string, message: string) => context.addIssue({ code: 'custom', path: [path], message });
      if (backOn < leavesOn) problem('backOn', 'You come back after you leave. Check the days.');
      if (care === 'nobody' && daysBetween(leavesOn, backOn) > handling.longestAlone.value)
        problem('care', 'Longer than seven days needs a named adult with a weekly test, or a closed pool.');
      if (care === 'adult' && !name) problem('name', 'Write who looks after the pool.');
    }),
  'stabilizer-high': z.strictObject({ ground: mayBeSo }),
  'hardness-high': z.strictObject({ ground: mayBeSo }),
  opening: z.strictObject({ startsOn: calendarDaySchema }),
  closing: z.strictObject({ startsOn: calendarDaySchema }),
} as const satisfies Record<SituationKind, z.ZodType>;

function withAnswers<Kind extends SituationKind>(kind: Kind) {
  return z.strictObject({ kind: z.literal(kind), answers: situationAnswers[kind] });
}

/** What a procedure was told, by its kind. */
export const situationSchema = z.discriminatedUnion('kind', [
  withAnswers('accident'),
  withAnswers('clearing'),
  withAnswers('combined-chlorine'),
  withAnswers('drain-cover'),
  withAnswers('quick-raise'),
  withAnswers('storm'),
  withAnswers('cover'),
  withAnswers('stain'),
  withAnswers('away'),
  withAnswers('stabilizer-high'),
  withAnswers('hardness-high'),
  withAnswers('opening'),
  withAnswers('closing'),
]);
export type Situation = z.output<typeof situationSchema>;
export type AnswersOf<Kind extends SituationKind> = z.output<(typeof situationAnswers)[Kind]>;

/** A procedure that somebody begins; the id is made on the device, so that a resend is harmless. */
export const newSituationSchema = z.strictObject({
  id: z.uuid(),
  situation: situationSchema,
  /** The open one that this one takes the place of: an accident does not wait until the pool has been opened. */
  setAside: z.uuid().optional(),
});
export type NewSituation = z.output<typeof newSituationSchema>;

/** The same procedure with other answers. */
export const answerSituationSchema = z.strictObject({ situation: situationSchema });

/** A step that was done, or was not after all. */
export const situationTickSchema = z.strictObject({ step: z.string().min(1).max(64), done: z.boolean() });

/**
 * Why a procedure is over: its rule is met, it was begun by mistake, a licensed person has taken over, or a more urgent one
 * took its place.
 */
export const situationEndings = ['done', 'mistake', 'professional', 'set-aside'] as const;
export type SituationEnding = (typeof situationEndings)[number];
export const endSituationSchema = z.strictObject({ ending: z.enum(['done', 'mistake', 'professional']) });

/** One thing to do, on its day. A dose is ticked on the week sheet; `dose` names it. */
export const situationStepSchema = z.object({
  /** Stable over the life of a procedure: what a tick is kept under. */
  id: z.string(),
  at: instantSchema,
  /** A tick by hand, a test that ticks itself, a dose of the plan. */
  kind: z.enum(['tick', 'test', 'dose']),
  /** Words: situations.step.<code>. */
  code: z.string(),
  /** Numbers of the words: cubic metres, centimetres, mg/L, days. */
  figures: z.record(z.string(), z.union([z.number(), z.string()])),
  doseId: z.string().nullable(),
  doneAt: instantSchema.nullable(),
  doneBy: z.string().nullable(),
});
export type SituationStep = z.infer<typeof situationStepSchema>;

/** The morning after a treatment evening, against what a clear pool would have kept overnight. */
export const morningSchema = z.object({
  day: calendarDaySchema,
  takenAt: instantSchema.nullable(),
  /** Free chlorine [mg/L]: read, and the ordinary band at that hour. */
  freeChlorine: z.number().nullable(),
  low: z.number().nullable(),
  high: z.number().nullable(),
  inside: z.boolean().nullable(),
  drainSeen: z.boolean().nullable(),
  /** How many good mornings in a row this one makes; 0 when it is none. */
  inARow: z.number().int(),
});
export type Morning = z.infer<typeof morningSchema>;

export const situationFactSchema = z.looseObject({ code: z.string() });

/** What an open procedure asks for at one moment. */
export const procedureSchema = z.object({
  /** Which way through the procedure the answers and the water lead. Words: situations.branch.<branch>. */
  branch: z.string(),
  /** Whether its own doses take the place of the plan's, nothing is dosed, or the plan goes on. */
  lead: z.enum(['treat', 'hold', 'follow']),
  /** Whether everybody stays out whatever the readings say. */
  stayOut: z.boolean(),
  /** Words: situations.headline.<code>. */
  headline: situationFactSchema,
  /** Cautions in the order in which they protect. Words: situations.caution.<code>. */
  cautions: z.array(z.object({ code: z.string(), severity: z.enum(['stop', 'care', 'note']) })),
  /** Why this way, with numbers. Words: situations.reason.<code>. */
  reasons: z.array(situationFactSchema),
  steps: z.array(situationStepSchema),
  mornings: z.array(morningSchema),
  /** Words: situations.done.<code>; and whether that is so now. */
  doneWhen: z.string(),
  done: z.boolean(),
  /** Words: situations.call.<code>; and whether it is time now. */
  callWhen: z.array(z.string()),
  callNow: z.boolean(),
  nextTestAt: instantSchema.nullable(),
});
export type Procedure = z.infer<typeof procedureSchema>;

export const openSituationSchema = z.object({
  id: z.uuid(),
  situation: situationSchema,
  openedAt: instantSchema,
  openedBy: z.string().nullable(),
  procedure: procedureSchema,
});
export type OpenSituation = z.infer<typeof openSituationSchema>;

export const pastSituationSchema = z.object({
  id: z.uuid(),
  kind: situationKindSchema,
  openedAt: instantSchema,
  endedAt: instantSchema,
  ending: z.enum(situationEndings),
  endedBy: z.string().nullable(),
});

/** Everything the situations of a household show, at one moment. */
export const situationsSchema = z.object({
  now: instantSchema,
  open: openSituationSchema.nullable(),
  past: z.array(pastSituationSchema),
  /** The newest value of what a procedure may need, with its age; null where it was never measured. */
  water: z.record(
    z.enum(['freeChlorine', 'combinedChlorine', 'pH', 'cyanuricAcid', 'calciumHardness']),
    z.object({ value: z.number(), takenAt: instantSchema }).nullable(),
  ),
  /** Free chlorine since it was opened: promised, read, expected. Null without a plan. */
  chart: z
    .object({
      hours: z.array(instantSchema),
      p10: z.array(z.number()),
      p50: z.array(z.number()),
      p90: z.array(z.number()),
      readings: z.array(z.object({ takenAt: instantSchema, freeChlorine: z.number(), inside: z.boolean().nullable() })),
      doses: z.array(z.object({ at: instantSchema, given: z.boolean() })),
      swimLimit: z.number(),
      lowestLevel: z.number(),
      maximum: z.number(),
    })
    .nullable(),
});
export type Situations = z.infer<typeof situationsSchema>;
