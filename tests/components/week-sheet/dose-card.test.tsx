import { screen, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { aWeekSheet, idOf } from '../../support/week-sheet';
import { showSheet } from './show-sheet';

beforeEach(() => localStorage.clear());
afterEach(() => vi.restoreAllMocks());

const [thursday, friday] = [idOf(103), idOf(104)];
const phone = { width: 390 };

function withDose(change: Partial<PlanDose>, id = thursday, sheet = aWeekSheet()): WeekSheet {
  return { ...sheet, doses: sheet.doses.map((dose) => (dose.id === id ? { ...dose, ...change } : dose)) };
}

describe('the marked measure that is kept for a product', () => {
  it.each([
    [{ amount: 250, measure: 50 }, '250 g, that is 5 of your marked measure.'],
    [{ amount: 50, measure: 50 }, '50 g, that is your marked measure once.'],
    [{ amount: 225, measure: 50 }, '225 g, that is about 4 and a half of your marked measure.'],
    [{ amount: 25, measure: 100 }, '25 g, that is about a quarter of your marked measure.'],
    [{ amount: 440, measure: 100 }, '440 g, that is about 4.4 of your marked measure.'],
    [{ amount: 300, measure: 100, form: 'liquid', unit: 'mL' }, '300 mL, that is 3 of your marked measure.'],
  ] as const)('stands beside the weight: %o', async (change, words) => {
    await showSheet(withDose(change), phone);
    expect(screen.getByText(words)).toBeInTheDocument();
  });

  it('stands in the units of the household', async () => {
    const sheet = withDose({ amount: 226.8, measure: 56.7 });
    await showSheet({ ...sheet, household: { ...sheet.household, unitSystem: 'us', locale: 'en-US' } }, phone);
    expect(screen.getByText('8 oz, that is 4 of your marked measure.')).toBeInTheDocument();
  });

  it('stands in the column and the dialog of a desk, and in the list of a phone', async () => {
    const words = '50 g, that is 2 of your marked measure.';
    const desk = await showSheet(withDose({ measure: 25 }, friday));
    const column = screen.getByText(words);
    await desk.user.click(within(column.parentElement!).getByRole('button', { name: 'See the steps' }));
    expect(within(await screen.findByRole('dialog')).getByText(words)).toBeInTheDocument();
    desk.unmount();
    const { user } = await showSheet(withDose({ measure: 25 }, friday), phone);
    const day = screen.getByText('Fri 10', { selector: 'summary *' });
    await user.click(day);
    expect(within(day.closest('details')!).getByText(words)).toBeVisible();
  });

  it('is not spoken of where the household keeps none, and of tablets', async () => {
    const { unmount } = await showSheet(aWeekSheet(), phone);
    expect(screen.queryByText(/marked measure\.$/)).toBeNull();
    unmount();
    const tablets = { substance: 'trichlor', form: 'tablet', unit: 'tablet', amount: 3, measure: 50 } as const;
    await showSheet(withDose(tablets), phone);
    expect(screen.queryByText(/of your marked measure/)).toBeNull();
  });
});

describe('a dose that two people ticked', () => {
  const words = 'Was it added twice? Stay out, test in the morning.';
  const given: Partial<PlanDose> = {
    ...{ status: 'given', givenAt: '2026-07-09T18:30:00+02:00', givenAmount: 95, doneBy: 'Tom', recordedBy: 'Tom' },
    ...{ undoUntil: '2026-07-09T18:40:00+02:00' },
  };
  const evening = () => aWeekSheet({ now: ['2026-07-09', '18:32'] });

  it.each([phone, { width: 1440 }])('says so on its card, %o', async (width) => {
    const { unmount } = await showSheet(withDose({ ...given, doubtful: true }, thursday, evening()), width);
    expect(screen.getByText(words)).toBeInTheDocument();
    unmount();
    await showSheet(withDose(given, thursday, evening()), width);
    expect(screen.queryByText(words)).toBeNull();
  });

  it('says so in its dialog, where it can be taken back', async () => {
    const { user } = await showSheet(withDose({ ...given, doubtful: true }, thursday, evening()));
    await user.click(screen.getByRole('button', { name: 'Undo' }));
    const dialog = within(await screen.findByRole('dialog'));
    expect(dialog.getByText(words)).toBeInTheDocument();
    expect(dialog.getByRole('button', { name: 'Undo' })).toBeInTheDocument();
  });
});
