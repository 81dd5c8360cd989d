import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { RoundScreen } from '@/components/rounds/round-screen';
import words from '@/lib/messages/en/rounds.json';
import type { Rounds } from '@/lib/schemas/round';
import { roundItems } from '@/lib/schemas/round-items';
import { renderWithWords } from '../../support/with-words';

afterEach(() => vi.unstubAllGlobals());

const household = {
  ...{ timeZone: 'Europe/Madrid', locale: 'en-GB', unitSystem: 'metric' as const },
  ...{ personName: 'Ines', mayDoRounds: true, mayKeepHouseNotes: true },
};
const serverNow = Date.parse('2026-07-11T09:10:00+02:00');

async function show(known: Rounds, changes: Partial<Parameters<typeof RoundScreen>[0]['household']> = {}) {
  const sent: unknown[] = [];
  vi.stubGlobal('fetch', (address: string, init?: RequestInit) => {
    if (address === '/api/visits') return Promise.resolve(Response.json([]));
    if (address === '/api/house-notes') return Promise.resolve(Response.json(noNotes));
    if (init?.method === 'POST') sent.push(JSON.parse(String(init.body)));
    return Promise.resolve(Response.json(known));
  });
  renderWithWords(<RoundScreen household={{ ...household, ...changes }} serverNow={serverNow} />);
  await screen.findByRole('heading', { level: 1 });
  return sent;
}

const noNotes = { notes: {}, updatedAt: null, updatedBy: null };
const nothingYet: Rounds = { last: null, cleanPressure: null };
const rowOf = (name: string) => screen.getByText(name).closest('li')!;

describe('the ten-minute round', () => {
  it('is ten rows and one tap when all is fine', async () => {
    const sent = await show(nothingYet);
    expect(screen.getAllByRole('button', { name: /: not fine$/ })).toHaveLength(10);
    fireEvent.click(screen.getByRole('button', { name: 'All fine' }));
    expect(await screen.findByText('The round is kept.')).toBeInTheDocument();
    expect(sent).toMatchObject([{ exceptions: [] }]);
    // By the server's clock, whatever the device's says.
    const { doneAt } = sent[0] as { doneAt: string };
    expect(Date.parse(doneAt) - serverNow).toBeLessThan(60_000);
    expect(screen.getAllByRole('link', { name: 'To the week sheet' })).not.toHaveLength(0);
  });

  it('says what to do about the one that is not, and takes it back', async () => {
    const sent = await show(nothingYet);
    fireEvent.click(screen.getByRole('button', { name: 'Pump seal: not fine' }));
    const row = rowOf('Pump seal: it drips');
    expect(within(row).getByText(/Acid water or a tablet feeder upstream can do this/)).toBeInTheDocument();
    expect(within(row).getByRole('link', { name: 'Test now' })).toHaveAttribute('href', '/test');
    expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent('One thing to see to.');
    fireEvent.click(screen.getByRole('button', { name: 'Pump seal: fine after all' }));
    fireEvent.click(screen.getByRole('button', { name: 'Ladder and rails: not fine' }));
    fireEvent.click(screen.getByRole('button', { name: 'Save: the rest is fine' }));
    await waitFor(() => expect(sent).toMatchObject([{ exceptions: ['ladder'] }]));
  });

  it('a drain cover is a Stop: who is held first, then everyone out, then the pump', async () => {
    await show(nothingYet);
    fireEvent.click(screen.getByRole('button', { name: 'Drain cover: not fine' }));
    const said = rowOf('Drain cover: not whole').textContent;
    const order = ['Stop', 'held', 'pump off first', 'emergency number', 'everyone out', 'pump off.'].map((part) =>
      said.indexOf(part),
    );
    expect(order).toEqual(order.toSorted((a, b) => a - b));
    expect(Math.min(...order)).toBeGreaterThanOrEqual(0);
  });

  it('tells how high the filter may stand over clean, in the household’s unit', async () => {
    await show({ last: null, cleanPressure: 0.9 });
    expect(screen.getByText('clean it was 0.9 bar; fine up to 1.25 bar')).toBeInTheDocument();
  });

  it('reads a gauge with a comma, in psi too, and keeps what it cannot read on the screen', async () => {
    const sent = await show(nothingYet, { unitSystem: 'us' });
    fireEvent.click(screen.getByRole('button', { name: 'Filter pressure: not fine' }));
    const field = screen.getByLabelText('It shows now [psi]');
    fireEvent.change(field, { target: { value: 'lots' } });
    fireEvent.click(screen.getByRole('button', { name: 'Save: the rest is fine' }));
    expect(await screen.findByText(/Write what the gauge shows/)).toBeInTheDocument();
    expect(field).toHaveValue('lots');
    fireEvent.change(field, { target: { value: '14,5' } });
    fireEvent.click(screen.getByRole('button', { name: 'Save: the rest is fine' }));
    await waitFor(() => expect(sent).toHaveLength(1));
    // 14.5 psi are 1.00 bar.
    expect((sent[0] as { pressure: number }).pressure).toBeCloseTo(1, 2);
  });

  it('says why somebody who only looks cannot keep one', async () => {
    await show(
      { last: { doneAt: '2026-07-04T09:00:00+02:00', doneBy: 'Ines', exceptions: [] }, cleanPressure: null },
      {
        mayDoRounds: false,
      },
    );
    expect(screen.getByText('Last round Saturday 4 July')).toBeInTheDocument();
    expect(screen.getByText('all fine, Ines')).toBeInTheDocument();
    expect(screen.getByText('You can look at this round, but not change it.')).toBeInTheDocument();
  });

  it('has words for every row, and none that promises safety or sends someone to a switch', () => {
    for (const item of roundItems) expect(words.advice[item]).toMatch(/\w{5}/);
    expect(JSON.stringify(words)).not.toMatch(/\bsafe\b/i);
  });
});
