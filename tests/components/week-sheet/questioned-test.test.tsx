import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { aWeekSheet } from '../../support/week-sheet';
import { showSheet } from './show-sheet';

const chlorine = {
  quantity: 'freeChlorine',
  measured: 12,
  low: 2.04,
  high: 3.96,
  takenAt: '2026-07-07T19:15:00+02:00',
} as const;
const hardness = { ...chlorine, quantity: 'calciumHardness', measured: 600, low: 190, high: 245.6 } as const;
const sheetWith = (change: Partial<WeekSheet>) => aWeekSheet({}, change);
const words =
  'Free chlorine of 12.0 is far from the 2.0 to 4.0 mg/L that was expected. Was it read and typed right? The sheet goes by it as it was read; of the pool it teaches little until another test says the same.';

describe('a value that nobody expected', () => {
  it('is asked about as a caution, with the way to a new quick check', async () => {
    await showSheet(sheetWith({ questioned: [chlorine] }));
    expect(screen.getByText('One test value was not expected.')).toBeInTheDocument();
    expect(screen.getByText(words)).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Test it again' })).toHaveAttribute('href', '/test?kind=quick');
  });

  it('that no quick check measures leads to a full test', async () => {
    await showSheet(sheetWith({ questioned: [chlorine, hardness] }));
    const list = screen.getByText(words).closest('ul')!;
    expect(within(list).getAllByRole('listitem')[1]).toHaveTextContent(
      'Calcium hardness of 600 is far from the 190 to 246 mg/L that was expected.',
    );
    expect(screen.getByRole('link', { name: 'Test it again' })).toHaveAttribute('href', '/test');
  });

  it('is in the household’s units', async () => {
    const sheet = sheetWith({ questioned: [chlorine] });
    await showSheet({ ...sheet, household: { ...sheet.household, unitSystem: 'us', locale: 'en-US' } });
    expect(screen.getByText(words.replace('mg/L', 'ppm'))).toBeInTheDocument();
  });

  it('shows a viewer no way to a test that they may not enter', async () => {
    const sheet = sheetWith({ questioned: [chlorine] });
    await showSheet({ ...sheet, me: { ...sheet.me, role: 'viewer', handlesChemicals: false } });
    expect(screen.getByText(words)).toBeInTheDocument();
    expect(screen.queryByRole('link', { name: 'Test it again' })).not.toBeInTheDocument();
  });
});

it('asks for what was added unrecorded', async () => {
  await showSheet(sheetWith({ unrecorded: true }));
  expect(
    screen.getByText(
      'There is more chlorine than can be left of what was recorded. Did somebody add some? Tick it or note it next time: the plan reckons with what is there.',
    ),
  ).toBeInTheDocument();
});

it('says nothing where everything was as expected', async () => {
  await showSheet(aWeekSheet());
  expect(screen.queryByText(/was not expected|nobody recorded/)).not.toBeInTheDocument();
});
