import { act, fireEvent, screen, waitFor, within } from '@testing-library/react';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { fakeTestServer } from './fake-test-server';
import { field, fill, freshSheet, openTest, save, screenOf, user } from './render-test';

const sheet = freshSheet();

beforeEach(() => {
  localStorage.clear();
  screenOf('desk');
});
afterEach(() => vi.unstubAllGlobals());

const byKit = () => user.click(screen.getByRole('radio', { name: 'Drop kit' }));
const question = (name: string) => screen.queryByRole('group', { name: `Question about ${name}` });

it('takes a drop kit with commas and points, and works used-up chlorine out', async () => {
  const server = fakeTestServer(sheet);
  await openTest(sheet);
  await byKit();
  for (const name of ['Free chlorine', 'pH', 'Total alkalinity', 'Stabilizer', 'Hardness', 'Water temperature'])
    expect(field(name)).toHaveValue('');
  fill('Free chlorine', '3,0');
  fill('Total chlorine', '3.2');
  fill('pH', '7,5');
  fill('Water temperature', '27');
  await user.click(save());
  await screen.findByText('Test saved');
  expect(server.stored()[0]).toMatchObject({
    method: 'drop-kit',
    values: { freeChlorine: 3, combinedChlorine: 0.2, pH: 7.5, temperature: 27 },
  });
});

it('refuses pH 75 and offers 7.5', async () => {
  const server = fakeTestServer(sheet);
  await openTest(sheet);
  await byKit();
  fill('Free chlorine', '3');
  fill('pH', '75');
  expect(field('pH')).toHaveAccessibleDescription('pH runs from 5.0 to 10.5. Did you mean 7.5?');
  expect(field('pH')).toHaveAttribute('aria-invalid', 'true');
  expect(save()).toHaveAccessibleDescription('one question open');
  await user.click(save());
  expect(server.sent()).toEqual([]);
  await user.click(screen.getByRole('button', { name: '7.5, that was meant' }));
  expect(field('pH')).toHaveValue('7.5');
  await user.click(save());
  await waitFor(() => expect(server.stored()[0]?.values.pH).toBe(7.5));
});

it.each([
  ['pH', '76', '7.6'],
  ['pH', '0,74', '7.4'],
  ['Free chlorine', '300', '3.0'],
  ['Total alkalinity', '1200', '120'],
  ['Stabilizer', '4500', '45'],
  ['Water temperature', '80', '27'],
])('offers what was probably meant by %s %s', async (name, typed, meant) => {
  fakeTestServer(sheet);
  await openTest(sheet);
  await byKit();
  fill(name, typed);
  expect(field(name)).toHaveAttribute('aria-invalid', 'true');
  expect(screen.getByRole('button', { name: `${meant}, that was meant` })).toBeInTheDocument();
});

it('asks about what is possible but rare, and takes it after a yes', async () => {
  const server = fakeTestServer(sheet);
  await openTest(sheet);
  await byKit();
  fill('Free chlorine', '3');
  fill('pH', '6.1');
  expect(question('pH')).toHaveTextContent('pH of 6.1 is rare in a garden pool. Is it right?');
  expect(save()).toHaveAttribute('aria-disabled', 'true');
  await user.click(within(question('pH') as HTMLElement).getByRole('button', { name: 'Yes, it is 6.1' }));
  expect(question('pH')).toBeNull();
  await user.click(save());
  await waitFor(() => expect(server.stored()[0]?.values.pH).toBe(6.1));
});

it('asks about nothing while it is being typed', async () => {
  fakeTestServer(sheet);
  await openTest(sheet);
  await byKit();
  await user.type(field('pH'), '75');
  expect(field('pH')).not.toHaveAttribute('aria-invalid');
  await user.tab();
  expect(field('pH')).toHaveAttribute('aria-invalid', 'true');
});

it('says that letters are no number', async () => {
  fakeTestServer(sheet);
  await openTest(sheet);
  await byKit();
  fill('Free chlorine', '1,234.5');
  expect(field('Free chlorine')).toHaveAccessibleDescription('This is no number. Write it like 7.4 or 7,4.');
});

it('moves on by itself on a phone, with keys of its own', async () => {
  screenOf('phone');
  fakeTestServer(sheet);
  await openTest(sheet);
  await byKit();
  expect(field('Free chlorine')).toHaveAttribute('inputmode', 'none');
  expect(screen.queryByRole('group', { name: 'Number keys' })).toBeNull();
  act(() => field('Free chlorine').focus());
  const pad = within(screen.getByRole('group', { name: 'Number keys' }));
  expect(screen.queryByRole('button', { name: 'Save test' })).toBeNull();
  for (const name of ['3', 'decimal sign', '0']) fireEvent.click(pad.getByRole('button', { name }));
  expect(field('Free chlorine')).toHaveValue('3.0');
  await waitFor(() => expect(field('pH')).toHaveFocus());
  for (const name of ['7', 'decimal sign', '4']) fireEvent.click(pad.getByRole('button', { name }));
  expect(field('pH')).toHaveValue('7.4');
  await waitFor(() => expect(field('Total chlorine')).toHaveFocus());
  fireEvent.click(pad.getByRole('button', { name: 'Next' }));
  await waitFor(() => expect(field('Total alkalinity')).toHaveFocus());
  act(() => field('Total alkalinity').blur());
  expect(save()).toBeInTheDocument();
});

it('does not move on past a figure that cannot be right', async () => {
  screenOf('phone');
  fakeTestServer(sheet);
  await openTest(sheet);
  await byKit();
  act(() => field('pH').focus());
  const pad = within(screen.getByRole('group', { name: 'Number keys' }));
  for (const name of ['7', '5', 'Next']) fireEvent.click(pad.getByRole('button', { name }));
  expect(field('pH')).toHaveAccessibleDescription(/Did you mean 7.5\?/);
  expect(field('Total chlorine')).not.toHaveFocus();
});

it('writes a US household’s temperature in its own degrees and sends it in ours', async () => {
  const server = fakeTestServer(sheet);
  await openTest(sheet, { unitSystem: 'us' });
  await byKit();
  fill('Free chlorine', '3');
  fill('pH', '7.5');
  fill('Water temperature', '82');
  await user.click(save());
  await waitFor(() => expect(server.stored()[0]?.values.temperature).toBeCloseTo(27.8, 1));
});

it('dates a test back by the clock of the household, and not into the future', async () => {
  // Now is Wednesday 8 July, 10:20 in Paris.
  const server = fakeTestServer(sheet);
  await openTest(sheet, { kind: 'quick' });
  await byKit();
  fill('Free chlorine', '3');
  fill('pH', '7.4');
  await user.click(screen.getByRole('button', { name: 'Change time' }));
  const time = screen.getByLabelText('Time');
  fireEvent.change(time, { target: { value: '23:00' } });
  expect(screen.getByRole('alert')).toHaveTextContent('A test cannot be later than now.');
  expect(save()).toHaveAttribute('aria-disabled', 'true');
  fireEvent.change(screen.getByLabelText('Day'), { target: { value: '2026-07-07' } });
  expect(screen.queryByRole('alert')).toBeNull();
  await user.click(save());
  await waitFor(() => expect(server.stored()).toHaveLength(1));
  expect(server.stored()[0]?.takenAt).toBe('2026-07-07T23:00:00+02:00');
});
