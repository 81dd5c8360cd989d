import { screen, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { aWeekSheet } from '../../support/week-sheet';
import { showSheet } from './show-sheet';

beforeEach(() => localStorage.clear());
afterEach(() => vi.restoreAllMocks());

const standing = /Before anyone goes in:/;

function withVerdict(verdict: WeekSheet['verdict']): WeekSheet {
  return aWeekSheet({}, { verdict });
}

describe('the swim verdict', () => {
  it('is the first line, and a Fine says until when and what to look at before anyone goes in', async () => {
    await showSheet(aWeekSheet());
    const [first] = screen.getAllByRole('heading');
    expect(first).toHaveTextContent('The water is fine for swimming until Thursday evening.');
    expect(first?.closest('[data-verdict]')).toHaveAttribute('data-verdict', 'fine');
    expect(screen.getByText(standing).closest('p')).toHaveTextContent(
      'you can see the bottom drain and its cover is whole, an adult is watching and doing nothing else, no thunder in the last 30 minutes.',
    );
  });

  it('names today by the part of the day and never by minutes', async () => {
    const until = '2026-07-08T19:10:00+02:00';
    await showSheet(withVerdict({ state: 'fine', reasons: [], until, adviseDailyCheck: true }));
    expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent(
      'The water is fine for swimming until this evening.',
    );
    expect(screen.getByText(/Health authorities advise a check on every day of swimming/)).toBeInTheDocument();
  });

  it.each([
    {
      state: 'stay-out',
      reasons: [{ code: 'water-cloudy' }],
      until: null,
      headline: 'Stay out: the water is cloudy.',
      says: /If you cannot see the bottom drain plainly/,
    },
    {
      state: 'wait',
      reasons: [{ code: 'dose-waiting-time', until: '2026-07-09T00:40:00+02:00' }],
      until: '2026-07-09T00:40:00+02:00',
      headline: 'Wait until Thursday morning.',
      says: /A dose has gone in; until Thursday morning/,
    },
    {
      state: 'wait',
      reasons: [{ code: 'combined-chlorine-high', value: 0.7, limit: 0.4, measured: true }],
      until: null,
      headline: 'Wait until a new test says more.',
      says: 'Used-up chlorine was read at 0.7, over 0.4.',
    },
    {
      state: 'test-first',
      reasons: [{ code: 'much-rain', value: 14, limit: 10 }],
      until: null,
      headline: 'Test before anyone swims.',
      says: '14 mm of rain since the last reading.',
    },
  ] as const)('says $headline in its own frame and without the standing line', async (verdict) => {
    const { state, until, headline, says } = verdict;
    await showSheet(withVerdict({ state, until, reasons: [...verdict.reasons], adviseDailyCheck: false }));
    const heading = screen.getByRole('heading', { level: 1 });
    expect(heading).toHaveTextContent(headline);
    const frame = heading.closest('section');
    expect(frame).toHaveAttribute('data-verdict', state);
    expect(within(frame as HTMLElement).getByText(says)).toBeInTheDocument();
    expect(screen.queryByText(standing)).not.toBeInTheDocument();
  });

  it('shows two decimals where one would make a value and its limit look alike', async () => {
    const reasons = [{ code: 'chlorine-under-lowest-level', value: 2.16, limit: 2.2, measured: false }];
    await showSheet(withVerdict({ state: 'wait', reasons, until: null, adviseDailyCheck: false }));
    expect(
      screen.getByText(
        'Free chlorine is expected at 2.16, under this water’s lowest level of 2.20: germs are killed too slowly.',
      ),
    ).toBeInTheDocument();
  });

  it('says level, likely range, age and method of the last reading, and the next check', async () => {
    const sheet = aWeekSheet();
    await showSheet(sheet);
    expect(
      screen.getByText(/^Free chlorine is about \d\.\d mg\/L, between this water’s lowest level of 2\.2/),
    ).toBeInTheDocument();
    expect(screen.getByText(/^Likely range \d\.\d to \d\.\d\.$/)).toBeInTheDocument();
    expect(screen.getByText('Last reading 15 hours ago,').closest('p')).toHaveTextContent('drop kit, Tom');
    expect(screen.getByText('Next quick check').closest('section')).toHaveTextContent('Thursday, by 19:00');
  });

  it('says who set a swim limit that is not the label’s usual one', async () => {
    const sheet = aWeekSheet();
    await showSheet({ ...sheet, pool: { ...sheet.pool, swimLimitSetBy: 'Tom' } });
    expect(screen.getByText(/the swim limit of 4 that Tom has set/)).toBeInTheDocument();
  });
});
