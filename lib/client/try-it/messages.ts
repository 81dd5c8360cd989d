import type { DoseUnit, PlannedDose } from '@/lib/schemas/dose';
import type { TryOutChanges, TryOutStart } from '@/lib/schemas/try-out';
import type { TryOutFact } from './facts';

/** Free chlorine hour by hour [ms, mg/L], and when its jumps happen [ms]. */
export type TriedCourse = { at: number[]; levels: number[]; jumps: number[] };

/** The week as it was tried, beside the plan's own: what is drawn, and what is to be said of it. */
export type CourseAnswer = {
  kind: 'course';
  number: number;
  /** False while only the pool with every parameter at its median has been asked. */
  likely: boolean;
  plan: TriedCourse;
  tried: TriedCourse;
  facts: TryOutFact[];
};

/** One dose that the plan would change; null where there is none. */
export type ChangedDose = {
  at: number;
  substance: PlannedDose['substance'];
  form: PlannedDose['form'];
  unit: DoseUnit;
  before: number | null;
  after: number | null;
};

/** What a plan made for the tried week comes to. */
export type Advice =
  | { code: 'refused' }
  /** `keeps`: no limit is broken that the standing plan keeps. */
  | { code: 'planned'; changed: ChangedDose[]; keeps: boolean };
export type AdviceAnswer = { kind: 'advice'; number: number; advice: Advice };

/** What the thread is asked, and what it says. */
export type TryItQuestion =
  | { kind: 'start'; start: TryOutStart }
  | { kind: 'course'; number: number; changes: TryOutChanges }
  | { kind: 'advice'; number: number; changes: TryOutChanges };
export type TryItAnswer = CourseAnswer | AdviceAnswer | { kind: 'failed'; number: number };
