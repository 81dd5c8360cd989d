import { screen, waitFor } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { aWeekSheet } from '../../support/week-sheet';
import { showSheet } from './show-sheet';

beforeEach(() => localStorage.clear());
afterEach(() => vi.restoreAllMocks());

type Plan = NonNullable<WeekSheet['plan']>;

function withPlan(change: Partial<Plan>, rest: Partial<WeekSheet> = {}): WeekSheet {
  const sheet = aWeekSheet();
  return { ...sheet, plan: { ...sheet.plan!, ...change }, ...rest };
}

describe('a sheet that lacks something says what, and where to go', () => {
  it('asks for a full test before the first reading', async () => {
    const nothing = { readings: [], lastReading: null, behind: null, ahead: null, plan: null, doses: [], checks: [] };
    const verdict = { state: 'test-first', reasons: [{ code: 'chlorine-not-known' }], until: null } as const;
    await showSheet(
      aWeekSheet({}, { ...nothing, verdict: { ...verdict, reasons: [...verdict.reasons], adviseDailyCheck: false } }),
    );
    expect(screen.getByRole('heading', { name: 'The sheet starts with one test.' })).toBeInTheDocument();
    for (const link of screen.getAllByRole('link', { name: 'Enter a test' }))
      expect(link).toHaveAttribute('href', '/test');
    expect(screen.queryByRole('heading', { name: 'To do' })).not.toBeInTheDocument();
  });

  it('names what has to be measured and since when it was not', async () => {
    const needs = [
      { code: 'reading-too-old', quantity: 'freeChlorine', since: '2026-06-20T19:00:00+02:00' },
      { code: 'never-measured', quantity: 'pH', since: null },
    ];
    await showSheet(withPlan({ needs, cost: null, alternatives: [] }, { ahead: null, doses: [] }));
    expect(
      screen.getByText(
        'Free chlorine was last measured on Saturday 20 June; a plan needs a value of the last 14 days.',
      ),
    ).toBeInTheDocument();
    expect(screen.getByText('pH has never been measured.')).toBeInTheDocument();
    expect(screen.getByText('There is no plan to explain yet.')).toBeInTheDocument();
    expect(screen.queryByText('Nothing to add')).not.toBeInTheDocument();
  });

  it('asks for a stabilizer test without calling the plan away', async () => {
    await showSheet(withPlan({ needs: [{ code: 'never-measured', quantity: 'cyanuricAcid', since: null }] }));
    expect(screen.getByText(/Stabilizer has never been measured, so no slow tablets are planned/)).toBeInTheDocument();
    expect(screen.getByText('Due tomorrow')).toBeInTheDocument();
  });

  it('gives the number of a fault and keeps what it knew', async () => {
    await showSheet(aWeekSheet({}, { planProblem: { code: 'plan-refused', errorId: 'f-4711' } }));
    const alert = screen.getByRole('alert');
    expect(alert).toHaveTextContent('There is no plan this time.');
    expect(alert).toHaveTextContent('The plan did not pass its safety check, so it is not shown.');
    expect(alert).toHaveTextContent('f-4711');
  });

  it('marks a plan that no longer fits', async () => {
    await showSheet(withPlan({ stale: true }));
    expect(screen.getByText('This plan no longer fits what is known.')).toBeInTheDocument();
  });

  it('says that it only keeps the record', async () => {
    const sheet = aWeekSheet();
    await showSheet({ ...sheet, plan: null, ahead: null, doses: [], pool: { ...sheet.pool, recordOnly: true } });
    expect(screen.getByText('This sheet keeps the record.')).toBeInTheDocument();
  });

  it('says of days after the plan that theirs comes with the next test', async () => {
    await showSheet(withPlan({ endsAt: '2026-07-10T00:00:00+02:00' }, { doses: [], checks: [] }));
    expect(screen.getAllByText('The plan for this day comes with the next test.')).toHaveLength(3);
  });

  it('explains mix, limits it cannot keep and cautions in sentences with their figures', async () => {
    const broken = [{ limit: 'lowest-level', at: '2026-07-11T18:00:00+02:00', value: 2.04, bound: 2.21, unit: 'mg/L' }];
    await showSheet(withPlan({ broken }));
    expect(
      screen.getByText(
        /Stabilizer is at 43, which sets the lowest level at 2\.\d\. Three slow tablets carry most of the week/,
      ),
    ).toBeInTheDocument();
    expect(
      screen.getByText('Saturday evening free chlorine falls to 2.0, under the lowest level of 2.2.'),
    ).toBeInTheDocument();
    expect(
      screen.getByText(
        /Calcium hardness was not measured. The plan reckons with 220, and with the doubt that brings\./,
      ),
    ).toBeInTheDocument();
  });

  it('compares four ways as marks and as a table', async () => {
    const sheet = aWeekSheet();
    const [tablets, granular, liquid] = sheet.plan!.alternatives;
    const failing = { ...granular!, feasible: false, hoursOutside: 12, doses: [sheet.doses[1]!] };
    const { user } = await showSheet(withPlan({ alternatives: [tablets!, failing, liquid!] }));
    expect(screen.getByText('Granules alone: 12 hours of the week out of range.')).toBeInTheDocument();
    await user.click(screen.getByRole('button', { name: 'See as a table' }));
    const cells = (name: string) =>
      [...screen.getByRole('rowheader', { name }).closest('tr')!.cells].slice(1).map((cell) => cell.textContent);
    expect(cells('Cost')).toEqual(['15.20', '12.10', '20.70', '13.40']);
    expect(cells('Stabilizer left behind')).toEqual(['+6.0', '-0.9', '-0.9', '+4.1']);
    expect(cells('Visits')).toEqual(['1', '7', '7', '5']);
  });
});

describe('freshness', () => {
  it('asks for the week of now, or for the one in the address, and offers the weeks beside it', async () => {
    const { asked } = await showSheet(aWeekSheet(), { start: '2026-07-06' });
    expect(asked).toEqual(['/api/week?start=2026-07-06']);
    expect(screen.getByRole('link', { name: 'Week before' })).toHaveAttribute('href', '/week?start=2026-06-29');
    expect(screen.getByRole('link', { name: 'Week after' })).toHaveAttribute('href', '/week?start=2026-07-13');
    expect(screen.getByRole('link', { name: 'This week' })).toHaveAttribute('href', '/week');
  });

  it('fetches the verdict anew when the page comes back into view, and says so when it cannot', async () => {
    const { asked } = await showSheet(aWeekSheet());
    expect(asked).toEqual(['/api/week']);
    vi.mocked(fetch).mockRejectedValue(new TypeError('Failed to fetch'));
    window.dispatchEvent(new Event('visibilitychange'));
    await waitFor(() => expect(screen.getByText(/Not up to date/)).toHaveTextContent('what was known at 10:20'));
  });
});
