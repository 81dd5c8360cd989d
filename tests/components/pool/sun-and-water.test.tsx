import { fireEvent, screen, waitFor } from '@testing-library/react';
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

const choose = (name: string | RegExp) => user.click(screen.getByRole('radio', { name }));
const slide = (name: string | RegExp, hour: number) =>
  fireEvent.change(screen.getByRole('slider', { name }), { target: { value: `${hour}` } });

it('takes a place typed from a map, minus sign and comma included, to a tenth of a degree', async () => {
  const server = fakePoolServer(setupAnswers.slice(0, 3));
  await openStep('sun');
  fill('Latitude', '40,4168');
  fill('Longitude', '-3.7038');
  expect(screen.getByRole('radio', { name: 'W' })).toBeChecked();
  await choose('none');
  await user.click(next(/Next: water, equipment/));
  await waitFor(() => expect(server.sent).toHaveLength(1));
  expect(server.sent[0]).toMatchObject({
    answers: { latitude: 40.4, longitude: -3.7, timeZone: 'Europe/Madrid', sunExposure: 1, cover: 'none' },
  });
});

it('makes less sun of fewer hours, and the midday ones count most', async () => {
  const server = fakePoolServer(setupAnswers.slice(0, 3));
  await openStep('sun');
  fill('Latitude', '40.4');
  fill('Longitude', '3.7');
  await choose('W');
  await choose('none');
  slide('Direct sun begins', 12);
  slide('Direct sun ends', 18);
  expect(screen.getAllByText('6 h').length).toBeGreaterThan(0);
  await user.click(next(/Next: water, equipment/));
  await waitFor(() => expect(server.sent).toHaveLength(1));
  const exposure = (server.sent[0] as { answers: { sunExposure: number } }).answers.sunExposure;
  // Six of fifteen hours of daylight, but most of the ultraviolet light of the day.
  expect(exposure).toBeGreaterThan(0.7);
  expect(exposure).toBeLessThan(0.95);
});

it('notices a place on the wrong side of Greenwich', async () => {
  fakePoolServer(setupAnswers.slice(0, 3));
  await openStep('sun', { timeZone: 'America/New_York' as never });
  fill('Latitude', '28.3');
  fill('Longitude', '81.4');
  expect(screen.getByText(/do not go together/)).toBeInTheDocument();
  await user.click(screen.getByRole('button', { name: 'It lies in the west' }));
  expect(screen.queryByText(/do not go together/)).toBeNull();
});

it('says in words when there is no such time zone', async () => {
  const server = fakePoolServer(setupAnswers.slice(0, 3));
  await openStep('sun');
  fill('Time zone', 'Madrid');
  await user.click(next(/Next: water, equipment/));
  expect(field('Time zone')).toHaveAccessibleDescription(/There is no time zone of this name/);
  expect(field('Latitude')).toHaveAccessibleDescription(/Write the latitude/);
  expect(server.sent).toEqual([]);
});

it('asks for the label of a feeder and leaves out what is not known', async () => {
  const server = fakePoolServer(setupAnswers.slice(0, 4));
  await openStep('water');
  await choose('a feeder');
  await user.click(screen.getByRole('checkbox', { name: 'strips' }));
  await user.click(next(/Next: the shelf/));
  expect(screen.getByText(/only the same one may go in/)).toBeInTheDocument();
  expect(server.sent).toEqual([]);
  await choose('nothing yet');
  fill('Hardness', '120,5');
  await user.click(next(/Next: the shelf/));
  await waitFor(() => expect(server.sent).toHaveLength(1));
  expect(server.sent[0]).toMatchObject({
    answers: {
      pump: [{ from: '08:00', to: '16:00' }],
      feeder: { kind: 'none' },
      fillWater: { calciumHardness: 120.5 },
      testMethods: ['strip'],
    },
  });
});

it('lets the pump run over midnight', async () => {
  const server = fakePoolServer(setupAnswers.slice(0, 4));
  await openStep('water');
  slide(/starts/, 22);
  slide(/stops/, 6.5);
  expect(screen.getAllByText('8½ h').length).toBeGreaterThan(0);
  await choose('nothing yet');
  await user.click(screen.getByRole('checkbox', { name: 'a drop kit' }));
  await user.click(next(/Next: the shelf/));
  await waitFor(() => expect(server.sent).toHaveLength(1));
  expect(server.sent[0]).toMatchObject({ answers: { pump: [{ from: '22:00', to: '06:30' }] } });
});
