import { screen, waitFor } from '@testing-library/react';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { setupAnswers } from '@/tests/support/setup-answers';
import { fakePoolServer } from './fake-pool-server';
import { field, fill, next, openStep, user } from './render-step';
import { router } from './fake-router';

vi.mock('next/navigation', () => import('./fake-router'));

beforeEach(() => {
  localStorage.clear();
  router.push.mockReset();
});
afterEach(() => vi.unstubAllGlobals());

const upToShelf = setupAnswers.slice(0, 5);
const choose = (name: string | RegExp) => user.click(screen.getByRole('radio', { name }));
const keep = () => user.click(screen.getByRole('button', { name: 'Keep it' }));

async function startProduct(ingredient: string) {
  await user.click(await screen.findByRole('button', { name: /Add a product|Another active/ }));
  await user.click(screen.getByRole('combobox', { name: 'Active ingredient, as printed' }));
  await user.click(await screen.findByRole('option', { name: ingredient }));
}

it('keeps dry chlorine only with the label’s own way: there is no usual one', async () => {
  const server = fakePoolServer(upToShelf);
  await openStep('shelf');
  await startProduct('Calcium hypochlorite');
  await choose('granules or powder');
  fill('Available chlorine', '65');
  fill('Left on the shelf', '2,6');
  const ways = ['dissolve', 'broadcast', 'feeder-only', 'unknown'];
  const chosen = [...document.querySelectorAll<HTMLInputElement>('input[type="radio"]:checked')].map(
    ({ value }) => value,
  );
  expect(chosen.filter((value) => ways.includes(value))).toEqual([]);
  await keep();
  expect(screen.getByText(/Say how the label wants it to go in/)).toBeInTheDocument();
  expect(server.shelf()).toEqual([]);
  await choose(/^Dissolve it first/);
  await keep();
  await waitFor(() => expect(server.shelf()).toHaveLength(1));
  expect(server.shelf()[0]).toMatchObject({
    substance: 'calcium-hypochlorite',
    form: 'granular',
    strength: 65,
    stock: 2600,
    labelWay: 'dissolve',
  });
  expect(await screen.findByText('2.6 kg')).toBeInTheDocument();
});

it('counts tablets and asks what one weighs', async () => {
  const server = fakePoolServer(upToShelf);
  await openStep('shelf');
  await startProduct('Trichloro-s-triazinetrione');
  await choose('tablets or sticks');
  fill('Available chlorine', '90');
  fill('One tablet weighs', '200');
  fill('Left on the shelf', '15');
  await choose(/^Only through its feeder/);
  await keep();
  await waitFor(() => expect(server.shelf()).toHaveLength(1));
  expect(server.shelf()[0]).toMatchObject({ tabletMass: 200, stock: 3000, labelWay: 'feeder-only' });
  expect(await screen.findByText('15 tablets')).toBeInTheDocument();
});

it('asks what the per cent of a liquid counts, and when it was bought', async () => {
  const server = fakePoolServer(upToShelf);
  await openStep('shelf');
  await startProduct('Sodium hypochlorite');
  fill('Strength', '12,5');
  fill('Left on the shelf', '5');
  await keep();
  expect(screen.getByText('Choose what the per cent on the label counts.')).toBeInTheDocument();
  expect(screen.getByText(/Say when it was bought/)).toBeInTheDocument();
  await choose('sodium hypochlorite, by weight');
  await user.type(screen.getByLabelText('Bought on'), '2026-05-18');
  await keep();
  await waitFor(() => expect(server.shelf()).toHaveLength(1));
  // sources.md: 12.5 % by weight is about 14 trade per cent.
  expect(server.shelf()[0]?.strength).toBeCloseTo(14.2, 1);
  expect(server.shelf()[0]).toMatchObject({ stock: 5000, boughtOn: '2026-05-18' });
});

it('refuses a strength that nothing has, and takes the rounding of labels', async () => {
  const server = fakePoolServer(upToShelf);
  await openStep('shelf');
  await startProduct('Sodium dichloro-s-triazinetrione');
  await choose('granules or powder');
  fill('Available chlorine', '65');
  fill('Left on the shelf', '1');
  await choose(/^Pour it straight in/);
  await keep();
  expect(field('Available chlorine')).toHaveAccessibleDescription(/Nothing of this kind can be that strong/);
  fill('Available chlorine', '56');
  await keep();
  await waitFor(() => expect(server.shelf()).toHaveLength(1));
  expect(server.shelf()[0]?.strength).toBe(55.4);
});

it('brings back a product that was half written when the page was left', async () => {
  fakePoolServer(upToShelf);
  const { unmount } = await openStep('shelf');
  await startProduct('Hydrochloric acid');
  fill('Strength', '31,4');
  unmount();
  await openStep('shelf');
  expect(field('Strength')).toHaveValue('31,4');
  expect(next(/Next: what the label says/)).toHaveAccessibleDescription('Keep or leave the product above first');
});

it('warns of a product whose label’s way nobody found', async () => {
  fakePoolServer(upToShelf, [
    {
      id: 'gran',
      form: 'granular',
      substance: 'calcium-hypochlorite',
      strength: 65,
      alkali: 0,
      labelWay: 'unknown',
      stock: 1000,
      storedAt: 25,
    },
  ]);
  await openStep('shelf');
  expect(await screen.findByText('No dose: the label’s way is not known.')).toBeInTheDocument();
  expect(screen.getAllByText('none can be planned with yet').length).toBeGreaterThan(0);
});
