import { AppError, WaterRangeError } from '@/lib/errors';
import { jsonPath } from './json-path';

/**
 * What the planner found wrong with the input that no schema can see, as lines like those of the schema; undefined for
 * what is no fault of the input.
 */
export function plannerProblemLines(error: unknown): string[] | undefined {
  if (error instanceof WaterRangeError)
    return [`${error.field.startsWith('reading.') ? `$.${error.field}` : '$.reading'}: ${error.message}`];
  if (!(error instanceof AppError) || error.code !== 'invalid-input') return undefined;
  if (error.problems.length === 0) return [`$: ${error.message}`];
  return error.problems.map(({ path, message }) => `${jsonPath(path)}: ${message}`);
}
