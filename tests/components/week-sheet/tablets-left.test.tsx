import { screen, waitFor, within } from '@testing-library/react';
import { beforeEach, describe, expect, it } from 'vitest';
import { unsentTicks } from '@/lib/client/unsent-ticks';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { aWeekSheet, idOf } from '../../support/week-sheet';
import { showSheet } from './show-sheet';

beforeEach(() => localStorage.clear());

const question = 'How many whole tablets were left?';
const planned = { status: 'planned', givenAt: null, givenAmount: null, doneBy: null, recordedBy: null } as const;

/** Monday morning, with the slow tablets of that hour as they stand. */
function monday(change: Partial<PlanDose> = planned): WeekSheet {
  const sheet = aWeekSheet({ now: ['2026-07-06', '08:50'] });
  return { ...sheet, doses: sheet.doses.map((dose) => (dose.id === idOf(101) ? { ...dose, ...change } : dose)) };
}

const ticked = (change: Partial<PlanDose> = {}) =>
  monday({
    ...{ status: 'given', givenAt: '2026-07-06T08:50:00+02:00', givenAmount: 3 },
    ...{ doneBy: 'Ines', recordedBy: 'Ines', undoUntil: '2026-07-06T09:00:00+02:00', ...change },
  });

async function openTablets(sheet: WeekSheet, answers: Parameters<typeof showSheet>[1] = {}) {
  const shown = await showSheet(sheet, answers);
  await shown.user.click(screen.getByRole('button', { name: 'Steps, other amount' }));
  return { ...shown, dialog: within(await screen.findByRole('dialog', { name: '3 slow tablets' })) };
}

describe('tablets that are due', () => {
  it('ask how many whole ones were left, and send it with the tick', async () => {
    const { user, dialog, sent } = await openTablets(monday(), { answers: [ticked({ tabletsLeft: 2 })] });
    await user.click(dialog.getByRole('radio', { name: '2' }));
    expect(sent).toEqual([]);
    await user.click(dialog.getByRole('button', { name: 'Mark as added' }));
    await waitFor(() => expect(sent[0]?.tick).toMatchObject({ action: 'given', tabletsLeft: 2 }));
    await user.click(await screen.findByRole('button', { name: 'Undo' }));
    expect(await screen.findByText('2 whole tablets were left before.')).toBeInTheDocument();
  });

  it('are ticked without an answer all the same', async () => {
    const { user, dialog, sent } = await openTablets(monday(), { answers: [ticked()] });
    await user.click(dialog.getByRole('button', { name: 'Mark as added' }));
    await waitFor(() => expect(sent).toHaveLength(1));
    expect(sent[0]?.tick).not.toHaveProperty('tabletsLeft');
  });

  it('take more than three, one by one or typed', async () => {
    const { user, dialog, sent } = await openTablets(monday(), { answers: [ticked({ tabletsLeft: 6 })] });
    await user.click(dialog.getByRole('radio', { name: 'more' }));
    await user.click(dialog.getByRole('button', { name: 'one more' }));
    await user.click(dialog.getByRole('button', { name: 'one more' }));
    await user.click(dialog.getByRole('button', { name: 'Mark as added' }));
    await waitFor(() => expect(sent[0]?.tick).toMatchObject({ tabletsLeft: 6 }));
  });

  it('send it with another amount too', async () => {
    const { user, dialog, sent } = await openTablets(monday(), { answers: [ticked({ tabletsLeft: 0 })] });
    await user.click(dialog.getByRole('radio', { name: '0' }));
    await user.click(dialog.getByRole('button', { name: 'Other amount' }));
    await user.type(dialog.getByLabelText('How much went in?'), '2');
    await user.click(dialog.getByRole('button', { name: 'Continue' }));
    await user.click(dialog.getByRole('button', { name: 'Yes, 2 went in' }));
    await waitFor(() => expect(sent[0]?.tick).toMatchObject({ action: 'changed', amount: 2, tabletsLeft: 0 }));
  });

  it('keep it on the device with a tick that found no connection', async () => {
    const { user, dialog } = await openTablets(monday(), { answers: ['no answer', 'no answer'] });
    await user.click(dialog.getByRole('radio', { name: '1' }));
    await user.click(dialog.getByRole('button', { name: 'Mark as added' }));
    await waitFor(() => expect(unsentTicks(idOf(1))[0]?.tick).toMatchObject({ action: 'given', tabletsLeft: 1 }));
  });
});

describe('tablets that were ticked with one tap', () => {
  it('can still be told apart for as long as the tick can be taken back', async () => {
    const { user, sent } = await showSheet(ticked(), { answers: [ticked({ tabletsLeft: 1 })] });
    await user.click(screen.getByRole('button', { name: question }));
    const dialog = within(await screen.findByRole('dialog'));
    await user.click(dialog.getByRole('radio', { name: '1' }));
    await user.click(dialog.getByRole('button', { name: 'Keep that' }));
    await waitFor(() => expect(sent[0]?.tick).toMatchObject({ action: 'given', tabletsLeft: 1 }));
    expect(await dialog.findByText('One whole tablet was left before.')).toBeInTheDocument();
  });

  it.each([
    ['somebody else did', { doneBy: 'Tom', recordedBy: 'Tom' }],
    ['it was said', { tabletsLeft: 0 }],
    ['the ten minutes are over', { undoUntil: '2026-07-06T08:50:00+02:00' }],
  ])('are not asked about when %s', async (_when, change) => {
    await showSheet(ticked(change));
    expect(screen.queryByRole('button', { name: question })).not.toBeInTheDocument();
  });
});

it('asks nothing of the kind about granules', async () => {
  const { user } = await showSheet(aWeekSheet({ now: ['2026-07-09', '18:30'] }));
  await user.click(screen.getByRole('button', { name: 'Steps, other amount' }));
  await screen.findByRole('dialog', { name: '95 g granules' });
  expect(screen.queryByText(question)).not.toBeInTheDocument();
});
