import { fireEvent, screen } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { moveCursor } from '@/components/charts/cursor-store';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { aWeekSheet } from '../../support/week-sheet';
import { showSheet } from '../week-sheet/show-sheet';

beforeEach(() => localStorage.clear());
afterEach(() => {
  for (const syncId of ['week-sheet', 'today']) moveCursor(syncId, undefined);
  vi.restoreAllMocks();
});

const plot = 910;
const sheet = aWeekSheet();

/** What the reply expects at an hour of the week, to one decimal. */
function expected(hour: string, { ahead }: WeekSheet = sheet) {
  const index = ahead!.hours.findIndex((each) => Date.parse(each) === Date.parse(hour));
  const { p10, p50, p90 } = ahead!.freeChlorine;
  return [p50, p10, p90].map((band) => band[index]!.toFixed(1));
}

async function reading(name: RegExp = /^Free chlorine, hour by hour$/, options = {}) {
  const page = await showSheet(sheet, { plot, ...options });
  const slider = await screen.findByRole('slider', { name }, { timeout: 15_000 });
  return { ...page, slider };
}

describe('a curve is read hour by hour', () => {
  it('from now on, in words, with its likely range', async () => {
    const { slider, user } = await reading();
    slider.focus();
    expect(slider).toHaveAttribute(
      'aria-valuetext',
      expect.stringMatching(/^This morning, 10:20: \d\.\d mg\/L, likely/),
    );
    await user.keyboard('{ArrowRight}');
    const [middle, low, high] = expected('2026-07-08T11:00:00+02:00');
    expect(slider).toHaveAttribute('aria-valuetext', `Midday today, 11:00: ${middle} mg/L, likely ${low} to ${high}`);
    await user.keyboard('{PageUp}{Shift>}{ArrowRight}{/Shift}');
    const [later] = expected('2026-07-09T17:00:00+02:00');
    expect(slider.getAttribute('aria-valuetext')).toContain(`Thursday afternoon, 17:00: ${later} mg/L`);
  });

  it('and says what was promised of the hours behind', async () => {
    const { slider, user } = await reading();
    slider.focus();
    await user.keyboard('{Home}');
    expect(slider.getAttribute('aria-valuetext')).toMatch(/^Sunday night, 00:00: \d\.\d mg\/L promised/);
  });

  it('in all lanes at once, until Escape', async () => {
    const { slider, user, container } = await reading();
    const lines = () => container.querySelectorAll('[data-cursor-line]');
    expect(lines()).toHaveLength(0);
    slider.focus();
    await user.keyboard('{End}');
    await vi.waitFor(() => expect(lines()).toHaveLength(1));
    const spoken = screen.getByRole('slider', { name: 'pH, hour by hour' }).getAttribute('aria-valuetext');
    expect(spoken).toMatch(/^Sunday evening, 19:00: pH 7\.\d, likely/);
    expect(container.querySelectorAll('[data-overlay] p')).toHaveLength(3);
    await user.keyboard('{Escape}');
    expect(lines()).toHaveLength(0);
    expect(container.querySelectorAll('[data-overlay] p')).toHaveLength(0);
    expect(slider).toHaveFocus();
  });

  it('under a pointer as with keys', async () => {
    const { slider, container } = await reading();
    const [middle] = expected('2026-07-10T12:00:00+02:00');
    fireEvent.pointerMove(slider, { clientX: ((4 * 24 + 12) / 168) * plot });
    const shown = [...container.querySelectorAll('[data-overlay] p')].map(({ textContent }) => textContent);
    expect(shown[0]).toContain(`Friday midday, 12:00: ${middle} mg/L`);
    fireEvent.pointerLeave(slider);
    expect(container.querySelectorAll('[data-overlay] p')).toHaveLength(0);
  });

  it('and leaves other keys to the page', async () => {
    const { slider } = await reading();
    slider.focus();
    expect(fireEvent.keyDown(slider, { key: 'ArrowLeft', altKey: true })).toBe(true);
    expect(fireEvent.keyDown(slider, { key: 'Tab' })).toBe(true);
    expect(fireEvent.keyDown(slider, { key: 'ArrowLeft' })).toBe(false);
  });

  it('on a phone for today alone', async () => {
    const { slider, user } = await reading(undefined, { width: 390, plot: 340 });
    slider.focus();
    await user.keyboard('{End}');
    expect(slider.getAttribute('aria-valuetext')).toMatch(/^Tonight, 00:00: /);
  });
});

/** What is said of the chlorine curve of a sheet whose levels ahead are changed hour by hour. */
async function sentenceOf(change: (level: number, hoursAhead: number) => number) {
  const changed = aWeekSheet();
  const { hours, freeChlorine } = changed.ahead!;
  const since = hours.map((hour) => Math.max(0, (Date.parse(hour) - Date.parse(changed.now)) / 3_600_000));
  for (const band of [freeChlorine.p10, freeChlorine.p50, freeChlorine.p90])
    band.forEach((level, index) => (band[index] = change(level, since[index]!)));
  await showSheet(changed, { plot });
  const slider = await screen.findByRole('slider', { name: /^Free chlorine/ }, { timeout: 15_000 });
  return document.getElementById(slider.getAttribute('aria-describedby')!)!.getAttribute('aria-label')!;
}

describe('the sentence of a curve', () => {
  it('says how far it runs, and that it stays between its limits', async () => {
    expect(await sentenceOf((_, ahead) => 3 - ahead * 0.005)).toBe(
      'Free chlorine hour by hour: about 3.0 now, likely 3.0 to 3.0, down to 2.5 by Sunday evening; it stays above the lowest level of 2.2; it stays under the swim limit of 4.',
    );
  });

  it('names the part of the day in which it falls under the lowest level', async () => {
    // 3.0 at 10:20 on Wednesday; 2.2 is reached after 20 hours, on Thursday morning.
    expect(await sentenceOf((_, ahead) => 3 - ahead * 0.04)).toContain(
      '; it falls under the lowest level of 2.2 by Thursday morning; it stays under',
    );
  });

  it('names the part of the day in which it goes over the swim limit', async () => {
    // 4 is passed after 100 hours, on Sunday afternoon.
    expect(await sentenceOf((_, ahead) => 3 + ahead * 0.01)).toContain(
      '; it goes over the swim limit of 4 by Sunday afternoon.',
    );
  });

  it('says that it stays near a level', async () => {
    expect(await sentenceOf(() => 3)).toContain(', staying near 3.0; ');
  });
});
