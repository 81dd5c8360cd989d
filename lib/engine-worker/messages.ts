import { AppError, type ErrorCode, type FieldProblem } from '@/lib/errors';
import type { PoolHistory } from '@/lib/learning';
import type { WeekPlan } from '@/lib/schemas/plan';
import type { FilterState, PosteriorStep } from '@/lib/schemas/posterior';
import type { Scenario } from '@/lib/schemas/scenario';
import type { SituationKind } from '@/lib/schemas/situation';
import type { Treatment } from '@/lib/schemas/treatment';
import type { TryOutStart } from '@/lib/schemas/try-out';

/** What the engine is asked for, and what it answers. */
export type EngineTasks = {
  /** Plan the week, or only project what the scenario says is given. */
  plan: { order: Scenario; answer: WeekPlan };
  project: { order: Scenario; answer: WeekPlan };
  /** What may be tried on a week. */
  openings: { order: Scenario; answer: Pick<TryOutStart, 'evenings' | 'mostTablets'> };
  /** The week while an open situation leads. */
  lead: { order: { scenario: Scenario; lead: { treatment: Treatment } | { hold: SituationKind } }; answer: WeekPlan };
  /** What a pool has taught since a stored state; null for from the beginning. */
  learn: { order: { from: FilterState | null; history: PoolHistory }; answer: PosteriorStep[] };
};
export type EngineTask = keyof EngineTasks;
export type Question<Task extends EngineTask = EngineTask> = {
  id: number;
  task: Task;
  order: EngineTasks[Task]['order'];
};

/** An error as plain data: between threads its class is lost. */
type Fault = { code: ErrorCode | null; message: string; problems: readonly FieldProblem[]; stack: string | null };

/** The first answer of a thread says that it has loaded and waits for work. */
export type Answer =
  { ready: true } | { id: number; answer: EngineTasks[EngineTask]['answer'] } | { id: number; fault: Fault };

export function faultOf(error: unknown): Fault {
  const { message, stack = null } = error instanceof Error ? error : new Error(String(error));
  return error instanceof AppError
    ? { code: error.code, message, problems: error.problems, stack }
    : { code: null, message, problems: [], stack };
}

/** The error again; its stack tells where in the other thread it was thrown. */
export function errorOf({ code, message, problems, stack }: Fault): Error {
  const error = code === null ? new Error(message) : new AppError(code, message, { problems });
  if (stack !== null) error.stack = stack;
  return error;
}
