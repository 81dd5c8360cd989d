import { screen, within } from '@testing-library/react';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import type { Band } from '@/lib/schemas/plan';
import { aWeekSheet } from '../../support/week-sheet';
import { showSheet } from './show-sheet';

beforeEach(() => localStorage.clear());
afterEach(() => vi.restoreAllMocks());

const sheet = aWeekSheet();
const now = Date.parse(sheet.now);
const monday = Date.parse('2026-07-06T00:00:00+02:00');

/** What the reply says of each hour that the sheet shows: promised behind now, expected ahead. */
function hoursOf(pick: (curve: NonNullable<typeof sheet.ahead>) => Band) {
  const of = (curve: NonNullable<typeof sheet.ahead>) =>
    curve.hours.map((hour, index) => {
      const { p10, p50, p90 } = pick(curve);
      return { at: Date.parse(hour), likely: [p10[index]!, p50[index]!, p90[index]!] };
    });
  return [...of(sheet.behind!).filter(({ at }) => at < now), ...of(sheet.ahead!).filter(({ at }) => at > now)].filter(
    ({ at }) => at >= monday,
  );
}

it.each([
  { table: 'free chlorine', decimals: 1, pick: (curve: NonNullable<typeof sheet.ahead>) => curve.freeChlorine },
  { table: 'pH', decimals: 1, pick: (curve: NonNullable<typeof sheet.ahead>) => curve.pH },
  { table: 'stabilizer', decimals: 0, pick: (curve: NonNullable<typeof sheet.ahead>) => curve.cyanuricAcid },
])('the table of $table holds every hour of its curve', async ({ table, decimals, pick }) => {
  const { user } = await showSheet(sheet);
  await user.click(screen.getByRole('button', { name: table }));
  const rows = within(screen.getByRole('table')).getAllByRole('row').slice(1) as HTMLTableRowElement[];
  const hours = hoursOf(pick);
  expect(rows).toHaveLength(hours.length);
  const written = rows.map(({ cells }) => [2, 3, 4].map((column) => cells[column]?.textContent));
  expect(written).toEqual(hours.map(({ likely }) => likely.map((value) => value.toFixed(decimals))));
  expect(rows[0]?.cells[0]).toHaveTextContent('Mon 6, 00:00');
  expect(rows[0]?.cells[1]).toHaveTextContent('promised');
  expect(rows.at(-1)?.cells[1]).toHaveTextContent('expected');
});

it('adds what was measured', async () => {
  const { user } = await showSheet(sheet);
  await user.click(screen.getByRole('button', { name: 'free chlorine' }));
  expect(screen.getByText('Mon 6 08:30: between 1 and 3, strip')).toBeInTheDocument();
  expect(screen.getByText('Tue 7 19:15: 3.3, drop kit')).toBeInTheDocument();
});
