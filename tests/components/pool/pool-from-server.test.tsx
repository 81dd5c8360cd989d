import { act, screen } from '@testing-library/react';
import { afterEach, expect, it, vi } from 'vitest';
import { PoolProfile } from '@/components/pool/pool-profile';
import { type SetupState, setupStateSchema } from '@/lib/schemas/pool-profile';
import { fromServer } from '@/tests/support/from-server';
import { enteredSize, setupAnswers } from '@/tests/support/setup-answers';
import { aLearntPool } from './a-learnt-pool';
import { fakePoolServer } from './fake-pool-server';
import { household } from './render-step';

afterEach(() => {
  vi.unstubAllGlobals();
  window.localStorage.clear();
});

async function described(): Promise<SetupState> {
  const size = { step: 'size', answers: { ...enteredSize, volume: 68, unit: 'm3', sure: true } } as const;
  const { answer } = fakePoolServer(setupAnswers.map((step) => (step.step === 'size' ? size : step)));
  return setupStateSchema.parse(await (await answer('/api/pool')).json());
}

async function drawn() {
  const initial = { setup: await described(), shelf: [], learnt: aLearntPool() };
  return fromServer(<PoolProfile household={household} mayForget initial={initial} />);
}

it('is read as it came, and asks for nothing', async () => {
  const { place, asked, differences, listen } = await drawn();
  const said = ['It behaves as if it held 71 m³.', 'Loses about 1.4 mg/L', 'What still guesses'];
  for (const words of said) expect(place).toHaveTextContent(words);
  // The bars are drawn for the room there is, which the server does not know.
  expect(place).not.toHaveTextContent('learnt: 1.2 to 1.5');
  await listen();
  for (const words of said) expect(place).toHaveTextContent(words);
  expect(await screen.findByText('learnt: 1.2 to 1.5')).toBeInTheDocument();
  expect(asked).toEqual([]);
  expect(differences).toEqual([]);
});

it('takes up the measures that this device was switched to, once anybody listens', async () => {
  const name = `wadewell.measures.${household.id}`;
  window.localStorage.setItem(name, JSON.stringify({ over: 'metric', system: 'us' }));
  const { place, differences, listen } = await drawn();
  expect(place).toHaveTextContent('It behaves as if it held 71 m³.');
  await listen();
  await act(async () => undefined);
  expect(place).toHaveTextContent('It behaves as if it held 18800 US gal.');
  expect(differences).toEqual([]);
});

it.each([
  ['chosen over other measures', { over: 'us', system: 'us' }],
  ['garbled', { over: 'metric', system: 'furlongs' }],
])('keeps to the household’s where what the device kept is %s', async (_what, kept) => {
  window.localStorage.setItem(`wadewell.measures.${household.id}`, JSON.stringify(kept));
  const { place, listen } = await drawn();
  await listen();
  expect(place).toHaveTextContent('It behaves as if it held 71 m³.');
});
