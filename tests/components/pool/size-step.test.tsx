import { screen, waitFor, within } from '@testing-library/react';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { setupAnswers } from '@/tests/support/setup-answers';
import { fakePoolServer } from './fake-pool-server';
import { field, fill, next, openStep, user } from './render-step';
import { router } from './fake-router';

vi.mock('next/navigation', () => import('./fake-router'));

const scope = setupAnswers.slice(0, 1);

beforeEach(() => {
  localStorage.clear();
  router.push.mockReset();
});
afterEach(() => vi.unstubAllGlobals());

const question = () => screen.queryByRole('group', { name: 'Take care' });
const choose = (name: string) => user.click(screen.getByRole('radio', { name }));

it.each([
  ['m³', 'be 7 Olympic pools'],
  ['litres', 'a rare size for a garden pool'],
])('asks back when 18,000 is said to be %s, and goes on only after an answer', async (unit, words) => {
  const server = fakePoolServer(scope);
  await openStep('size');
  fill('Volume', '18000');
  await choose(unit);
  await choose('on paper, or metered');
  expect(question()).toHaveTextContent(words);
  expect(question()).toHaveTextContent('Did you mean US gallons?');

  const button = next(/Next: the lining/);
  expect(button).toHaveAttribute('aria-disabled', 'true');
  expect(button).toHaveAccessibleDescription('Waiting for your answer above');
  await user.click(button);
  expect(server.sent).toEqual([]);

  await user.click(screen.getByRole('button', { name: 'Yes, 18000 US gallons: 68 m³' }));
  expect(question()).toBeNull();
  expect(screen.getByRole('radio', { name: 'US gallons' })).toBeChecked();
  await user.click(next(/Next: the lining/));
  await waitFor(() => expect(router.push).toHaveBeenCalledWith('/first-run/lining'));
  expect(server.sent).toMatchObject([{ step: 'size', answers: { how: 'entered', volume: 18000, unit: 'us-gal' } }]);
});

it('takes 18,000 litres when somebody says that they are litres', async () => {
  const server = fakePoolServer(scope);
  await openStep('size');
  fill('Volume', '18000');
  await choose('litres');
  await choose('a guess');
  await user.click(screen.getByRole('button', { name: 'No, it is litres' }));
  await user.click(next(/Next: the lining/));
  await waitFor(() => expect(server.sent).toHaveLength(1));
  expect(server.sent[0]).toMatchObject({ answers: { volume: 18000, unit: 'L', unitConfirmed: true, sure: false } });
});

it('does not take 18,000 m3 even when somebody insists', async () => {
  const server = fakePoolServer(scope);
  await openStep('size');
  fill('Volume', '18000');
  await choose('on paper, or metered');
  await user.click(screen.getByRole('button', { name: 'No, it is m³' }));
  expect(field('Volume')).toHaveAccessibleDescription(/holds 0.2 to 1000 cubic metres/);
  await user.click(next(/Next: the lining/));
  expect(server.sent).toEqual([]);
});

it('asks again when the figure is changed after an answer', async () => {
  fakePoolServer(scope);
  await openStep('size');
  fill('Volume', '18000');
  await choose('litres');
  await user.click(screen.getByRole('button', { name: 'No, it is litres' }));
  expect(question()).toBeNull();
  fill('Volume', '16000');
  expect(question()).not.toBeNull();
});

it('does not ask about everyday pools', async () => {
  fakePoolServer(scope);
  await openStep('size');
  fill('Volume', '68');
  expect(question()).toBeNull();
  expect(screen.getAllByText('68 m³').length).toBeGreaterThan(0);
});

it('works the volume out from shape and depths, typed with a comma or a point', async () => {
  const server = fakePoolServer(scope);
  await openStep('size');
  await choose('Draw it');
  fill('Length', '10,00');
  fill('Width', '5.0');
  fill('Shallow end', '1,12');
  fill('Deep end', '1.6');
  // 10 x 5 x (1.12 + 1.60) / 2, the pool of the picture.
  expect(screen.getAllByText('68 m³').length).toBeGreaterThan(0);
  expect(
    screen.getByRole('img', { name: /rectangle, length 10 m, width 5 m, from 1.12 m to 1.6 m deep/ }),
  ).toBeVisible();
  await user.click(next(/Next: the lining/));
  await waitFor(() => expect(server.sent).toHaveLength(1));
  expect(server.sent[0]).toEqual({
    step: 'size',
    answers: {
      how: 'measured',
      outline: { shape: 'rectangle', length: 10, width: 5 },
      floor: { floor: 'slope', shallow: 1.12, deep: 1.6 },
    },
  });
});

it('says at each field what is missing, and sends nothing', async () => {
  const server = fakePoolServer(scope);
  await openStep('size');
  await choose('Draw it');
  fill('Length', 'ten');
  fill('Shallow end', '2');
  fill('Deep end', '1');
  await user.click(next(/Next: the lining/));
  expect(field('Length')).toHaveAccessibleDescription('Write the length.');
  expect(field('Width')).toHaveAccessibleDescription('Write the width.');
  expect(field('Deep end')).toHaveAccessibleDescription(/at least as deep/);
  expect(server.sent).toEqual([]);
});

it('carries what was typed from metres to feet and back', async () => {
  fakePoolServer(scope);
  await openStep('size');
  await choose('Draw it');
  fill('Length', '10');
  fill('Shallow end', '1.12');
  const measures = (name: string) =>
    within(screen.getAllByRole('group', { name: 'Measures' })[0] as HTMLElement).getByRole('radio', { name });
  await user.click(measures('US'));
  expect(field('Length')).toHaveValue('32.81');
  // Written down again in feet: the way back has to cope with the rounding.
  fill('Width', '16.4');
  await user.click(measures('Metric'));
  expect(field('Length')).toHaveValue('10');
  expect(field('Shallow end')).toHaveValue('1.12');
  expect(field('Width')).toHaveValue('5');
});

it('comes back after a reload with everything that was typed', async () => {
  fakePoolServer(scope);
  const { unmount } = await openStep('size');
  fill('Volume', '68,5');
  await choose('a guess');
  unmount();
  await openStep('size');
  expect(field('Volume')).toHaveValue('68,5');
  expect(screen.getByRole('radio', { name: 'a guess' })).toBeChecked();
});

it('shows what was saved elsewhere since, and not an old draft of this device', async () => {
  fakePoolServer(scope);
  const { unmount } = await openStep('size');
  fill('Volume', '50');
  unmount();
  fakePoolServer(setupAnswers.slice(0, 2));
  await openStep('size');
  expect(field('Volume')).toHaveValue('20000');
  expect(screen.getByRole('radio', { name: 'US gallons' })).toBeChecked();
});
