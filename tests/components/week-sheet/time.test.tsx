import { screen, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { aWeekSheet, type WeekOptions } from '../../support/week-sheet';
import { showSheet } from './show-sheet';

beforeEach(() => localStorage.clear());
afterEach(() => vi.restoreAllMocks());

const spring: WeekOptions = { start: '2026-03-23', now: ['2026-03-25', '12:00'] };
const autumn: WeekOptions = { start: '2026-10-19', now: ['2026-10-21', '12:00'] };

/** Where a heading's day-column stands, in per cent of the plot. */
function columnOf(name: string) {
  const column = screen.getByRole('heading', { name }).parentElement as HTMLElement;
  const share = (text: string) => Math.round(Number.parseFloat(text) * 1e6) / 1e6;
  return { column, left: share(column.style.left), width: share(column.style.width) };
}

describe('weeks of a clock change', () => {
  it.each([
    { name: '167 hours', options: spring, day: 'Sunday 29 March', hours: 23, week: 167 },
    { name: '169 hours', options: autumn, day: 'Sunday 25 October', hours: 25, week: 169 },
  ])('have a day as wide as it is long: $name', async ({ options, day, hours, week }) => {
    await showSheet(aWeekSheet(options));
    const change = columnOf(day);
    expect(change.width).toBeCloseTo((hours / week) * 100, 5);
    expect(change.left).toBeCloseTo(((6 * 24) / week) * 100, 5);
    expect(columnOf(day.replace(/Sunday \d+/, `Monday ${options.start?.slice(8)}`)).width).toBeCloseTo(
      (24 / week) * 100,
      5,
    );
  });

  it('put noon of that day an hour earlier or later in its column', async () => {
    await showSheet(aWeekSheet(autumn));
    const { column } = columnOf('Sunday 25 October');
    const noon = within(column).getByText('noon').parentElement as HTMLElement;
    expect(Number.parseFloat(noon.style.left)).toBeCloseTo((13 / 25) * 100, 5);
  });

  it('give the to-do columns the same widths', async () => {
    await showSheet(aWeekSheet(autumn));
    const columns = screen.getByRole('heading', { name: 'To do' }).parentElement?.nextElementSibling as HTMLElement;
    const widths = columns.style.gridTemplateColumns.match(/[\d.]+(?=fr)/g)?.map(Number);
    expect(widths?.map((width) => width / 3_600_000)).toEqual([24, 24, 24, 24, 24, 24, 25]);
  });
});

describe('high and low water', () => {
  it('cover 06:00 to midnight and say when, by the part of the day', async () => {
    const sheet = aWeekSheet();
    const { user } = await showSheet(sheet);
    await user.click(screen.getByRole('button', { name: 'day by day' }));
    const thursday = within(screen.getByRole('table')).getByRole('rowheader', { name: 'Thu 9' }).closest('tr')!;
    const hours = sheet.ahead!.hours.map((hour) => Date.parse(hour));
    const within18 = sheet.ahead!.freeChlorine.p50.filter(
      (_, index) =>
        hours[index]! >= Date.parse('2026-07-09T06:00:00+02:00') &&
        hours[index]! <= Date.parse('2026-07-10T00:00:00+02:00'),
    );
    const cells = [...thursday.cells].map((cell) => cell.textContent);
    expect(cells.at(-2)).toBe(`${Math.max(...within18).toFixed(1)} night`);
    expect(cells.at(-1)).toBe(`${Math.min(...within18).toFixed(1)} evening`);
  });
});
