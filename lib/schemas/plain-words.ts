import type { z } from 'zod';

/** Said of a value that fits none of several forms, when the schema has no words of its own. */
export const fitsNothing = 'This is not written as expected.';

const types: Record<string, string> = {
  number: 'Write a number.',
  int: 'Write a whole number.',
  string: 'Write some text.',
  boolean: 'Answer yes or no.',
  array: 'Send a list here.',
  object: 'Fill in this part.',
  record: 'Fill in this part.',
};

/**
 * Words for what a schema has no words of its own for, as a person at the pool would say them. Handed to every parse of
 * something a person typed.
 */
export const plainWords: z.core.$ZodErrorMap = (issue) => {
  if (isMissing(issue.input)) return 'This is needed.';
  switch (issue.code) {
    case 'invalid_type':
      return types[issue.expected] ?? fitsNothing;
    case 'too_small':
      return tooSmall(issue);
    case 'too_big':
      return tooBig(issue);
    case 'invalid_value':
      return `Choose one of these: ${issue.values.map(String).join(', ')}.`;
    case 'unrecognized_keys':
      return `Wadewell does not know this field: ${issue.keys.join(', ')}.`;
    case 'invalid_format':
      return issue.format === 'uuid' ? 'This id is not one that a device of ours made.' : fitsNothing;
    default:
      return fitsNothing;
  }
};

function isMissing(input: unknown): boolean {
  return input === undefined || input === null;
}

type Bound<Code extends string> = Extract<z.core.$ZodRawIssue, { code: Code }>;

function tooSmall({ origin, minimum, inclusive }: Bound<'too_small'>): string {
  if (origin === 'string') return minimum === 1 ? 'This is needed.' : `Use at least ${minimum} characters.`;
  if (origin === 'array' || origin === 'set') return `Name at least ${minimum}.`;
  return inclusive === false ? `Write a number over ${minimum}.` : `Write ${minimum} or more.`;
}

function tooBig({ origin, maximum, inclusive }: Bound<'too_big'>): string {
  if (origin === 'string') return `Use at most ${maximum} characters.`;
  if (origin === 'array' || origin === 'set') return `Name at most ${maximum}.`;
  return inclusive === false ? `Write a number under ${maximum}.` : `Write ${maximum} or less.`;
}
