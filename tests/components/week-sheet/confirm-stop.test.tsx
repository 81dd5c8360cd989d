import { screen, waitFor, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { keepTick } from '@/lib/client/unsent-ticks';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { aWeekSheet, idOf } from '../../support/week-sheet';
import { showSheet } from './show-sheet';

beforeEach(() => localStorage.clear());
afterEach(() => {
  vi.restoreAllMocks();
  vi.unstubAllGlobals();
});

const thursday = idOf(103);
const button = 'Ines: I have read this and will do so';
const stop = 'Never let two different pool products touch';
const putsItIn = ['I am adding it now', 'Mark as added', 'Other amount'];
const phone = { width: 390 };

/** Thursday evening, an hour before granules, whose Stop this person has yet to confirm. */
function unread(change: Partial<PlanDose> = {}): WeekSheet {
  const sheet = aWeekSheet({ now: ['2026-07-09', '18:30'] });
  const doses = sheet.doses.map((dose) => (dose.id === thursday ? { ...dose, stopDue: true, ...change } : dose));
  return { ...sheet, doses };
}

const acid: Partial<PlanDose> = {
  ...{ substance: 'hydrochloric-acid', form: 'liquid', unit: 'mL', amount: 300, steps: 'acid' },
};
const tablets: Partial<PlanDose> = {
  ...{ substance: 'trichlor', form: 'tablet', unit: 'tablet', amount: 3, steps: 'tablets-inline' },
};

type Sent = { id: string; doseId: string };

/** Answers the requests for a sheet with this one, and confirmations one after the other. */
function serve(
  sheet: WeekSheet,
  answers: ('done' | 'no answer' | { status: number; code: string; message: string })[],
) {
  const sent: Sent[] = [];
  vi.stubGlobal('fetch', async (address: string, init: RequestInit = {}) => {
    if (init.method !== 'POST') return Response.json(sheet);
    expect(address).toBe('/api/stop-confirmations');
    sent.push(JSON.parse(String(init.body)) as Sent);
    const answer = answers.shift() ?? 'no answer';
    if (answer === 'no answer') throw new TypeError('Failed to fetch');
    if (answer === 'done') return Response.json({ done: true });
    return Response.json({ error: { code: answer.code, message: answer.message } }, { status: answer.status });
  });
  return sent;
}

describe('a dose whose Stop is still to be confirmed', () => {
  it('shows it after the steps with one button that has the person’s name, and nothing that puts it in', async () => {
    const { container } = await showSheet(unread(), phone);
    const text = container.textContent;
    const places = ['Due now', 'Goggles and gloves on,', 'Tick. Nobody in', stop, button, 'Skip', 'Thu 9'].map(
      (words) => text.indexOf(words),
    );
    expect(places).not.toContain(-1);
    expect(places).toEqual(places.toSorted((a, b) => a - b));
    for (const name of putsItIn) expect(screen.queryByRole('button', { name })).toBeNull();
    expect(screen.getAllByText(new RegExp(stop))).toHaveLength(1);
    const caution = within(screen.getByRole('group', { name: 'Stop' }));
    expect(caution.getByRole('link', { name: 'Emergency card' })).toBeInTheDocument();
    expect(caution.getAllByRole('button')).toHaveLength(1);
    expect(caution.getByText(/again after 90 days or when the product changes/)).toBeInTheDocument();
  });

  it('asks in its dialog on a desk, and its column cannot be ticked before', async () => {
    const { user } = await showSheet(unread());
    expect(screen.queryByRole('checkbox', { name: 'Mark as added' })).toBeNull();
    expect(screen.queryByRole('button', { name: 'I am adding it now' })).toBeNull();
    await user.click(screen.getByRole('button', { name: 'Steps, and a Stop to read first' }));
    const dialog = within(await screen.findByRole('dialog', { name: '95 g granules' }));
    expect(dialog.getAllByRole('listitem')).toHaveLength(6);
    expect(dialog.getAllByText(new RegExp(stop))).toHaveLength(1);
    expect(dialog.getByRole('button', { name: button })).toBeInTheDocument();
    for (const name of putsItIn) expect(dialog.queryByRole('button', { name })).toBeNull();
  });

  it('sends the dose and no product; then the usual buttons stand there and the caution has none', async () => {
    const { user } = await showSheet(unread(), phone);
    const sent = serve(unread({ stopDue: false }), ['done']);
    await user.click(screen.getByRole('button', { name: button }));
    for (const name of putsItIn) expect(await screen.findByRole('button', { name })).toBeInTheDocument();
    expect(sent).toEqual([{ id: expect.any(String) as string, doseId: thursday }]);
    expect(screen.queryByRole('button', { name: button })).toBeNull();
    expect(screen.getAllByText(new RegExp(stop))).toHaveLength(1);
  });

  it('fails in words without a connection, leaves the steps, and is the same confirmation when tried again', async () => {
    const { user } = await showSheet(unread(), phone);
    const sent = serve(unread({ stopDue: false }), ['no answer', 'done']);
    await user.click(screen.getByRole('button', { name: button }));
    expect(await screen.findByRole('alert')).toHaveTextContent(
      /^There is no connection, so it is not written down yet\./,
    );
    expect(screen.getAllByText(/Goggles and gloves on/).length).toBeGreaterThan(0);
    expect(screen.queryByRole('button', { name: 'Mark as added' })).toBeNull();
    await user.click(screen.getByRole('button', { name: button }));
    expect(await screen.findByRole('button', { name: 'Mark as added' })).toBeInTheDocument();
    expect(sent).toHaveLength(2);
    expect(sent[1]?.id).toBe(sent[0]?.id);
  });

  it('says why it was refused, and tries again as another confirmation', async () => {
    const { user } = await showSheet(unread(), phone);
    const words = 'This was confirmed by somebody else. Read the Stop and confirm it yourself.';
    const sent = serve(unread({ stopDue: false }), [{ status: 409, code: 'conflict', message: words }, 'done']);
    await user.click(screen.getByRole('button', { name: button }));
    expect(await screen.findByRole('alert')).toHaveTextContent(words);
    await user.click(screen.getByRole('button', { name: button }));
    await waitFor(() => expect(sent).toHaveLength(2));
    expect(sent[1]?.id).not.toBe(sent[0]?.id);
  });

  it('can be skipped all the same', async () => {
    const skipped = unread({ status: 'skipped', doneBy: 'Ines', recordedBy: 'Ines' });
    const { user, sent } = await showSheet(unread(), { ...phone, answers: [skipped] });
    await user.click(screen.getByRole('button', { name: 'Skip' }));
    await user.click(screen.getByRole('button', { name: 'Yes, skip it' }));
    await waitFor(() => expect(sent[0]?.tick.action).toBe('skipped'));
  });

  it('still says who has it, and lets whoever has it say that they have not', async () => {
    const { unmount } = await showSheet(unread({ claimedBy: 'Tom' }), phone);
    expect(screen.getByText('Tom has it')).toBeInTheDocument();
    expect(screen.getByRole('button', { name: button })).toBeInTheDocument();
    unmount();
    await showSheet(unread({ claimedBy: 'Ines' }), phone);
    expect(screen.getByRole('button', { name: 'I am not adding it' })).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'Mark as added' })).toBeNull();
  });
});

describe('what the Stop says', () => {
  const own = {
    acid: /Acid never goes in on the same visit as chlorine\./,
    tablets: /Only the same tablets as before/,
  };

  it.each([
    ['granules', {}, undefined],
    ['acid', acid, own.acid],
    ['dry acid', { ...acid, substance: 'sodium-bisulfate', form: 'granular', unit: 'g' } as const, own.acid],
    ['tablets', tablets, own.tablets],
    ['tablets in a floater', { ...tablets, steps: 'tablets-floating' } as const, own.tablets],
  ] as const)('of %s', async (_product, change, words) => {
    await showSheet(unread(change), phone);
    const caution = screen.getByRole('group', { name: 'Stop' });
    expect(caution).toHaveTextContent('Two chlorines can explode too.');
    for (const line of Object.values(own))
      if (line === words) expect(caution).toHaveTextContent(line);
      else expect(caution).not.toHaveTextContent(line);
  });
});

describe('nobody is asked', () => {
  it('before a dose may be ticked', async () => {
    const ahead = unread();
    await showSheet({ ...ahead, now: '2026-07-09T12:00:00+02:00' }, phone);
    expect(screen.queryByRole('button', { name: button })).toBeNull();
    expect(screen.getByText(new RegExp(stop))).toBeInTheDocument();
  });

  it('while something bars dosing: what went in all the same is only written down', async () => {
    const storm = { id: idOf(900), kind: 'storm', happenedAt: '2026-07-09T17:00:00+02:00', reportedBy: 'Tom' } as const;
    await showSheet({ ...unread(), events: [storm] }, phone);
    expect(screen.queryByRole('button', { name: button })).toBeNull();
    expect(screen.queryByRole('button', { name: 'I am adding it now' })).toBeNull();
    expect(screen.getByRole('button', { name: 'Mark as added' })).toBeInTheDocument();
  });

  it('about a dose that was ticked on this device and waits to be sent', async () => {
    await keepTick(idOf(1), { doseId: thursday, tick: { action: 'given', id: idOf(901), planVersion: 3 } });
    await showSheet(unread(), phone);
    expect(screen.getByText(/waiting to be sent/)).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: button })).toBeNull();
  });
});
