import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { render, waitFor } from '@testing-library/react';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { DeviceKeeper } from '@/lib/client/device-keeper';
import { type DeviceOwner, settleDevice } from '@/lib/client/device-owner';
import { fetchJson } from '@/lib/client/fetch-json';
import { forgetDevice, somethingWaits } from '@/lib/client/forget-device';

const ines = 'ines';
const [larches, mill] = ['larches', 'mill'];
const owner = (households: { id: string; role: 'owner' | 'caretaker' | 'viewer' }[], personId = ines): DeviceOwner => ({
  personId,
  households,
});
const both = owner([
  { id: larches, role: 'owner' },
  { id: mill, role: 'caretaker' },
]);

const unsent = [
  `wadewell.unsent-readings.${ines}.${larches}`,
  `wadewell.unsent-ticks.${ines}`,
  `wadewell.test.${ines}.${larches}`,
];
const ofTheHousehold = [`wadewell.pool.size.${larches}`, `wadewell.measures.${larches}`, `wadewell.bottle.${larches}`];
const kept = () =>
  Object.keys(localStorage)
    .filter((name) => name !== 'wadewell-owner')
    .toSorted();

let deleted: string[];
beforeEach(() => {
  localStorage.clear();
  for (const name of [...unsent, ...ofTheHousehold]) localStorage.setItem(name, '["something"]');
  localStorage.setItem('of another program', 'stays');
  sessionStorage.setItem('wadewell.sheet', '1');
  deleted = [];
  vi.stubGlobal('caches', {
    keys: () => Promise.resolve(['wadewell-emergency-card']),
    delete: (name: string) => Promise.resolve(deleted.push(`cache ${name}`) > 0),
  });
  vi.stubGlobal('indexedDB', {
    databases: () => Promise.resolve([{ name: 'wadewell' }]),
    deleteDatabase: (name: string) => deleted.push(`database ${name}`),
  });
});
afterEach(() => vi.unstubAllGlobals());

const everything = [...unsent, ...ofTheHousehold, 'of another program'].toSorted();
const whatWaits = [...unsent, 'of another program'].toSorted();

it('forgets all that a person and a household left here, and nothing of another program', async () => {
  expect(somethingWaits()).toBe(true);
  await forgetDevice();
  expect(kept()).toEqual(['of another program']);
  expect(sessionStorage.length).toBe(0);
  expect(deleted.toSorted()).toEqual(['cache wadewell-emergency-card', 'database wadewell']);
  expect(somethingWaits()).toBe(false);
});

it('is not kept from leaving by a browser that refuses', async () => {
  vi.stubGlobal('caches', { keys: () => Promise.reject(new Error('refused')) });
  vi.stubGlobal('indexedDB', { databases: () => Promise.reject(new Error('refused')) });
  await expect(forgetDevice()).resolves.toBeUndefined();
  expect(kept()).toEqual(['of another program']);
});

it.each<[string, DeviceOwner, string[]]>([
  ['the same person comes back', both, everything],
  ['they joined another household', owner([...both!.households, { id: 'third', role: 'viewer' }]), everything],
  [
    'their role rose',
    owner([
      { id: larches, role: 'owner' },
      { id: mill, role: 'owner' },
    ]),
    everything,
  ],
  ['they were taken out of one household of two', owner([{ id: mill, role: 'caretaker' }]), whatWaits],
  ['they belong nowhere', owner([]), ['of another program']],
  [
    'their role fell',
    owner([
      { id: larches, role: 'caretaker' },
      { id: mill, role: 'caretaker' },
    ]),
    whatWaits,
  ],
  ['somebody else uses the device', owner(both!.households as never, 'otto'), ['of another program']],
  ['they were signed out', null, whatWaits],
])('when %s', async (_, now, left) => {
  await settleDevice(both);
  expect(kept()).toEqual(everything);
  await settleDevice(now);
  expect(kept()).toEqual(left);
});

it('keeps what somebody could not send until they are back, and not for anybody else', async () => {
  await settleDevice(both);
  await settleDevice(null);
  await settleDevice(both);
  expect(kept()).toEqual(whatWaits);
  await settleDevice(null);
  await settleDevice(owner([{ id: larches, role: 'owner' }], 'otto'));
  expect(kept()).toEqual(['of another program']);
});

const answering = (status: number, code: string, households: unknown = []) =>
  vi.fn((address: string) =>
    Promise.resolve(
      address === '/api/households'
        ? Response.json(households)
        : Response.json({ error: { code, message: 'No.', problems: [] } }, { status }),
    ),
  );
const summary = (id: string, role: string) => ({
  ...{ id, name: 'N', role, timeZone: 'Europe/Madrid', unitSystem: 'metric', locale: 'en' },
  ...{ demo: false, current: true, poolCompleted: true },
});

it('forgets, the memory of the page too, when the server no longer knows who is signed in', async () => {
  const client = new QueryClient();
  client.setQueryData(['week'], 'a sheet');
  render(
    <QueryClientProvider client={client}>
      <DeviceKeeper owner={both} />
    </QueryClientProvider>,
  );
  vi.stubGlobal('fetch', answering(401, 'signed-out'));
  await expect(fetchJson('/api/week', { parse: (value) => value })).rejects.toMatchObject({ code: 'signed-out' });
  await waitFor(() => expect(client.getQueryData(['week'])).toBeUndefined());
  expect(kept()).toEqual(whatWaits);
});

it.each([
  ['is taken out', [], ['of another program']],
  ['may simply not do that', [summary('11111111-1111-4111-8111-111111111111', 'viewer')], everything],
])('asks what somebody still is who is refused, and %s', async (_, households, left) => {
  const client = new QueryClient();
  const viewer = owner([{ id: '11111111-1111-4111-8111-111111111111', role: 'viewer' }]);
  render(
    <QueryClientProvider client={client}>
      <DeviceKeeper owner={viewer} />
    </QueryClientProvider>,
  );
  const answer = answering(403, 'not-allowed', households);
  vi.stubGlobal('fetch', answer);
  await expect(fetchJson('/api/rounds', { parse: (value) => value })).rejects.toMatchObject({ code: 'not-allowed' });
  await waitFor(() => expect(answer).toHaveBeenCalledWith('/api/households', expect.anything()));
  await waitFor(() => expect(kept()).toEqual(left));
});
