import { AppError, type ErrorCode, type FieldProblem } from '@/lib/errors';
import type { WeekPlan } from '@/lib/schemas/plan';
import type { Scenario } from '@/lib/schemas/scenario';

/** Plan the week, or only project what the scenario says is given. */
export type EngineTask = 'plan' | 'project';
export type Question = { id: number; task: EngineTask; scenario: Scenario };

/** An error as plain data: between threads its class is lost. */
type Fault = { code: ErrorCode | null; message: string; problems: readonly FieldProblem[]; stack: string | null };

/** The first answer of a thread says that it has loaded and waits for work. */
export type Answer = { ready: true } | { id: number; plan: WeekPlan } | { id: number; fault: Fault };

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
