import { describe, expect, it } from 'vitest';
import { changesOf, emptyDraft, swimmersOf, tabletsOf } from '@/components/try-out/draft';

const ground = {
  days: [
    { day: '2026-07-10', swimmerHours: 8 },
    { day: '2026-07-11', swimmerHours: 14 },
  ],
  tablets: 3,
  mostTablets: 4,
};

describe('what is tried', () => {
  it('is nothing while all is as the sheet says', () => {
    expect(changesOf(emptyDraft, ground)).toBeUndefined();
    expect(changesOf({ ...emptyDraft, swimmers: { '2026-07-11': '14' }, tablets: '3' }, ground)).toBeUndefined();
  });

  it('reads a decimal comma', () => {
    expect(swimmersOf('12,5')).toBe(12.5);
    expect(changesOf({ ...emptyDraft, swimmers: { '2026-07-11': '12,5' } }, ground)?.swimmers).toEqual([
      { day: '2026-07-11', swimmerHours: 12.5 },
    ]);
  });

  it('changes nothing yet by what cannot be read', () => {
    for (const text of ['', '12,', 'many', '-1', '1001']) expect(swimmersOf(text)).toBeUndefined();
    expect(changesOf({ ...emptyDraft, swimmers: { '2026-07-11': '12,' } }, ground)).toBeUndefined();
    expect(tabletsOf('2,5', 4)).toBeUndefined();
    expect(tabletsOf('5', 4)).toBeUndefined();
    expect(tabletsOf('4', 4)).toBe(4);
  });

  it('forgets days that are over', () => {
    expect(changesOf({ ...emptyDraft, swimmers: { '2026-07-09': '3' }, sky: { '2026-07-09': 'clear' } }, ground)).toBe(
      undefined,
    );
  });

  it('has sky, tablets and moves beside swimmers', () => {
    const dose = '00000000-0000-4000-8000-000000000001';
    const draft = {
      ...emptyDraft,
      sky: { '2026-07-10': 'clear' as const },
      tablets: '0',
      moves: { [dose]: '2026-07-10' },
    };
    expect(changesOf(draft, ground)).toEqual({
      swimmers: [],
      sky: [{ day: '2026-07-10', sky: 1 }],
      tablets: 0,
      moves: [{ doseId: dose, toDay: '2026-07-10' }],
    });
  });
});
