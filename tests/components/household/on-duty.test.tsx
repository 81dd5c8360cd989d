import { fireEvent, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { HouseholdScreen } from '@/components/household/household-screen';
import type { HandOver, HandOvers } from '@/lib/schemas/hand-over';
import type { Member } from '@/lib/schemas/member';
import { renderWithWords } from '../../support/with-words';

afterEach(() => vi.unstubAllGlobals());

const ids = { odile: crypto.randomUUID(), bram: crypto.randomUUID() };
const odile = { memberId: ids.odile, name: 'Odile', role: 'owner' as const };
const bram = { memberId: ids.bram, name: 'Bram', role: 'caretaker' as const };
const member = (id: string, name: string, role: Member['role'], you: boolean): Member => ({
  ...{ id, name, role, you, chemicalsAllowed: true, handlesChemicals: true, cardReadAt: '2026-07-05T12:00:00Z' },
});
const handOver = (changes: Partial<HandOver> = {}): HandOver => ({
  ...{ ...bram, id: crypto.randomUUID(), you: false, fromDay: '2026-08-03', untilDay: '2026-08-16' },
  ...{ chemicalsAllowed: false, cardRead: false, agreedAt: '2026-07-05T12:00:00Z', inForce: false, ...changes },
});
const duty = (handOvers: HandOver[], onDuty = [odile, bram]): HandOvers => ({
  ...{ today: '2026-07-20', onDuty, usually: [odile, bram], handOvers },
});

type Sent = { address: string; method: string; body: unknown };

function show(known: HandOvers, { you = 'odile', refusal }: { you?: 'odile' | 'bram'; refusal?: () => Response } = {}) {
  const sent: Sent[] = [];
  const members = [
    member(ids.odile, 'Odile', 'owner', you === 'odile'),
    member(ids.bram, 'Bram', 'caretaker', you === 'bram'),
  ];
  vi.stubGlobal('fetch', (address: string, init?: RequestInit) => {
    const method = init?.method ?? 'GET';
    if (address === '/api/members')
      return Promise.resolve(Response.json({ members, invitations: [], mailFrom: 'nowhere' }));
    if (address === '/api/households') return Promise.resolve(Response.json([]));
    if (method === 'GET' && address === '/api/hand-overs') return Promise.resolve(Response.json(known));
    // What else the page asks for is of no concern here.
    if (method === 'GET') return Promise.resolve(new Response(null, { status: 503 }));
    sent.push({ address, method, body: init?.body === undefined ? undefined : JSON.parse(String(init.body)) });
    return Promise.resolve(refusal?.() ?? Response.json(known));
  });
  const owns = you === 'odile';
  const setting = {
    ...{ timeZone: 'Europe/Amsterdam', locale: 'en-GB', demo: false },
    ...{ mayInvite: owns, mayHandOver: owns, mayReadAuditTrail: owns },
  };
  renderWithWords(<HouseholdScreen setting={setting} shortestPassword={10} initialDuty={known} />);
  return sent;
}

describe('who is on duty', () => {
  it('stands in the headline once it is agreed, and on a line', () => {
    show(duty([handOver()]));
    expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent('Bram looks after it 3 to 16 August.');
    expect(screen.getByText(/^Bram is on duty alone from Monday 3 August\./)).toBeInTheDocument();
    expect(screen.getByText('Bram agreed on Sunday 5 July.')).toBeInTheDocument();
    expect(screen.getByText('On duty now: Odile, with the help of Bram.')).toBeInTheDocument();
    expect(screen.getByRole('img', { name: /from 20 July to 23 August/ })).toHaveTextContent(/Odile.*Bram, alone/);
  });

  it('is not said in the headline before', () => {
    show(duty([handOver({ agreedAt: null })]));
    expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent('Household');
    expect(screen.getByText(/Bram is asked, and has not agreed yet/)).toBeInTheDocument();
  });

  it('is one name while somebody stands in, and theirs to read as you', () => {
    show(duty([handOver({ you: true, inForce: true })], [bram]), { you: 'bram' });
    expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent('You look after it 3 to 16 August.');
    expect(screen.getByText('On duty now: Bram.')).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'I cannot do it after all' })).toBeInTheDocument();
    expect(screen.queryByText('Hand the pool over for some days')).toBeNull();
    expect(screen.queryByText('Who changed what')).toBeNull();
  });
});

describe('handing over', () => {
  const fill = (label: string, value: string) => fireEvent.change(screen.getByLabelText(label), { target: { value } });
  const press = () => fireEvent.click(screen.getByRole('button', { name: 'Hand it over', hidden: true }));

  it('sends whom and which days, once both are chosen', async () => {
    const sent = show(duty([]));
    await screen.findByText('Hand the pool over for some days');
    fill('First day away', '2026-08-03');
    press();
    expect(screen.getByLabelText('Last day away')).toHaveAccessibleDescription('Choose a day.');
    expect(sent).toEqual([]);
    fill('Last day away', '2026-08-16');
    press();
    expect(await screen.findByText('Written down. It holds once Bram agrees on this page.')).toBeInTheDocument();
    expect(sent).toMatchObject([
      {
        ...{ address: '/api/hand-overs', method: 'POST' },
        body: { memberId: ids.bram, fromDay: '2026-08-03', untilDay: '2026-08-16', chemicalsAllowed: false },
      },
    ]);
  });

  it('says at the day what is wrong, and keeps what was typed', async () => {
    const message = 'The first day away is today or later.';
    const refusal = () =>
      Response.json(
        { error: { code: 'invalid-input', message, problems: [{ path: 'fromDay', message }] } },
        { status: 422 },
      );
    show(duty([]), { refusal });
    await screen.findByText('Hand the pool over for some days');
    fill('First day away', '2026-07-01');
    fill('Last day away', '2026-08-16');
    press();
    expect(await screen.findByText(message)).toBeInTheDocument();
    expect(screen.getByLabelText('First day away')).toHaveValue('2026-07-01');
  });

  it('is taken back after a question', async () => {
    const asked = handOver();
    const sent = show(duty([asked]));
    fireEvent.click(screen.getByRole('button', { name: 'Take it back…' }));
    const dialog = await screen.findByRole('dialog');
    expect(sent).toEqual([]);
    fireEvent.click(within(dialog).getByRole('button', { name: 'Take it back' }));
    await vi.waitFor(() => expect(sent).toMatchObject([{ address: `/api/hand-overs/${asked.id}`, method: 'DELETE' }]));
  });

  it('is agreed to with the safety card read, or without', async () => {
    const asked = handOver({ you: true, agreedAt: null, chemicalsAllowed: true });
    const sent = show(duty([asked]), { you: 'bram' });
    fireEvent.click(screen.getByRole('button', { name: 'Agree' }));
    await vi.waitFor(() => expect(sent).toMatchObject([{ body: { cardRead: false } }]));
    fireEvent.click(screen.getByRole('checkbox', { name: /I am an adult and have read the safety card/ }));
    fireEvent.click(await screen.findByRole('button', { name: 'Agree' }));
    await vi.waitFor(() => expect(sent).toHaveLength(2));
    expect(sent[1]).toMatchObject({ address: `/api/hand-overs/${asked.id}/agreement`, body: { cardRead: true } });
  });
});
