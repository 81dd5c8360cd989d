import { act, screen } from '@testing-library/react';
import { afterEach, expect, it, vi } from 'vitest';
import { RoundScreen } from '@/components/rounds/round-screen';
import { fromServer } from '@/tests/support/from-server';

afterEach(() => vi.unstubAllGlobals());

const household = {
  ...{ timeZone: 'Europe/Madrid', locale: 'en-GB', unitSystem: 'metric' as const },
  ...{ personName: 'Ines', mayDoRounds: true, mayKeepHouseNotes: true },
};
const round = (
  <RoundScreen
    household={household}
    serverNow={Date.parse('2026-07-11T09:10:00+02:00')}
    initial={{
      rounds: { last: { doneAt: '2026-07-04T09:00:00+02:00', doneBy: 'Ines', exceptions: [] }, cleanPressure: 0.9 },
      visits: [
        { id: '00000000-0000-4000-8000-000000000001', visitedOn: '2026-05-02', note: null, recordedBy: 'Joost' },
      ],
      houseNotes: {
        notes: { professionalName: 'The pool firm', professionalPhone: '+49 (0)30 12-34' },
        ...{ updatedAt: '2026-07-01T09:00:00+02:00', updatedBy: 'Ines' },
      },
    }}
  />
);

it('is read as it came, and asks for nothing', async () => {
  const { place, asked, differences, listen } = fromServer(round);
  const said = [
    'clean it was 0.9 bar; fine up to 1.25 bar',
    'Last round Saturday 4 July',
    'Last visit 2 May 2026',
    'Call The pool firm',
  ];
  for (const words of said) expect(place).toHaveTextContent(words);
  await listen();
  for (const words of said) expect(place).toHaveTextContent(words);
  expect(asked).toEqual([]);
  expect(differences).toEqual([]);
});

it('does what was pressed on a row before anybody listened', async () => {
  const { listen } = fromServer(round);
  act(() => screen.getByRole('button', { name: 'Pump seal: not fine' }).click());
  expect(screen.queryByText('Pump seal: it drips')).toBeNull();
  await listen();
  expect(await screen.findByText('Pump seal: it drips')).toBeInTheDocument();
});
