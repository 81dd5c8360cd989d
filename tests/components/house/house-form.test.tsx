import { fireEvent, screen, waitFor } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { HouseScreen } from '@/components/house/house-screen';
import type { HouseNotes } from '@/lib/schemas/house-note';
import { renderWithWords } from '../../support/with-words';

afterEach(() => vi.unstubAllGlobals());

const household = { timeZone: 'Europe/Madrid', locale: 'en-GB', mayKeepHouseNotes: true };
const empty: HouseNotes = { notes: {}, updatedAt: null, updatedBy: null };

async function show(known = empty, changes: Partial<typeof household> = {}, refusal?: () => Response) {
  const sent: unknown[] = [];
  vi.stubGlobal('fetch', (_: string, init?: RequestInit) => {
    if (init?.method !== 'PUT') return Promise.resolve(Response.json(known));
    const notes = JSON.parse(String(init.body)) as HouseNotes['notes'];
    sent.push(notes);
    return Promise.resolve(
      refusal?.() ?? Response.json({ notes, updatedAt: '2026-07-11T09:10:00+02:00', updatedBy: 'Ines' }),
    );
  });
  renderWithWords(<HouseScreen household={{ ...household, ...changes }} />);
  await screen.findByLabelText('Gate: key and latch');
  return sent;
}

const field = (name: string) => screen.getByLabelText(name);
const fill = (name: string, value: string) => fireEvent.change(field(name), { target: { value } });
const save = () => fireEvent.click(screen.getByRole('button', { name: 'Save the notes' }));

describe('the house notes', () => {
  it('are saved as they were written, without what is empty, and lead to the sheet', async () => {
    const sent = await show();
    fill('Our phone while we are away', '+34 600 555 010');
    fill('Gate: key and latch', 'Key in the shed');
    fill('Chemicals', '   ');
    save();
    expect(await screen.findByText('The notes are kept.')).toBeInTheDocument();
    expect(sent).toEqual([{ ourPhone: '+34 600 555 010', gate: 'Key in the shed' }]);
    expect(screen.getByRole('link', { name: 'Open the sheet to print' })).toHaveAttribute('href', '/house/sheet');
  });

  it('say at the field what is wrong, send nothing and keep every word', async () => {
    const sent = await show();
    fill('Phone of the neighbour', 'ring at number 5');
    fill('Breaker of the pool', 'b'.repeat(161));
    fill('Pump switch', 'Left of the door');
    save();
    expect(field('Phone of the neighbour')).toHaveAccessibleDescription(/has digits, spaces/);
    expect(field('Breaker of the pool')).toHaveAccessibleDescription(/Keep it to 160 characters/);
    expect(field('Phone of the neighbour')).toHaveValue('ring at number 5');
    expect(field('Pump switch')).toHaveValue('Left of the door');
    expect(sent).toEqual([]);
  });

  it('that could not be saved say so and stay', async () => {
    await show(empty, {}, () => Response.error());
    fill('Gate: key and latch', 'Key in the shed');
    save();
    expect(await screen.findByText(/The notes are not saved yet\. What you wrote is still here\./)).toBeInTheDocument();
    expect(field('Gate: key and latch')).toHaveValue('Key in the shed');
  });

  it('show who changed them last, and to a viewer why nothing can be changed', async () => {
    const known = { notes: { gate: 'Key' }, updatedAt: '2026-07-04T09:00:00+02:00', updatedBy: 'Joost' };
    const sent = await show(known, { mayKeepHouseNotes: false });
    expect(screen.getByText('Last changed Saturday 4 July, Joost')).toBeInTheDocument();
    expect(field('Gate: key and latch')).toHaveValue('Key');
    expect(field('Gate: key and latch')).toHaveAttribute('readonly');
    save();
    await waitFor(() => expect(screen.getByText(/but not change them/)).toBeInTheDocument());
    expect(sent).toEqual([]);
  });
});
