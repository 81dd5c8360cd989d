import { act, fireEvent, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { expect, vi } from 'vitest';
// It follows the page in a browser.
import '@/components/readings/test-for-now';
import { TestEntry } from '@/components/readings/test-entry';
import type { ReadingHousehold } from '@/components/readings/reading-setting';
import { parseInstant } from '@/lib/calendar/wall-time';
import common from '@/lib/messages/en/common.json';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { renderWithWords } from '@/tests/support/with-words';
import { aWeekSheet, type WeekOptions } from '@/tests/support/week-sheet';

// Looking up names by role is slow in a simulated browser, and the suites run side by side.
vi.setConfig({ testTimeout: 20_000 });

/** Before anything was measured or dosed: nothing to be asked about. */
export function freshSheet(options: WeekOptions = {}, overrides: Partial<WeekSheet> = {}): WeekSheet {
  return aWeekSheet(options, {
    ...{ behind: null, ahead: null, plan: null, doses: [], readings: [], lastReading: null, checks: [] },
    verdict: { state: 'test-first', reasons: [{ code: 'chlorine-not-known' }], until: null, adviseDailyCheck: false },
    ...overrides,
  });
}

export const household: ReadingHousehold = {
  householdId: 'marrow-lane',
  personId: 'ines',
  personName: 'Ines',
  role: 'owner',
  handlesChemicals: true,
  timeZone: 'Europe/Paris',
  locale: 'en-GB',
  unitSystem: 'metric',
};

export async function openTest(
  sheet: WeekSheet,
  { kind = 'full', ...change }: Partial<ReadingHousehold> & { kind?: 'full' | 'quick' } = {},
) {
  const serverNow = parseInstant(sheet.now) ?? 0;
  const page = renderWithWords(<TestEntry household={{ ...household, ...change }} kind={kind} serverNow={serverNow} />);
  await waitFor(() => expect(screen.queryByText(common.loading)).toBeNull());
  // What listens to the first touch is there once React has done with the form.
  await act(async () => undefined);
  // With the first touch the week is asked for.
  fireEvent.pointerDown(document.body);
  return page;
}

/** Walking up the page for each click to see whether something covers it costs more than the click. */
export const user = userEvent.setup({ pointerEventsCheck: 0 });

/** A key of a pad, or the seam between two of them: "3", "between 1 and 3". */
export function key(pad: string, name: string): HTMLInputElement {
  const group = screen.getAllByRole('group').find((one) => one.querySelector('legend')?.textContent?.startsWith(pad));
  const label = [...(group?.querySelectorAll('label') ?? [])].find((one) => one.textContent === name);
  const radio = label?.querySelector('input');
  if (!radio) throw new Error(`There is no key "${name}" on the pad "${pad}"`);
  return radio;
}
export const tap = (pad: string, name: string) => user.click(key(pad, name));

export const field = (name: string) => screen.getByRole('textbox', { name });
export const save = () => screen.getByRole('button', { name: /^Save/ });

/** Writes a whole text into a field and leaves it. */
export function fill(name: string, text: string) {
  const input = field(name);
  fireEvent.focus(input);
  fireEvent.change(input, { target: { value: text } });
  fireEvent.blur(input);
}

// A simulated browser lays nothing out, so it has nothing to scroll.
Element.prototype.scrollIntoView = () => undefined;

/** A page as wide as a desk, or as narrow as a phone. */
export function screenOf(size: 'desk' | 'phone') {
  vi.stubGlobal('matchMedia', (query: string) => ({
    matches: size === 'phone' && query.includes('max-width'),
    addEventListener: () => undefined,
    removeEventListener: () => undefined,
  }));
}
