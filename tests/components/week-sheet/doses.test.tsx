import { screen, waitFor, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { unsentTicks } from '@/lib/client/unsent-ticks';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { aWeekSheet, idOf } from '../../support/week-sheet';
import { showSheet } from './show-sheet';

beforeEach(() => localStorage.clear());
afterEach(() => vi.restoreAllMocks());

const ines = idOf(1);
const thursday = idOf(103);
const dueNow = () => aWeekSheet({ now: ['2026-07-09', '18:30'] });

/** The same sheet with one dose as it stands after something happened. */
function withDose(sheet: WeekSheet, change: Partial<PlanDose>, id = thursday): WeekSheet {
  return { ...sheet, doses: sheet.doses.map((dose) => (dose.id === id ? { ...dose, ...change } : dose)) };
}

function given(sheet: WeekSheet, change: Partial<PlanDose> = {}): WeekSheet {
  return withDose(sheet, {
    status: 'given',
    givenAt: sheet.now,
    givenAmount: 95,
    doneBy: 'Ines',
    recordedBy: 'Ines',
    undoUntil: '2026-07-09T18:40:00+02:00',
    ...change,
  });
}

describe('a dose that is not due yet', () => {
  it('shows only its steps, with this dose’s own numbers, and the Stop', async () => {
    const { user } = await showSheet(aWeekSheet());
    expect(screen.queryByLabelText(/Mark as added/)).not.toBeInTheDocument();
    expect(screen.getByText('Due tomorrow')).toBeInTheDocument();
    await user.click(screen.getAllByRole('button', { name: 'See the steps' })[0]!);
    const dialog = await screen.findByRole('dialog', { name: '95 g granules' });
    expect(dialog).toHaveTextContent('Last light, about 19:40, pump on until 23:40');
    const steps = within(dialog).getAllByRole('listitem');
    expect(steps).toHaveLength(6);
    expect(steps[0]).toHaveTextContent('Goggles and gloves on');
    expect(steps[1]).toHaveTextContent('Pump on now; leave it on 4 hours.');
    expect(steps[2]).toHaveTextContent('15 L of water in the clean plastic bucket');
    expect(steps[2]).toHaveTextContent('Never water onto granules.');
    expect(steps[5]).toHaveTextContent('Tick. Nobody in until the morning.');
    expect(dialog).toHaveTextContent('Stop. Never let two different pool products touch');
    expect(dialog).toHaveTextContent('From 16:40 tomorrow this becomes I am adding it now and Mark as added.');
    expect(within(dialog).queryByRole('button', { name: 'Mark as added' })).not.toBeInTheDocument();
  });

  it('says that a product has to be bought only where it has, and not where it merely has no name', async () => {
    const { user } = await showSheet(withDose(aWeekSheet(), { productName: null, toBuy: false }));
    await user.click(screen.getAllByRole('button', { name: 'See the steps' })[0]!);
    expect(await screen.findByRole('dialog', { name: '95 g granules' })).not.toHaveTextContent('To buy');
  });

  it('takes more water for more granules, and gives both in the household’s units', async () => {
    const sheet = withDose(aWeekSheet(), { amount: 680 });
    sheet.household = { ...sheet.household, unitSystem: 'us', locale: 'en-US' };
    const { user } = await showSheet(sheet);
    await user.click(screen.getAllByRole('button', { name: 'See the steps' })[0]!);
    const dialog = await screen.findByRole('dialog', { name: '1.5 lb granules' });
    // 680 g are three times 300 g begun: 45 L, 11.89 US gallons, and a bucket is filled to the next whole one.
    expect(within(dialog).getAllByRole('listitem')[2]).toHaveTextContent('12 US gal of water');
    expect(dialog).toHaveTextContent('about 7:40 PM');
  });
});

describe('how long nobody goes in', () => {
  const at = '2026-07-09T17:15:00+02:00';

  it.each([
    // Swim hours end at 20:00: a wait that ends after them lasts till the morning, however early the evening.
    { waitUntil: '2026-07-09T21:15:00+02:00', words: /Nobody in until the morning\./ },
    { waitUntil: '2026-07-09T19:10:00+02:00', words: /Nobody in until the morning\./ },
    { waitUntil: '2026-07-09T17:20:00+02:00', words: /Nobody in until Thursday evening\./ },
    { waitUntil: '2026-07-10T13:10:00+02:00', words: /Nobody in until Friday afternoon\./ },
  ])('$waitUntil', async ({ waitUntil, words }) => {
    const others = aWeekSheet().doses.filter(({ id }) => id === thursday);
    const sheet = withDose({ ...aWeekSheet(), doses: others }, { at, waitUntil });
    await showSheet(sheet);
    expect(screen.getByText(words)).toBeInTheDocument();
  });
});

describe('ticking', () => {
  it('marks a dose as added with one tap, and the sheet follows the new plan', async () => {
    const before = dueNow();
    const after = given(before);
    const higher = after.ahead!.freeChlorine;
    after.ahead = { ...after.ahead!, freeChlorine: { ...higher, p50: higher.p50.map((level) => level + 0.7) } };
    const { user, sent } = await showSheet(before, { answers: [after] });
    expect(screen.getByText(/^Free chlorine is about 2\.6/)).toBeInTheDocument();
    await user.click(screen.getByRole('checkbox', { name: 'Mark as added' }));
    expect(await screen.findByText('Ines, 18:30')).toBeInTheDocument();
    expect(screen.getByText(/^Free chlorine is about 3\.3/)).toBeInTheDocument();
    expect(sent).toEqual([
      { address: `/api/doses/${thursday}/ticks`, tick: { action: 'given', id: expect.any(String), planVersion: 3 } },
    ]);
  });

  it('sends one tick when it is pressed twice', async () => {
    const { user, sent } = await showSheet(dueNow(), { answers: [given(dueNow())] });
    await user.dblClick(screen.getByRole('checkbox', { name: 'Mark as added' }));
    await screen.findByText('Ines, 18:30');
    expect(sent).toHaveLength(1);
  });

  it('keeps the id of a tick when it is tried again', async () => {
    const failed = { status: 500, code: 'unexpected', message: 'a fault' };
    const { user, sent } = await showSheet(dueNow(), { answers: [failed, given(dueNow())] });
    await user.click(screen.getByRole('checkbox', { name: /^Mark as added/ }));
    await screen.findByText(/Something went wrong on our side/);
    await user.click(screen.getByRole('checkbox', { name: /^Mark as added/ }));
    await screen.findByText('Ines, 18:30');
    expect(sent[1]?.tick.id).toBe(sent[0]?.tick.id);
  });

  it('keeps on the device what found no connection, says so, and sends it later as the same tick', async () => {
    const { user, sent } = await showSheet(dueNow(), { answers: ['no answer', 'no answer', given(dueNow())] });
    await user.click(screen.getByRole('checkbox', { name: 'Mark as added' }));
    expect(
      await screen.findByText(
        '“95 g granules added” is kept on this device and is not yet on the sheet of the others.',
      ),
    ).toBeInTheDocument();
    expect(screen.getByText('Ticked on this device, waiting to be sent. Do not add it again.')).toBeInTheDocument();
    expect(screen.queryByRole('checkbox', { name: 'Mark as added' })).not.toBeInTheDocument();
    const [kept] = unsentTicks(ines);
    expect(kept?.tick).toMatchObject({ action: 'given', id: sent[0]?.tick.id });
    await user.click(screen.getByRole('button', { name: 'Send again' }));
    await screen.findByText('Ines, 18:30');
    expect(unsentTicks(ines)).toEqual([]);
    expect(new Set(sent.map(({ tick }) => tick.id)).size).toBe(1);
    // What arrives late says when the product went in.
    expect(sent.at(-1)?.tick).toMatchObject({ at: expect.stringMatching(/^2026-07-09T16:3\d/) });
  });

  it('says in the server’s words why a tick was not taken', async () => {
    const conflict = { status: 409, code: 'conflict', message: 'Tom has it. Ask before you add anything.' };
    const { user, asked } = await showSheet(dueNow(), { answers: [conflict] });
    await user.click(screen.getByRole('button', { name: 'I am adding it now' }));
    await user.click(screen.getByRole('button', { name: /Steps/ }));
    await waitFor(() => expect(screen.getByText('Tom has it. Ask before you add anything.')).toBeInTheDocument());
    // And what is on the screen is fetched anew.
    expect(asked).toHaveLength(2);
  });
});

describe('the dialog of a dose that is due', () => {
  async function openDose(sheet: WeekSheet, answers: WeekSheet[]) {
    const shown = await showSheet(sheet, { answers });
    await shown.user.click(screen.getByRole('button', { name: 'Steps, other amount' }));
    const dialog = await screen.findByRole('dialog', { name: '95 g granules' });
    return { ...shown, dialog };
  }

  it.each(['42,5', '42.5'])('takes another amount typed as %s, after it was confirmed', async (typed) => {
    const after = given(dueNow(), { status: 'changed', givenAmount: 42.5 });
    const { user, dialog, sent } = await openDose(dueNow(), [after]);
    await user.click(within(dialog).getByRole('button', { name: 'Other amount' }));
    await user.type(within(dialog).getByLabelText('How much went in?'), typed);
    await user.click(within(dialog).getByRole('button', { name: 'Continue' }));
    expect(sent).toEqual([]);
    await user.click(within(dialog).getByRole('button', { name: /^Yes, 43 g went in$/ }));
    await waitFor(() => expect(sent[0]?.tick).toMatchObject({ action: 'changed', amount: 42.5 }));
  });

  it('asks again for what is no amount, and points out more than double', async () => {
    const { user, dialog, sent } = await openDose(dueNow(), []);
    await user.click(within(dialog).getByRole('button', { name: 'Other amount' }));
    const field = within(dialog).getByLabelText('How much went in?');
    await user.type(field, 'some');
    await user.click(within(dialog).getByRole('button', { name: 'Continue' }));
    expect(dialog).toHaveTextContent('Write how much went in, as a number above zero.');
    await user.clear(field);
    await user.type(field, '950');
    await user.click(within(dialog).getByRole('button', { name: 'Continue' }));
    expect(dialog).toHaveTextContent('That is more than double what the sheet said.');
    expect(sent).toEqual([]);
  });

  it('asks once more before a dose is skipped', async () => {
    const after = withDose(dueNow(), { status: 'skipped', doneBy: 'Ines', recordedBy: 'Ines' });
    const { user, dialog, sent } = await openDose(dueNow(), [after]);
    await user.click(within(dialog).getByRole('button', { name: 'Skip' }));
    expect(sent).toEqual([]);
    await user.click(within(dialog).getByRole('button', { name: 'Yes, skip it' }));
    await waitFor(() => expect(sent[0]?.tick.action).toBe('skipped'));
    expect(await within(dialog).findByText('Skipped, Ines')).toBeInTheDocument();
  });

  it('takes a claim back', async () => {
    const { user, dialog, sent } = await openDose(withDose(dueNow(), { claimedBy: 'Ines' }), [dueNow()]);
    expect(dialog).toHaveTextContent('You have it');
    await user.click(within(dialog).getByRole('button', { name: 'I am not adding it' }));
    await waitFor(() => expect(sent[0]?.tick.action).toBe('undo'));
  });
});

describe('taking a tick back', () => {
  it('is offered for ten minutes', async () => {
    const { user, sent } = await showSheet(given(dueNow()), { answers: [dueNow()] });
    await user.click(screen.getByRole('button', { name: 'Undo' }));
    const dialog = await screen.findByRole('dialog');
    expect(dialog).toHaveTextContent('Can be undone until 18:40.');
    await user.click(within(dialog).getByRole('button', { name: 'Undo' }));
    await waitFor(() => expect(sent[0]?.tick.action).toBe('undo'));
  });

  it('is over afterwards', async () => {
    await showSheet(given(dueNow(), { undoUntil: '2026-07-09T18:30:00+02:00' }));
    expect(screen.queryByRole('button', { name: 'Undo' })).not.toBeInTheDocument();
  });

  it('belongs to whoever ticked, or to an owner', async () => {
    const sheet = given(dueNow(), { doneBy: 'Tom', recordedBy: 'Tom' });
    await showSheet({ ...sheet, me: { ...sheet.me, role: 'caretaker' } });
    expect(screen.queryByRole('button', { name: 'Undo' })).not.toBeInTheDocument();
  });
});

describe('who may tick', () => {
  it.each([
    [{ role: 'viewer', handlesChemicals: false } as const, /You see this sheet and change nothing/],
    [{ role: 'caretaker', handlesChemicals: false } as const, /Only those who handle chemicals tick a dose/],
  ])('%o reads why and has no button', async (rights, words) => {
    const sheet = withDose(dueNow(), { claimedBy: 'Tom' });
    const { user } = await showSheet({ ...sheet, me: { id: idOf(7), name: 'Ada', ...rights } });
    expect(screen.getByText('Tom has it')).toBeInTheDocument();
    expect(screen.queryByRole('checkbox', { name: 'Mark as added' })).not.toBeInTheDocument();
    await user.click(screen.getAllByRole('button', { name: 'See the steps' })[0]!);
    const dialog = await screen.findByRole('dialog');
    expect(within(dialog).getByText(words)).toBeInTheDocument();
    for (const name of ['I am adding it now', 'Mark as added', 'Other amount', 'Skip'])
      expect(within(dialog).queryByRole('button', { name })).not.toBeInTheDocument();
  });

  it('lets a caretaker who handles chemicals tick', async () => {
    const sheet = dueNow();
    await showSheet({ ...sheet, me: { ...sheet.me, role: 'caretaker' } });
    expect(screen.getByRole('checkbox', { name: 'Mark as added' })).toBeInTheDocument();
  });
});
