import { act, fireEvent, screen, waitFor } from '@testing-library/react';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { fakeTestServer } from './fake-test-server';
import { freshSheet, key, openTest, save, screenOf, tap, user } from './render-test';

const sheet = freshSheet();

beforeEach(() => {
  localStorage.clear();
  screenOf('phone');
});
afterEach(() => {
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

it('takes a quick check in three taps', async () => {
  const server = fakeTestServer(sheet);
  await openTest(sheet, { kind: 'quick' });
  await tap('Free chlorine', '3');
  await tap('pH', '7.2');
  await user.click(save());
  await screen.findByText('Test saved');
  expect(server.stored()).toMatchObject([{ kind: 'quick', method: 'strip', values: { freeChlorine: 3, pH: 7.2 } }]);
});

it('takes a full strip in seven taps, keeps a seam as a range and works used-up chlorine out', async () => {
  const server = fakeTestServer(sheet);
  await openTest(sheet);
  await tap('Total chlorine', '5');
  await tap('Free chlorine', 'between 3 and 5');
  await tap('pH', '7.8');
  await tap('Total alkalinity', '80');
  await tap('Stabilizer', '30');
  await tap('Hardness', '250');
  expect(screen.getByText('between 3 and 5 mg/L')).toBeInTheDocument();
  await user.click(save());
  await screen.findByText('Test saved');
  expect(server.stored()[0]?.values).toEqual({
    freeChlorine: { low: 3, high: 5 },
    combinedChlorine: { low: 0, high: 2 },
    pH: 7.8,
    totalAlkalinity: 80,
    cyanuricAcid: 30,
    calciumHardness: 250,
  });
});

it('calls used-up chlorine about none where both pads read alike', async () => {
  const server = fakeTestServer(sheet);
  await openTest(sheet);
  await tap('Total chlorine', 'between 1 and 3');
  await tap('Free chlorine', 'between 1 and 3');
  await tap('pH', '7.2');
  expect(screen.getByText(/Here both read alike, so about none/)).toBeInTheDocument();
  await user.click(save());
  await screen.findByText('Test saved');
  expect(server.stored()[0]?.values.combinedChlorine).toBe(0);
});

it('leaves an untouched pad out, and takes a pad out again at a second tap', async () => {
  const server = fakeTestServer(sheet);
  await openTest(sheet);
  await tap('Free chlorine', '3');
  await tap('pH', '7.2');
  await tap('Total alkalinity', '120');
  await tap('Total alkalinity', '120');
  await user.click(save());
  await screen.findByText('Test saved');
  expect(server.stored()[0]?.values).toEqual({ freeChlorine: 3, pH: 7.2 });
});

it('has nothing chosen at first, and says why it cannot be saved', async () => {
  const server = fakeTestServer(sheet);
  await openTest(sheet);
  expect(document.querySelectorAll('ol input:checked')).toHaveLength(0);
  expect(save()).toHaveAttribute('aria-disabled', 'true');
  expect(save()).toHaveAccessibleDescription('nothing read yet');
  await tap('Free chlorine', '3');
  expect(save()).toHaveAccessibleDescription('a full test needs free chlorine and pH');
  await user.click(save());
  expect(server.sent()).toEqual([]);
});

it('does not take less total than free chlorine', async () => {
  fakeTestServer(sheet);
  await openTest(sheet);
  await tap('Total chlorine', '1');
  await tap('Free chlorine', '3');
  await tap('pH', '7.2');
  expect(screen.getByRole('alert')).toHaveTextContent('Total chlorine holds the free chlorine');
  expect(save()).toHaveAccessibleDescription('one question open');
  await tap('Total chlorine', '3');
  expect(screen.queryByRole('alert')).toBeNull();
});

it('walks from a step to the seam beside it with the keyboard', async () => {
  fakeTestServer(sheet);
  await openTest(sheet);
  // The browser moves between radios in the order in which they stand on the page.
  const keys = [...(key('pH', '7.2').closest('fieldset')?.querySelectorAll('input') ?? [])];
  expect(new Set(keys.map(({ name }) => name)).size).toBe(1);
  expect(keys.map(({ labels }) => labels?.[0]?.textContent).slice(0, 4)).toEqual([
    '6.2',
    'between 6.2 and 6.8',
    '6.8',
    'between 6.8 and 7.2',
  ]);
  expect(keys).toHaveLength(9);
  fireEvent.keyDown(key('pH', '7.2'), { key: 'Delete' });
  expect(key('pH', '7.2')).not.toBeChecked();
});

it('counts fifteen seconds down and says when to read', async () => {
  fakeTestServer(sheet);
  await openTest(sheet);
  vi.useFakeTimers({ toFake: ['setInterval', 'clearInterval', 'performance'] });
  fireEvent.click(screen.getByRole('button', { name: 'Start the 15 seconds' }));
  act(() => {
    vi.advanceTimersByTime(10_000);
  });
  expect(screen.getByText('Hold it level, 5 seconds more')).toBeInTheDocument();
  act(() => {
    vi.advanceTimersByTime(4_800);
  });
  expect(screen.getByText('Hold it level, 1 second more')).toBeInTheDocument();
  act(() => {
    vi.advanceTimersByTime(400);
  });
  expect(screen.getByText('Now read it')).toBeInTheDocument();
});

it('keeps the steps and the order of the bottle on this device', async () => {
  const server = fakeTestServer(sheet);
  const { unmount } = await openTest(sheet);
  await user.click(screen.getByRole('button', { name: 'Pads and steps of your bottle' }));
  await user.click(screen.getByRole('button', { name: 'Move pH up' }));
  await user.click(screen.getByRole('checkbox', { name: 'Hardness' }));
  const steps = screen.getByRole('textbox', { name: 'Steps printed for pH' });
  fireEvent.change(steps, { target: { value: '7 6,4' } });
  await user.click(screen.getByRole('button', { name: 'Keep for this bottle' }));
  expect(steps).toHaveAccessibleDescription('Write the steps from the lowest to the highest.');
  fireEvent.change(steps, { target: { value: '6,4 7,0 7.6; 8.2' } });
  await user.click(screen.getByRole('button', { name: 'Keep for this bottle' }));
  unmount();
  await openTest(sheet);
  const names = [...document.querySelectorAll('ol legend span:first-child')].map(({ textContent }) => textContent);
  expect(names).toEqual(['Total chlorine', 'pH', 'Free chlorine', 'Total alkalinity', 'Stabilizer']);
  await tap('pH', 'between 7.0 and 7.6');
  await tap('Free chlorine', '3');
  await user.click(save());
  await waitFor(() => expect(server.stored()[0]?.values.pH).toEqual({ low: 7, high: 7.6 }));
});
