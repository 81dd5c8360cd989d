import { z } from 'zod';
import { bandSchema, checkSchema, factSchema, needSchema, weekPlanSchema } from './plan';
import { planChangesSchema } from './plan-changes';
import { planDoseSchema } from './plan-dose';
import { poolEventSchema } from './pool-event';
import { openSituationSchema } from './situation';
import { surfaces } from './pool';
import { uncertainQuantities } from './posterior';
import { recordedReadingSchema } from './reading';
import { calendarDaySchema, instantSchema, wallIntervalSchema } from './time';
import { takenTryOutSchema } from './try-out';
import { verdictSchema } from './verdict';

export const roles = ['owner', 'caretaker', 'viewer'] as const;
export type Role = (typeof roles)[number];
export const unitSystems = ['us', 'metric'] as const;

const sheetDaySchema = z.object({
  day: calendarDaySchema,
  /** First instants of this day and of the next: 23, 24 or 25 hours apart. */
  startsAt: instantSchema,
  endsAt: instantSchema,
  sunrise: instantSchema.nullable(),
  sunset: instantSchema.nullable(),
  /** UV on the water for each hour of the day, share of the reference sun times sky and exposure. */
  sun: z.array(z.number()),
  rain: z.number(),
  swimmerHours: z.number(),
});

/** Hour by hour: what is known or promised of the water. One entry for each instant in `hours`. */
export const sheetCurveSchema = z.object({
  hours: z.array(instantSchema),
  freeChlorine: bandSchema.extend({ lowestLevel: z.array(z.number()), swimLimit: z.array(z.number()) }),
  pH: bandSchema,
  cyanuricAcid: bandSchema,
});
export type SheetCurve = z.infer<typeof sheetCurveSchema>;

/** A value of the newest test that lies far from what was expected: it counts little until another test says the same. */
const questionedSchema = z.object({
  quantity: z.enum(uncertainQuantities),
  measured: z.number(),
  low: z.number(),
  high: z.number(),
  takenAt: instantSchema,
});

/** Everything the week sheet shows, at one moment. */
export const weekSheetSchema = z.object({
  now: instantSchema,
  household: z.object({
    name: z.string(),
    timeZone: z.string(),
    unitSystem: z.enum(unitSystems),
    locale: z.string(),
    demo: z.boolean(),
  }),
  me: z.object({ id: z.string(), name: z.string(), role: z.enum(roles), handlesChemicals: z.boolean() }),
  pool: z.object({
    volume: z.number(),
    surface: z.enum(surfaces),
    swimLimit: z.number(),
    swimLimitSetBy: z.string().nullable(),
    swimHours: wallIntervalSchema,
    stabilizerBand: z.tuple([z.number(), z.number()]),
    recordOnly: z.boolean(),
  }),
  days: z.array(sheetDaySchema).length(7),
  verdict: verdictSchema,
  /** Behind now: what the plans of their time promised. Null before the first plan. */
  behind: sheetCurveSchema.nullable(),
  /** From the newest plan's reading to its end. */
  ahead: sheetCurveSchema.nullable(),
  plan: z
    .object({
      id: z.uuid(),
      version: z.number().int(),
      createdAt: instantSchema,
      takenAt: instantSchema,
      endsAt: instantSchema,
      /** The plan no longer fits what is known (reading over its age, or replanning failed). */
      stale: z.boolean(),
      reasons: z.array(factSchema),
      cautions: z.array(factSchema),
      broken: weekPlanSchema.shape.broken,
      needs: z.array(needSchema),
      mix: weekPlanSchema.shape.mix,
      alternatives: weekPlanSchema.shape.alternatives,
      cost: weekPlanSchema.shape.cost,
      openSwimShare: z.number().nullable(),
    })
    .nullable(),
  /** What the newest plan changed of the days ahead. */
  changes: planChangesSchema.nullable(),
  /** Set when planning failed: what the person is told, with the id under which it was logged. */
  planProblem: z.object({ code: z.string(), errorId: z.string() }).nullable(),
  lastReading: recordedReadingSchema.nullable(),
  questioned: z.array(questionedSchema),
  /** The newest test found more chlorine than can be left of what was recorded, and so did the one before it. */
  unrecorded: z.boolean(),
  readings: z.array(recordedReadingSchema),
  /** What happened since the newest test, or is not over: it bears on the verdict of now. */
  events: z.array(poolEventSchema),
  /** The procedure that is open, with the steps of the days shown; it leads the plan. */
  situation: openSituationSchema.nullable(),
  /** Try-outs that somebody took into the plan and that still change something of it. */
  tryOuts: z.array(takenTryOutSchema),
  doses: z.array(planDoseSchema),
  checks: z.array(checkSchema.extend({ done: z.boolean() })),
});
export type WeekSheet = z.infer<typeof weekSheetSchema>;
