import { screen, waitFor } from '@testing-library/react';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { enteredSize, scopeAnswers, setupAnswers } from '@/tests/support/setup-answers';
import { fakePoolServer } from './fake-pool-server';
import { fill, next, openStep, user } from './render-step';
import { router } from './fake-router';

vi.mock('next/navigation', () => import('./fake-router'));

beforeEach(() => {
  localStorage.clear();
  router.push.mockReset();
  router.replace.mockReset();
});
afterEach(() => vi.unstubAllGlobals());

const choose = (name: string | RegExp) => user.click(screen.getByRole('radio', { name }));
const tick = (name: RegExp) => user.click(screen.getByRole('checkbox', { name }));

it('starts with the scope questions and asks for what was left out', async () => {
  const server = fakePoolServer();
  await openStep('scope');
  await user.click(next(/Next: its size/));
  expect(screen.getByText('Choose what keeps the pool clean.')).toBeInTheDocument();
  expect(server.sent).toEqual([]);
  await choose(/^Chlorine/);
  await choose('a pool');
  await tick(/^It is filled from a well/);
  expect(screen.getByText(/Do not raise chlorine hard before a metal test/)).toBeInTheDocument();
  await tick(/^I do: I am an adult/);
  await user.click(next(/Next: its size/));
  await waitFor(() => expect(router.push).toHaveBeenCalledWith('/first-run/size'));
  expect(server.sent).toEqual([{ step: 'scope', answers: { ...scopeAnswers, wellWater: true } }]);
});

// care.md 1, row by row.
it.each([
  [
    /^Bromine/,
    undefined,
    'Wadewell is for chlorine only.',
    'Mixing systems can be dangerous. Ask the maker of your system.',
  ],
  [
    /^Biguanide/,
    undefined,
    'Wadewell is for chlorine only.',
    'Mixing systems can be dangerous. Ask the maker of your system.',
  ],
  [
    /^Copper or silver/,
    undefined,
    'Wadewell is for chlorine only.',
    'Mixing systems can be dangerous. Ask the maker of your system.',
  ],
  [/^I do not know/, undefined, 'First find out what keeps the pool clean.', 'Until you know, add nothing'],
  [/^Chlorine/, /^It is indoors/, 'Not for an indoor pool, or one under a roof.', 'No stabilizer belongs there'],
  [
    /^Chlorine/,
    /^New plaster or fresh paint/,
    'Not yet: the surface is new.',
    'start-up belongs to the builder. Come back with their values.',
  ],
  [/^Chlorine/, /^Others than one family/, 'Public rules apply to this pool.', 'ask the health department'],
  [/^Chlorine/, /^It is a natural or planted pool/, 'Not for a natural or planted pool.', 'Plants keep such water'],
])('stops in words for %s %s', async (system, fact, title, words) => {
  fakePoolServer();
  await openStep('scope');
  await choose(system);
  await choose('a pool');
  if (fact) await tick(fact);
  await user.click(next(/Next: its size/));
  await screen.findByRole('heading', { name: 'Wadewell is not for this pool.' });
  expect(screen.getByText(title)).toBeInTheDocument();
  expect(screen.getByText(words, { exact: false })).toBeInTheDocument();
  expect(router.push).not.toHaveBeenCalled();
});

it('stops for a hot tub, and goes on when the answer was wrong', async () => {
  fakePoolServer();
  await openStep('scope');
  await choose(/^Chlorine/);
  await choose('a hot tub');
  await user.click(next(/Next: its size/));
  await screen.findByText('Not for a hot tub or a swim spa.');
  await user.click(screen.getByRole('button', { name: 'Change an answer' }));
  await choose('a pool with a spa');
  await user.click(next(/Next: its size/));
  await waitFor(() => expect(router.push).toHaveBeenCalledWith('/first-run/size'));
});

it('says again why it stopped when the page is opened anew', async () => {
  fakePoolServer([{ step: 'scope', answers: { ...scopeAnswers, system: 'bromine' } }]);
  await openStep('size');
  expect(screen.getByText('Wadewell is for chlorine only.')).toBeInTheDocument();
});

it('stops under 2 m3: empty after every day of use', async () => {
  fakePoolServer(setupAnswers.slice(0, 1));
  await openStep('size');
  fill('Volume', '1.5');
  await choose('a guess');
  await user.click(next(/Next: the lining/));
  expect(await screen.findByText('A pool this small is emptied, not dosed.')).toBeInTheDocument();
  expect(screen.getByText(/empty it after every day of use/)).toBeInTheDocument();
});

it('says before saving that a pool under 10 m3 is kept for the record only', async () => {
  fakePoolServer(setupAnswers.slice(0, 1));
  await openStep('size');
  fill('Volume', '8,5');
  expect(screen.getByText(/Wadewell keeps readings and cautions. No tablets, no plan./)).toBeInTheDocument();
});

it('goes on with a salt generator, which is kept for the record only', async () => {
  const server = fakePoolServer();
  await openStep('scope');
  await choose(/^A salt chlorine generator/);
  await choose('a pool');
  await user.click(next(/Next: its size/));
  await waitFor(() => expect(router.push).toHaveBeenCalledWith('/first-run/size'));
  expect(server.sent).toHaveLength(1);
});

it('leads to the step that comes next when a later one is opened', async () => {
  fakePoolServer(setupAnswers.slice(0, 2));
  void openStep('water').catch(() => undefined);
  await waitFor(() => expect(router.replace).toHaveBeenCalledWith('/first-run/lining'));
});

it('opens an earlier step with what was answered', async () => {
  fakePoolServer(setupAnswers);
  await openStep('scope');
  expect(screen.getByRole('radio', { name: /^Chlorine/ })).toBeChecked();
  expect(screen.getByRole('checkbox', { name: /^I do: I am an adult/ })).toBeChecked();
});

it('sends a step once, however often it is pressed', async () => {
  const server = fakePoolServer(setupAnswers.slice(0, 2));
  await openStep('lining');
  await choose(/^Tile/);
  expect(screen.getAllByText('200 to 400').length).toBeGreaterThan(0);
  await user.dblClick(next(/Next: sun and place/));
  await waitFor(() => expect(router.push).toHaveBeenCalled());
  expect(server.sent).toHaveLength(1);
});

it('keeps everything on the page when it could not be saved', async () => {
  const server = fakePoolServer(setupAnswers.slice(0, 2));
  await openStep('lining');
  await choose(/^Tile/);
  server.answer.mockRejectedValueOnce(new TypeError('offline'));
  await user.click(next(/Next: sun and place/));
  expect(await screen.findByRole('alert')).toHaveTextContent(
    'This step is not saved yet. What you typed is still here.',
  );
  expect(screen.getByRole('radio', { name: /^Tile/ })).toBeChecked();
  expect(router.push).not.toHaveBeenCalled();
});

it('ends at the week sheet', async () => {
  const server = fakePoolServer(setupAnswers.slice(0, 6));
  await openStep('label');
  await choose(/^It does not say/);
  await user.click(next(/Draw my first week/));
  await waitFor(() => expect(router.push).toHaveBeenCalledWith('/week'));
  expect(server.sent).toEqual([setupAnswers[6]]);
});

it('goes back to the profile after a correction', async () => {
  fakePoolServer(setupAnswers);
  await openStep('lining', { place: 'profile' });
  await choose(/^Sheet liner/);
  await user.click(next(/Save/));
  await waitFor(() => expect(router.push).toHaveBeenCalledWith('/pool'));
});

it('tells those who may not change the pool who does', async () => {
  fakePoolServer([
    { step: 'scope', answers: scopeAnswers },
    { step: 'size', answers: enteredSize },
  ]);
  await openStep('size', { mayChange: false as never });
  expect(screen.getByRole('heading', { name: 'An owner describes the pool.' })).toBeInTheDocument();
  expect(screen.queryByRole('button')).toBeNull();
});
