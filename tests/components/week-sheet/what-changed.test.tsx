import { screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import type { PlanChanges } from '@/lib/schemas/plan-changes';
import { aWeekSheet } from '@/tests/support/week-sheet';
import { showSheet } from './show-sheet';

const granules = { substance: 'calcium-hypochlorite', form: 'granular', unit: 'g' } as const;
const changes: PlanChanges = {
  at: '2026-07-08T09:00:00+02:00',
  causes: ['new-reading', 'dose'],
  doses: [
    { ...granules, day: '2026-07-06', before: 50, after: null },
    { ...granules, day: '2026-07-09', before: 60, after: 95 },
    { ...granules, day: '2026-07-10', before: 50, after: null },
    { substance: 'trichlor', form: 'tablet', unit: 'tablet', day: '2026-07-11', before: null, after: 2 },
  ],
};

describe('what changed', () => {
  it('is told day by day with its causes, as far as it lies ahead', async () => {
    await showSheet({ ...aWeekSheet(), changes });
    expect(
      screen.getByText('Today at 09:00, because of a new test and what went in or was left out.'),
    ).toBeInTheDocument();
    expect(screen.getByText('Thursday: 95 g granules, before it was 60 g.')).toBeInTheDocument();
    expect(screen.getByText('Friday: no 50 g granules any more.')).toBeInTheDocument();
    expect(screen.getByText('Saturday: 2 slow tablets, new.')).toBeInTheDocument();
    expect(screen.queryByText(/^Monday: no/)).toBeNull();
  });

  it('is left out where nothing changed', async () => {
    await showSheet(aWeekSheet());
    expect(screen.queryByRole('heading', { name: 'What changed' })).toBeNull();
  });
});
