import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { RoundScreen } from '@/components/rounds/round-screen';
import type { HouseNotes } from '@/lib/schemas/house-note';
import type { NewVisit, Visits } from '@/lib/schemas/visit';
import { renderWithWords } from '../../support/with-words';

beforeEach(() => {
  // A simulated browser does not look inside what is closed.
  vi.stubGlobal('matchMedia', () => ({ matches: false, addEventListener() {}, removeEventListener() {} }));
});
afterEach(() => vi.unstubAllGlobals());

const household = {
  ...{ timeZone: 'Europe/Madrid', locale: 'en-GB', unitSystem: 'metric' as 'metric' | 'us' },
  ...{ personName: 'Ines', mayDoRounds: true, mayKeepHouseNotes: true },
};
const serverNow = Date.parse('2026-07-11T23:30:00+02:00');

type Scene = { visits?: Visits; notes?: HouseNotes['notes']; changes?: Partial<typeof household>; answer?: Response };

async function show({ visits = [], notes = {}, changes = {}, answer }: Scene = {}) {
  const sent: NewVisit[] = [];
  vi.stubGlobal('fetch', (address: string, init?: RequestInit) => {
    if (address === '/api/rounds') return Promise.resolve(Response.json({ last: null, cleanPressure: null }));
    if (address === '/api/house-notes')
      return Promise.resolve(Response.json({ notes, updatedAt: null, updatedBy: null }));
    if (init?.method === 'POST') {
      const visit = JSON.parse(String(init.body)) as NewVisit;
      sent.push(visit);
      const kept = { id: visit.id, visitedOn: visit.visitedOn, note: visit.note ?? null, recordedBy: 'Ines' };
      return Promise.resolve(answer?.clone() ?? Response.json([kept, ...visits]));
    }
    return Promise.resolve(Response.json(visits));
  });
  renderWithWords(<RoundScreen household={{ ...household, ...changes }} serverNow={serverNow} />);
  const section = within(await screen.findByRole('region', { name: 'Professional' }));
  await waitFor(() => expect(section.queryByText('The visits are being looked up')).toBeNull());
  return { sent, section };
}

const press = (name: string | RegExp) => fireEvent.click(screen.getByRole('button', { name }));
const open = (row: string) => fireEvent.click(screen.getByText(row));
const aVisit: Visits[number] = {
  id: '00000000-0000-4000-8000-000000000001',
  visitedOn: '2026-05-02',
  note: 'New pump seal',
  recordedBy: 'Joost',
};

describe('the professional on the round', () => {
  it('says when they were here last and what was done', async () => {
    const { section } = await show({ visits: [aVisit] });
    expect(section.getByText('Last visit 2 May 2026')).toBeInTheDocument();
    open('The visit so far');
    expect(section.getByText('New pump seal')).toBeInTheDocument();
    expect(section.getByText('written down by Joost')).toBeInTheDocument();
  });

  it('is one tap away from a dripping seal', async () => {
    await show({ notes: { professionalName: 'The pool firm', professionalPhone: '+49 (0)30 12-34' } });
    press('Pump seal: not fine');
    const row = within(screen.getByText('Pump seal: it drips').closest('li')!);
    const call = await row.findByRole('link', { name: /Call The pool firm/ });
    expect(call).toHaveAttribute('href', 'tel:+49301234');
  });

  it('says where to write the phone down where there is none', async () => {
    const { section } = await show();
    expect(await section.findByRole('link', { name: 'Write it on the house sheet' })).toHaveAttribute('href', '/house');
  });

  it('keeps a visit of today by the household’s calendar, without a note too', async () => {
    const { sent, section } = await show();
    open('Write down a visit');
    // 23:30 in Madrid.
    expect(section.getByLabelText('Day')).toHaveValue('2026-07-11');
    fireEvent.click(section.getByRole('button', { name: 'Keep the visit' }));
    expect(await section.findByText('The visit is kept.')).toBeInTheDocument();
    expect(sent).toMatchObject([{ visitedOn: '2026-07-11' }]);
    expect(sent[0]).not.toHaveProperty('note');
    expect(section.getByText('Last visit 11 July 2026')).toBeInTheDocument();
  });

  it('refuses a note that is too long, keeps it, and sends the same visit again after a failure', async () => {
    const busy = Response.json({ error: { code: 'engine-busy', message: 'Busy', problems: [] } }, { status: 503 });
    const { sent, section } = await show({ answer: busy });
    open('Write down a visit');
    const note = section.getByLabelText('What was done');
    fireEvent.change(note, { target: { value: 'x'.repeat(501) } });
    fireEvent.click(section.getByRole('button', { name: 'Keep the visit' }));
    expect(await section.findByText('Keep the note to 500 characters.')).toBeInTheDocument();
    expect(sent).toEqual([]);
    fireEvent.change(note, { target: { value: 'Pump seal' } });
    for (const times of [1, 2]) {
      fireEvent.click(section.getByRole('button', { name: 'Keep the visit' }));
      await waitFor(() => expect(sent).toHaveLength(times));
      await section.findByRole('alert');
    }
    expect(new Set(sent.map(({ id }) => id)).size).toBe(1);
    expect(note).toHaveValue('Pump seal');
  });

  it('says why somebody who only looks cannot write one down', async () => {
    const { section } = await show({ changes: { mayKeepHouseNotes: false } });
    open('Write down a visit');
    expect(section.getByText('You can look at the visits, but not write one down.')).toBeInTheDocument();
    expect(section.getByLabelText('What was done')).toHaveAttribute('readonly');
  });
});

describe('the bucket test', () => {
  const fill = (name: string, value: string) => fireEvent.change(screen.getByLabelText(name), { target: { value } });
  const openTest = () => {
    press('Water level: not fine');
    open('Work out the bucket test');
  };

  it('tells a leak from weather, a comma and inches included', async () => {
    await show();
    openTest();
    fill('The bucket fell [mm]', '6');
    fill('The pool fell [mm]', '9,5');
    expect(
      screen.getByText(/^Weather, as far as can be read: the two differ by no more than 4 mm/),
    ).toBeInTheDocument();
    fill('The pool fell [mm]', '31');
    expect(
      screen.getByText(/^It leaks: about 25 mm more than the weather took, give or take 4 mm/),
    ).toBeInTheDocument();
    fill('The bucket fell [mm]', '40');
    expect(screen.getByText(/that is no leak/)).toBeInTheDocument();
    fill('The pool fell [mm]', 'much');
    expect(screen.getByText('Write how far it fell, from 0 to 300 mm.')).toBeInTheDocument();
    expect(screen.queryByText(/that is no leak/)).toBeNull();
  });

  it('speaks inches to a household of US measures', async () => {
    await show({ changes: { unitSystem: 'us' } });
    openTest();
    fill('The bucket fell [in]', '0.25');
    fill('The pool fell [in]', '1.25');
    expect(
      screen.getByText(/^It leaks: about 1 in more than the weather took, give or take 0.2 in/),
    ).toBeInTheDocument();
  });
});
