import { screen, within } from '@testing-library/react';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { aWeekSheet } from '../../support/week-sheet';
import { showSheet } from './show-sheet';

beforeEach(() => localStorage.clear());
afterEach(() => vi.restoreAllMocks());

it('begins with the day: verdict, standing line, next dose and its steps, Stop, today, the rest', async () => {
  const { container } = await showSheet(aWeekSheet(), { width: 390 });
  const landmarks = [
    'The water is fine for swimming until Thursday evening.',
    'Before anyone goes in:',
    'Likely range',
    'Due tomorrow',
    'quick check by 19:00, then',
    'Goggles and gloves on,',
    'Stop.',
    'Wed 8',
    'Nothing to add today.',
    'The rest of the week',
    'Already behind',
    'Why this mix',
  ];
  const text = container.textContent;
  const places = landmarks.map((words) => text.indexOf(words));
  expect(places).not.toContain(-1);
  expect(places).toEqual(places.toSorted((a, b) => a - b));
});

it('opens a day with its doses, and their steps without a way to tick them early', async () => {
  const { user } = await showSheet(aWeekSheet(), { width: 390 });
  await user.click(screen.getByText('Fri 10', { selector: 'summary *' }));
  const day = screen.getByText('Fri 10', { selector: 'summary *' }).closest('details')!;
  expect(day).toHaveAttribute('open');
  expect(within(day).getByText('Last light, about 19:40, pump on until 23:40')).toBeInTheDocument();
  expect(within(day).getByText(/15 L of water/)).toBeInTheDocument();
  expect(within(day).queryByRole('button', { name: 'Mark as added' })).not.toBeInTheDocument();
});

it('ticks the dose that is due in its box and offers the way back above the next one', async () => {
  const before = aWeekSheet({ now: ['2026-07-09', '18:30'] });
  const undoUntil = '2026-07-09T18:40:00+02:00';
  const given = { status: 'given' as const, givenAt: before.now, givenAmount: 95, doneBy: 'Ines', recordedBy: 'Ines' };
  const doses = before.doses.map((dose, index) => (index === 2 ? { ...dose, ...given, undoUntil } : dose));
  const { user, sent } = await showSheet(before, { width: 390, answers: [{ ...before, doses }] });
  await user.click(screen.getByRole('button', { name: 'Mark as added' }));
  expect(await screen.findByRole('button', { name: 'Undo' })).toBeInTheDocument();
  expect(screen.getByText('Due tomorrow')).toBeInTheDocument();
  expect(sent).toHaveLength(1);
});
