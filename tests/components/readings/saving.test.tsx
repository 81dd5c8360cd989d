import { screen, waitFor, within } from '@testing-library/react';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { weekSheetSchema } from '@/lib/schemas/week-sheet';
import { aWeekSheet, idOf } from '@/tests/support/week-sheet';
import { fakeTestServer } from './fake-test-server';
import { freshSheet, household, openTest, save, screenOf, tap, user } from './render-test';

beforeEach(() => {
  localStorage.clear();
  screenOf('phone');
});
afterEach(() => vi.unstubAllGlobals());

const sheet = freshSheet();

async function quickCheck() {
  await tap('Free chlorine', '3');
  await tap('pH', '7.2');
}

it('sends one test, however often it is pressed', async () => {
  const server = fakeTestServer(sheet);
  await openTest(sheet, { kind: 'quick' });
  await quickCheck();
  await user.dblClick(save());
  await screen.findByText('Test saved');
  expect(server.sent()).toHaveLength(1);
});

it('sends a refused test again under the same id', async () => {
  const server = fakeTestServer(sheet);
  await openTest(sheet, { kind: 'quick' });
  await quickCheck();
  server.answer.mockResolvedValueOnce(
    Response.json({ error: { code: 'engine-busy', message: 'Busy', problems: [] } }, { status: 503 }),
  );
  await user.click(save());
  expect(await screen.findByText('The test is not saved yet. What you entered is still here.')).toBeInTheDocument();
  await user.click(save());
  await screen.findByText('Test saved');
  expect(new Set(server.sent().map(({ id }) => id)).size).toBe(1);
  expect(server.stored()).toHaveLength(1);
});

it('keeps a draft over a reload with its id, and forgets it once it is answered', async () => {
  const server = fakeTestServer(sheet);
  const { unmount } = await openTest(sheet, { kind: 'quick' });
  await tap('Free chlorine', 'between 1 and 3');
  unmount();
  const kept = JSON.parse(localStorage.getItem('wadewell.test.ines.marrow-lane') ?? '{}') as { id?: string };
  const { unmount: leave } = await openTest(sheet);
  // Something was written down already: the draft stays the quick check it was.
  expect(screen.getByRole('heading', { name: 'Quick check' })).toBeInTheDocument();
  expect(screen.getByText('between 1 and 3 mg/L')).toBeInTheDocument();
  await tap('pH', '7.2');
  await user.click(save());
  await screen.findByText('Test saved');
  expect(server.stored()[0]?.id).toBe(kept.id);
  leave();
  await openTest(sheet);
  expect(document.querySelectorAll('ol input:checked')).toHaveLength(0);
});

it('keeps a test on the device without a connection and sends the same one later', async () => {
  const server = fakeTestServer(sheet);
  await openTest(sheet, { kind: 'quick' });
  await quickCheck();
  server.answer.mockRejectedValue(new TypeError('offline'));
  await user.click(save());
  expect(await screen.findByRole('heading', { name: 'Kept on this device.' })).toBeInTheDocument();
  expect(screen.getByText(/Test before anyone swims/)).toBeInTheDocument();
  expect(screen.getByText(/The test of Wed 8 July, 10:20 is on this device./)).toBeInTheDocument();
  const kept = localStorage.getItem(`wadewell.unsent-readings.${household.personId}.${household.householdId}`) ?? '';

  const later = fakeTestServer(sheet);
  window.dispatchEvent(new Event('online'));
  await waitFor(() => expect(later.stored()).toHaveLength(1));
  expect(kept).toContain(later.stored()[0]?.id);
  await waitFor(() => expect(screen.queryByText(/is on this device/)).toBeNull());
});

it('keeps a test that the server will not take, with the reason, until somebody lets it go', async () => {
  const server = fakeTestServer(sheet);
  await openTest(sheet, { kind: 'quick' });
  await quickCheck();
  server.answer.mockRejectedValueOnce(new TypeError('offline'));
  server.answer.mockResolvedValue(
    Response.json(
      { error: { code: 'invalid-input', message: 'No.', problems: [{ path: 'takenAt', message: 'Too late.' }] } },
      { status: 422 },
    ),
  );
  await user.click(save());
  expect(await screen.findByText('Too late.')).toBeInTheDocument();
  await user.click(screen.getByRole('button', { name: 'Forget this test' }));
  expect(screen.queryByText('Too late.')).toBeNull();
});

it('says the swim state first, then what changed in the plan', async () => {
  const before = weekSheetSchema.parse(aWeekSheet());
  const server = fakeTestServer(before);
  await openTest(before, { kind: 'quick' });
  await waitFor(() => expect(server.requests.some(({ path }) => path.includes('start='))).toBe(true));
  await quickCheck();
  const [first, second] = before.doses.filter(({ status }) => status === 'planned');
  if (!first || !second) throw new Error('The sheet of the tests has two planned doses');
  server.become({
    ...before,
    doses: [{ ...first, id: idOf(900), amount: first.amount + 50 }, second],
    verdict: { state: 'wait', reasons: [], until: before.now, adviseDailyCheck: false },
  });
  await user.click(save());
  await screen.findByText('Test saved');
  const headings = screen.getAllByRole('heading').map(({ textContent }) => textContent);
  expect(headings[0]).toMatch(/^Wait until/);
  expect(headings).toContain('What changed');
  const changes = within(screen.getByRole('heading', { name: 'What changed' }).parentElement as HTMLElement);
  expect(changes.getAllByRole('listitem').length).toBeGreaterThan(0);
  expect(document.querySelector('s')).toBeInTheDocument();
  expect(screen.getByRole('link', { name: 'See the new week' })).toHaveAttribute('href', '/week');
});

it('asks once about a value that nobody expected, beside the way to correct it', async () => {
  const server = fakeTestServer(sheet);
  await openTest(sheet, { kind: 'quick' });
  await quickCheck();
  const doubt = { quantity: 'freeChlorine', measured: 12, low: 2, high: 4, takenAt: sheet.now } as const;
  server.become({ ...sheet, questioned: [doubt], unrecorded: true });
  await user.click(save());
  await screen.findByText('Test saved');
  expect(screen.getAllByText(/^Free chlorine of 12\.0 is far from the 2\.0 to 4\.0 mg\/L/)).toHaveLength(1);
  expect(screen.getAllByText(/^There is more chlorine than can be left/)).toHaveLength(1);
  await user.click(screen.getByRole('button', { name: 'Correct this test' }));
  expect(await screen.findByRole('button', { name: 'Save the correction' })).toBeInTheDocument();
});

it('corrects a value of the test that was just saved', async () => {
  const server = fakeTestServer(sheet);
  await openTest(sheet, { kind: 'quick' });
  await quickCheck();
  await user.click(save());
  await user.click(await screen.findByRole('button', { name: 'Correct a value' }));
  await tap('pH', '7.8');
  await user.click(screen.getByRole('button', { name: 'Save the correction' }));
  await screen.findByText('Test saved');
  expect(server.stored()).toHaveLength(1);
  expect(server.stored()[0]?.values.pH).toBe(7.8);
});

it('sends what the water looks like', async () => {
  const server = fakeTestServer(sheet);
  await openTest(sheet, { kind: 'quick' });
  await quickCheck();
  await user.click(screen.getByRole('radio', { name: 'cloudy' }));
  expect(screen.getByText(/Nobody in until the bottom drain is plainly visible/)).toBeInTheDocument();
  await user.click(save());
  await waitFor(() => expect(server.stored()[0]?.look).toBe('cloudy'));
});

it('tells a viewer in words why nothing can be entered', async () => {
  fakeTestServer(sheet);
  await openTest(sheet, { role: 'viewer' });
  expect(screen.getByText(/Tests are entered by owners and caretakers/)).toBeInTheDocument();
  expect(screen.queryByRole('button')).toBeNull();
  expect(screen.queryByRole('radio')).toBeNull();
});
