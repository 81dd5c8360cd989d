import type { z } from 'zod';
import { AppError, type FieldProblem } from '@/lib/errors';
import { checkInput } from '@/lib/schemas/problems';

/** The words for each field that is not fine yet, by its path in the answers ("outline.length"). */
export type FieldProblems = Readonly<Record<string, string>>;

export const noProblems: FieldProblems = {};

/** The answers if they are sound, and what is said at which field if they are not: the first problem of each. */
export function checkAnswers<Schema extends z.ZodType>(
  schema: Schema,
  answers: unknown,
): { answers: z.output<Schema>; problems: FieldProblems } | { answers: undefined; problems: FieldProblems } {
  try {
    const checked = checkInput(schema, answers);
    return checked.sound
      ? { answers: checked.value, problems: noProblems }
      : { answers: undefined, problems: byField(checked.problems) };
  } catch (error) {
    // Measures that make no pool are refused by the geometry itself, with a problem at each of them.
    if (error instanceof AppError) return { answers: undefined, problems: byField(error.problems) };
    throw error;
  }
}

function byField(problems: readonly FieldProblem[]): FieldProblems {
  const words: Record<string, string> = {};
  for (const { path, message } of problems) words[path] ??= message;
  return words;
}

/** Puts the cursor into the first field that is not fine, once it is marked. */
export function focusFirstProblem(): void {
  requestAnimationFrame(() => {
    document
      .querySelector<HTMLElement>('[aria-invalid="true"], fieldset[data-problem] input, fieldset[aria-invalid] input')
      ?.focus();
  });
}
