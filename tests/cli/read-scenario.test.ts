import { describe, expect, it } from 'vitest';
import { plannerProblemLines } from '@/lib/cli/plan/planner-problems';
import { InputProblems, readScenario } from '@/lib/cli/plan/read-scenario';
import { AppError, WaterRangeError } from '@/lib/errors';
import { designScenario } from './plan-scenario';

type Design = typeof designScenario;

function linesFor(text: string): readonly string[] {
  try {
    readScenario(text);
  } catch (error) {
    if (error instanceof InputProblems) return error.lines;
    throw error;
  }
  return [];
}

const changed = (change: (scenario: Design) => unknown) => JSON.stringify(change(structuredClone(designScenario)));

describe('readScenario', () => {
  it('fills in what is left out', () => {
    const scenario = readScenario(JSON.stringify(designScenario));
    expect(scenario.week.sky).toEqual(Array(7).fill(0.85));
    expect(scenario.preferences.visits).toBe(3);
  });

  it.each([
    ['text that is no JSON', '{"pool": \n{,', '$: This is not JSON (line 2, column 2): '],
    ['nothing at all', '', '$: This is not JSON'],
    ['a list', '[]', '$: '],
    [
      'a zone nobody knows',
      changed((s) => ({ ...s, pool: { ...s.pool, timeZone: 'Mars/North' } })),
      '$.pool.timeZone: ',
    ],
    ['an unknown field', changed((s) => ({ ...s, pool: { ...s.pool, depth: 2 } })), '$.pool.depth: '],
    [
      'one of several readings',
      changed((s) => ({ ...s, reading: [s.reading, { ...s.reading, takenAt: '2026-07-04T19:00:00-04:00', pH: 12 }] })),
      '$.reading[1].pH: ',
    ],
    [
      'a reading from after now',
      changed((s) => ({ ...s, now: '2026-07-05T12:00:00-04:00' })),
      '$.reading.takenAt: This reading is taken after now',
    ],
    [
      'two values of one quantity at one instant, in whatever zone it is written',
      changed((s) => ({
        ...s,
        reading: [s.reading, { takenAt: '2026-07-05T23:00:00Z', method: 'strip', pH: 7.2 }],
      })),
      '$.reading[1].pH: Another reading',
    ],
    ['too few days', changed((s) => ({ ...s, week: { rain: [1, 2, 3] } })), '$.week.rain: '],
    [
      'less than nothing on the shelf',
      changed((s) => ({ ...s, shelf: [{ ...s.shelf[0], stock: -1 }] })),
      '$.shelf[0].stock: ',
    ],
    [
      'two products of one id',
      changed((s) => ({ ...s, shelf: [s.shelf[0], s.shelf[0]] })),
      '$.shelf[1].id: Two products have the id "tabs".',
    ],
  ])('refuses %s in one line', (_what, text, beginning) => {
    const lines = linesFor(text);
    expect(lines).toHaveLength(1);
    expect(lines[0]).toContain(beginning);
    expect(lines[0]?.indexOf(beginning)).toBe(0);
  });
});

describe('plannerProblemLines', () => {
  it('leads to the value that the planner found wrong', () => {
    expect(plannerProblemLines(new WaterRangeError('reading.totalAlkalinity', 2, 16, 1000))).toEqual([
      '$.reading.totalAlkalinity: reading.totalAlkalinity is 2; the water model permits 16 to 1000.',
    ]);
    const problems = [{ path: 'given.0.product', message: 'Not there.' }];
    expect(plannerProblemLines(new AppError('invalid-input', 'Not there.', { problems }))).toEqual([
      '$.given[0].product: Not there.',
    ]);
  });

  it('leaves faults alone', () => {
    expect(plannerProblemLines(new TypeError('x is undefined'))).toBeUndefined();
    expect(plannerProblemLines(new AppError('plan-refused', 'No plan.'))).toBeUndefined();
  });
});
