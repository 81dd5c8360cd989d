import { describe, expect, it } from 'vitest';
import { paperStateOf } from '@/components/week-print/paper-state';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { aWeekSheet } from '@/tests/support/week-sheet';

// Now is Wednesday 10:20; the toy plan asks for a quick check on Thursday 19:00 and ends on Sunday 19:00.
const ofWeek = (changes: Partial<WeekSheet> = {}, openDoses: readonly string[] = []) =>
  paperStateOf({ week: aWeekSheet({}, changes), notes: {}, openDoses });
const plan = aWeekSheet().plan!;
const at = (iso: string) => Date.parse(iso);

describe('whether a page may be dosed by', () => {
  it('until the first check, with the dose that may end it earlier', () => {
    const end = { at: at('2026-07-09T19:00:00+02:00'), why: 'quick' };
    expect(ofWeek()).toEqual({ end: { ...end, doseBefore: undefined } });
    expect(ofWeek({}, ['2026-07-08T19:40:00+02:00'])).toEqual({
      end: { ...end, doseBefore: at('2026-07-08T19:40:00+02:00') },
    });
  });

  it('a check that was made does not end it', () => {
    const checks = aWeekSheet().checks.map((check, index) => ({ ...check, done: index === 0 }));
    expect(ofWeek({ checks })).toMatchObject({ end: { at: at('2026-07-11T10:00:00+02:00'), why: 'quick' } });
  });

  it('not while a dose or a check is overdue', () => {
    expect(ofWeek({}, ['2026-07-07T19:40:00+02:00'])).toEqual({ bar: 'dose' });
    expect(ofWeek({}, ['2026-07-08T10:20:00+02:00'])).toEqual({ bar: 'dose' });
    const check = { at: '2026-07-08T10:00:00+02:00', kind: 'full' as const, reason: 'next-week', done: false };
    expect(ofWeek({ checks: [check] })).toEqual({ bar: 'full' });
  });

  it.each<[string, Partial<WeekSheet>]>([
    ['untested', { lastReading: null, plan: null }],
    ['noPlan', { plan: null }],
    ['noPlan', { plan: { ...plan, stale: true } }],
    ['noPlan', { planProblem: { code: 'engine-busy', errorId: 'x' } }],
    ['noPlan', { plan: { ...plan, endsAt: '2026-07-08T10:00:00+02:00' }, checks: [] }],
    ['needs', { plan: { ...plan, cost: null } }],
    ['recordOnly', { pool: { ...aWeekSheet().pool, recordOnly: true } }],
    ['doubtful', { doses: aWeekSheet().doses.map((dose) => ({ ...dose, doubtful: true })) }],
  ])('not: %s', (bar, changes) => {
    expect(ofWeek(changes, ['2026-07-09T19:40:00+02:00'])).toEqual({ bar });
  });

  it('a week that is over is a record', () => {
    expect(paperStateOf({ week: aWeekSheet({ now: ['2026-07-13', '00:00'] }), notes: {}, openDoses: [] })).toEqual({
      bar: 'past',
    });
  });
});
