import { screen, waitFor } from '@testing-library/react';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { weekSheetSchema } from '@/lib/schemas/week-sheet';
import { aWeekSheet } from '@/tests/support/week-sheet';
import { fakeTestServer } from './fake-test-server';
import { freshSheet, openTest, save, screenOf, tap, user } from './render-test';

beforeEach(() => {
  localStorage.clear();
  screenOf('phone');
});
afterEach(() => vi.unstubAllGlobals());

const planned = weekSheetSchema.parse(aWeekSheet());
const title = 'Zero can mean none, or far too much.';
const answer = (name: string) => user.click(screen.getByRole('button', { name }));

async function readZero(sheet = planned) {
  const server = fakeTestServer(sheet);
  await openTest(sheet, { kind: 'quick' });
  // Two answers, one after the other, on a machine that may be busy.
  await waitFor(() => expect(server.requests.some(({ path }) => path.includes('start='))).toBe(true), {
    timeout: 4000,
  });
  await tap('Free chlorine', '0');
  await tap('pH', '7.2');
  return server;
}

it('asks about a zero where the sheet expected chlorine, and holds Test first until it is answered', async () => {
  const server = await readZero();
  expect(screen.getByRole('heading', { name: title })).toBeInTheDocument();
  expect(screen.getByText(/The sheet expected \d.\d to \d.\d mg\/L/)).toBeInTheDocument();
  expect(screen.getByText('Mix half pool water, half tap water that stood in the sun.')).toBeInTheDocument();
  expect(screen.getByText('Test before anyone swims.')).toBeInTheDocument();
  expect(screen.getByText('No dose this evening.')).toBeInTheDocument();
  expect(save()).toHaveAccessibleDescription('one question open');
  await user.click(save());
  expect(server.sent()).toEqual([]);
});

it('says stay out when the colour flashed, and sends the answer', async () => {
  const server = await readZero();
  await answer('Yes, it did');
  expect(screen.getByText('Stay out, add nothing.')).toBeInTheDocument();
  expect(screen.getByText('Test tomorrow.')).toBeInTheDocument();
  await user.click(save());
  await waitFor(() => expect(server.stored()[0]?.zeroAnswer).toBe('flashed'));
});

it('takes the zero as it is when the colour stayed pale', async () => {
  const server = await readZero();
  await answer('No, it stayed pale');
  await user.click(save());
  await waitFor(() =>
    expect(server.stored()[0]).toMatchObject({ zeroAnswer: 'stayed-pale', values: { freeChlorine: 0 } }),
  );
});

it('keeps the question open when nobody can tell now', async () => {
  const server = await readZero();
  await answer('I cannot tell now');
  expect(screen.getByText('Test before anyone swims.')).toBeInTheDocument();
  await user.click(save());
  await waitFor(() => expect(server.stored()).toHaveLength(1));
  expect(server.stored()[0]?.zeroAnswer).toBeUndefined();
});

it('asks anew when another reading is tapped after an answer', async () => {
  await readZero();
  await answer('No, it stayed pale');
  await tap('Free chlorine', 'between 0 and 1');
  expect(screen.getByRole('heading', { name: title })).toBeInTheDocument();
  expect(save()).toHaveAccessibleDescription('one question open');
});

it('asks about a zero within 72 hours of a dose also where nothing was projected', async () => {
  await readZero({ ...planned, ahead: null });
  expect(screen.getByRole('heading', { name: title })).toBeInTheDocument();
  expect(screen.getByText(/^Strong chlorine bleaches the colour away/)).toBeInTheDocument();
});

it('does not ask in a pool of which nothing is known', async () => {
  const sheet = freshSheet();
  await readZero(weekSheetSchema.parse(sheet));
  expect(screen.queryByRole('heading', { name: title })).toBeNull();
  expect(save()).not.toHaveAttribute('aria-disabled');
});

it('asks on the next visit what was left open, and sends the answer with the same test', async () => {
  const open = {
    ...planned,
    lastReading: planned.lastReading && {
      ...planned.lastReading,
      values: { freeChlorine: 0, pH: 7.4 },
    },
    verdict: {
      state: 'test-first' as const,
      reasons: [{ code: 'false-zero-open' }],
      until: null,
      adviseDailyCheck: false,
    },
  };
  const server = fakeTestServer(open);
  await openTest(open);
  expect(await screen.findByText('One question about the last test is still open.')).toBeInTheDocument();
  server.become(planned);
  await answer('No, it stayed pale');
  await screen.findByText('Test saved');
  expect(server.requests.filter(({ method }) => method === 'PUT')).toHaveLength(1);
  expect(server.stored()[0]).toMatchObject({ id: open.lastReading?.id, zeroAnswer: 'stayed-pale' });
});
