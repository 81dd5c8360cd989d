import { fireEvent, screen } from '@testing-library/react';
import { PoolSteps } from '@/components/pool/pool-steps';
import { vi } from 'vitest';
import userEvent from '@testing-library/user-event';
import type { PoolPlace } from '@/components/pool/setting';
import type { SetupStep } from '@/lib/schemas/pool-profile';
import { renderWithWords } from '@/tests/support/with-words';

// Looking up names by role is slow in a simulated browser, and the suites run side by side.
vi.setConfig({ testTimeout: 20_000 });

export const household = {
  id: 'alder-row',
  name: 'Alder Row',
  timeZone: 'Europe/Madrid',
  locale: 'en-GB',
  unitSystem: 'metric',
  personName: 'Odile',
  mayChange: true,
} as const;

/** Opens one step as its page does, and waits until the answers so far are there. */
export async function openStep(step: SetupStep, change: Partial<typeof household> & { place?: PoolPlace } = {}) {
  const { place = 'first-run', ...rest } = change;
  const page = renderWithWords(
    <PoolSteps key={step} household={{ ...household, ...rest }} place={place} step={step} />,
  );
  await screen.findByRole('heading', { level: 1 });
  return page;
}

/** Walking up the page for each click to see whether something covers it costs more than the click. */
export const user = userEvent.setup({ pointerEventsCheck: 0 });

export const field = (name: string) => screen.getByRole('textbox', { name });
/** Writes a whole text at once; what happens on the way is tested where it matters. */
export const fill = (name: string, text: string) => fireEvent.change(field(name), { target: { value: text } });
export const next = (name: RegExp) => screen.getByRole('button', { name });
