import type { z } from 'zod';
import type { FieldProblem } from '@/lib/errors';
import { fitsNothing, plainWords } from './plain-words';

export type Checked<Value> = { sound: true; value: Value } | { sound: false; problems: FieldProblem[] };

/** Checks what a person typed or a device sent; the problems are worded for that person. Form and route both call it. */
export function checkInput<Schema extends z.ZodType>(schema: Schema, input: unknown): Checked<z.output<Schema>> {
  const parsed = schema.safeParse(input, { error: plainWords });
  return parsed.success
    ? { sound: true, value: parsed.data }
    : { sound: false, problems: parsed.error.issues.flatMap((issue) => problemsOf(issue)) };
}

function problemsOf(issue: z.core.$ZodIssue, base: readonly PropertyKey[] = []): FieldProblem[] {
  const path = [...base, ...issue.path];
  const branch = issue.code === 'invalid_union' && issue.message === fitsNothing ? likeliest(issue.errors) : undefined;
  if (branch) return branch.flatMap((inner) => problemsOf(inner, path));
  // An unknown field is a problem of its own, not of the form around it.
  if (issue.code === 'unrecognized_keys')
    return issue.keys.map((key) => ({ path: written([...path, key]), message: issue.message }));
  return [{ path: written(path), message: issue.message }];
}

/** Of several forms that a value could have, the one it comes nearest to: wrong in its details, not in its kind. */
function likeliest(branches: readonly z.core.$ZodIssue[][]): readonly z.core.$ZodIssue[] | undefined {
  const ofAnotherKind = (issues: readonly z.core.$ZodIssue[]) =>
    issues.some(({ code, path }) => path.length === 0 && (code === 'invalid_type' || code === 'unrecognized_keys'));
  return branches.find((issues) => !ofAnotherKind(issues)) ?? branches[0];
}

function written(path: readonly PropertyKey[]): string {
  return path.map(String).join('.');
}
