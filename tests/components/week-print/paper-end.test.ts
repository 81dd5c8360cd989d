import { describe, expect, it } from 'vitest';
import { paperEnd } from '@/components/week-print/paper-end';

const HOUR = 3_600_000;
const planEndsAt = 168 * HOUR;

describe('until when a page is good', () => {
  it('to the end of the plan where nothing comes before it', () => {
    expect(paperEnd({ planEndsAt, checks: [], doses: [] })).toEqual({
      at: planEndsAt,
      why: 'plan',
      doseBefore: undefined,
    });
  });

  it('to the first test or the end of the plan, in whatever order they are told', () => {
    const checks = [
      { at: 60 * HOUR, kind: 'full' as const },
      { at: 40 * HOUR, kind: 'quick' as const },
    ];
    expect(paperEnd({ planEndsAt, checks, doses: [] })).toMatchObject({ at: 40 * HOUR, why: 'quick' });
    expect(paperEnd({ planEndsAt, checks: checks.slice(0, 1), doses: [] })).toMatchObject({ why: 'full' });
    expect(paperEnd({ planEndsAt: HOUR, checks, doses: [] })).toMatchObject({ at: HOUR, why: 'plan' });
  });

  it('tells the first dose by which it may end earlier, and none at or after the test', () => {
    const checks = [{ at: 40 * HOUR, kind: 'quick' as const }];
    const doseBefore = (doses: number[]) => paperEnd({ planEndsAt, checks, doses }).doseBefore;
    expect(doseBefore([90 * HOUR, 30 * HOUR, 20 * HOUR])).toBe(20 * HOUR);
    expect(doseBefore([40 * HOUR, 90 * HOUR])).toBeUndefined();
  });
});
