import { renderHook } from '@testing-library/react';
import { expect, it } from 'vitest';
import { RequestProblem } from '@/lib/client/fetch-json';
import { AppError } from '@/lib/errors';
import { english } from '@/lib/messages/english';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import { Surroundings } from '@/tests/support/with-words';

const wordsFor = (problem: unknown) => {
  const { result } = renderHook(() => useProblemWords(), { wrapper: Surroundings });
  return result.current(problem);
};

it('has a sentence for each code', () => {
  expect(wordsFor(new RequestProblem('no-connection', 'fetch failed'))).toBe(english.problems['no-connection']);
  expect(wordsFor(new AppError('engine-busy', 'queue full'))).toBe(english.problems['engine-busy']);
});

it('leaves it to the server to say what someone may not do', () => {
  expect(wordsFor(new RequestProblem('not-allowed', 'Only an owner can add or remove products.'))).toBe(
    'Only an owner can add or remove products.',
  );
});

it.each([
  new TypeError('x is undefined'),
  new RequestProblem('unexpected', 'secret detail'),
  'text',
  null,
  { code: 'conflict' },
])('gives away nothing of a fault: %s', (problem) => {
  expect(wordsFor(problem)).toBe(english.problems.unexpected);
});
