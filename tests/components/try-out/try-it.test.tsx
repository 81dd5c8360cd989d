import { screen, waitFor } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import type { CourseAnswer } from '@/lib/client/try-it/messages';
import { aWeekSheet, idOf } from '../../support/week-sheet';
import { showSheet } from '../week-sheet/show-sheet';
import { showTryIt, startOn } from './show-try-it';

const saturday = '2026-07-11';
const evening = Date.parse('2026-07-11T18:00:00+02:00');
const line = { at: [0, 1, 2].map((hour) => evening + hour * 3_600_000), levels: [3, 2.9, 2.8], jumps: [] };

function aCourse(number: number, facts: CourseAnswer['facts']): CourseAnswer {
  return { kind: 'course', number, likely: false, plan: line, tried: { ...line, levels: [3, 2.1, 2] }, facts };
}
const meetsLowest: CourseAnswer['facts'] = [{ code: 'meets', limit: 'lowest-level', at: evening, level: 2.1 }];

type Shown = Awaited<ReturnType<typeof showTryIt>>;
const swimmers = ({ section }: Shown) => section.getByRole('textbox', { name: 'Swimmer-hours on Saturday' });
const more = ({ section }: Shown) => section.getAllByRole('button', { name: 'One more' })[0]!;

/** Tries a fifteenth swimmer-hour, and lets the engine answer. */
async function tryOneMore(shown: Shown, facts = meetsLowest) {
  await shown.user.click(more(shown));
  await waitFor(() => expect(shown.threads.asked.some(({ kind }) => kind === 'course')).toBe(true));
  answer(shown, aCourse(1, facts));
  await shown.section.findByText(/With 15 swimmer-hours on Saturday/);
}

/** Has a plan made, once nothing has been changed for a while. */
async function advise(shown: Shown, advice: unknown) {
  await waitFor(() => expect(shown.threads.asked.some(({ kind }) => kind === 'advice')).toBe(true));
  answer(shown, { kind: 'advice', number: newest(shown), advice } as never);
}

function newest({ threads }: Shown): number {
  return Math.max(...threads.asked.map((each) => ('number' in each ? each.number : 0)));
}

function answer(
  { threads }: Shown,
  data: Parameters<NonNullable<(typeof threads.opened)[number]['onmessage']>>[0]['data'],
) {
  const asked = data.kind === 'advice' ? threads.opened.at(-1) : threads.opened[0];
  asked?.onmessage?.(new MessageEvent('message', { data }));
}

const ofGranules = {
  ...{ at: Date.parse('2026-07-11T19:40:00+02:00'), substance: 'calcium-hypochlorite', form: 'granular', unit: 'g' },
  ...{ before: 65, after: 100 },
};

describe('Try it', () => {
  it('opens on the day with the most swimmers and says what the sheet says', async () => {
    const shown = await showTryIt(aWeekSheet(), startOn(aWeekSheet()));
    expect(swimmers(shown)).toHaveValue('14');
    expect(shown.section.getByText('the sheet says 14')).toBeVisible();
  });

  it('asks the server and starts the engine only when somebody touches it', async () => {
    const shown = await showTryIt(aWeekSheet(), startOn(aWeekSheet()));
    expect(shown.asked).toEqual(['/api/week']);
    expect(shown.threads.opened).toHaveLength(0);
    swimmers(shown).focus();
    await waitFor(() => expect(shown.asked).toContain('/api/try-outs'));
    await waitFor(() => expect(shown.threads.opened).toHaveLength(1));
  });

  it('says what becomes of the week, and what would cover it', async () => {
    const shown = await showTryIt(aWeekSheet(), startOn(aWeekSheet()));
    await tryOneMore(shown);
    const said = shown.section.getByText(/With 15 swimmer-hours/);
    expect(said).toHaveTextContent(
      'With 15 swimmer-hours on Saturday, free chlorine falls to the lowest level by Saturday evening: check then, before anyone swims.',
    );
    expect(said).toHaveAttribute('aria-live', 'polite');
    await advise(shown, { code: 'planned', changed: [ofGranules], keeps: true });
    await waitFor(() => expect(said).toHaveTextContent('100 g granules in place of 65 g on Saturday would cover it.'));
  });

  it('asks for a test where so many swim that the verdict does', async () => {
    const shown = await showTryIt(aWeekSheet(), startOn(aWeekSheet()));
    await tryOneMore(shown);
    expect(shown.section.queryByText(/ask for a test/)).toBeNull();
    await shown.user.clear(swimmers(shown));
    await shown.user.type(swimmers(shown), '16');
    answer(shown, aCourse(newest(shown), meetsLowest));
    await waitFor(() => expect(shown.section.getByText(/15 swimmer-hours in a day ask for a test/)).toBeVisible());
  });

  it('reads a decimal comma, and says what is no number', async () => {
    const shown = await showTryIt(aWeekSheet(), startOn(aWeekSheet()));
    await shown.user.clear(swimmers(shown));
    expect(shown.section.getByText('Write a number from 0 to 1000.')).toBeVisible();
    await shown.user.type(swimmers(shown), '12,5');
    await waitFor(() =>
      expect(shown.threads.asked.at(-1)).toMatchObject({
        kind: 'course',
        changes: { swimmers: [{ day: saturday, swimmerHours: 12.5 }] },
      }),
    );
  });

  it('keeps what was tried while the sheet is fetched anew, and begins anew on another plan', async () => {
    const sheet = aWeekSheet();
    const shown = await showTryIt(sheet, startOn(sheet));
    await tryOneMore(shown);
    const seen = shown.asked.length;
    window.dispatchEvent(new Event('visibilitychange'));
    await waitFor(() => expect(shown.asked.length).toBeGreaterThan(seen));
    expect(swimmers(shown)).toHaveValue('15');
    expect(shown.threads.asked.filter(({ kind }) => kind === 'course')).toHaveLength(1);

    shown.state.sheet = { ...sheet, plan: { ...sheet.plan!, id: idOf(77) } };
    window.dispatchEvent(new Event('visibilitychange'));
    expect(await shown.section.findByText(/the try-out starts anew/)).toBeVisible();
    expect(swimmers(shown)).toHaveValue('14');
  });

  it('keeps what was tried when the other form of the sheet takes its place', async () => {
    const shown = await showTryIt(aWeekSheet(), startOn(aWeekSheet()));
    await tryOneMore(shown);
    shown.turn();
    await screen.findByText('The rest of the week');
    expect(screen.getByRole('textbox', { name: 'Swimmer-hours on Saturday' })).toHaveValue('15');
    await waitFor(() => expect(shown.threads.opened.at(-1)?.asked.at(-1)).toMatchObject({ kind: 'course' }));
  });

  it('puts back what was tried', async () => {
    const shown = await showTryIt(aWeekSheet(), startOn(aWeekSheet()));
    await tryOneMore(shown);
    await shown.user.click(shown.section.getByRole('button', { name: 'Put back' }));
    expect(swimmers(shown)).toHaveValue('14');
    expect(shown.section.queryByText(/With 15/)).toBeNull();
  });

  it('sends the same try-out again under the same id, and is empty once it is in the plan', async () => {
    const shown = await showTryIt(aWeekSheet(), startOn(aWeekSheet()), ['no answer']);
    await tryOneMore(shown);
    const use = shown.section.getByRole('button', { name: 'Use it in the plan' });
    expect(use).toHaveAttribute('aria-disabled', 'true');
    await advise(shown, { code: 'planned', changed: [], keeps: true });
    await waitFor(() => expect(use).not.toHaveAttribute('aria-disabled'));
    await shown.user.click(use);
    expect(await shown.section.findByText('It is not in the plan')).toBeVisible();
    expect(swimmers(shown)).toHaveValue('15');
    await shown.user.click(shown.section.getByRole('button', { name: 'Use it in the plan' }));
    await waitFor(() => expect(swimmers(shown)).toHaveValue('14'));
    expect(shown.sent).toHaveLength(2);
    expect(shown.sent[0]).toEqual(shown.sent[1]);
    expect(shown.sent[0]).toMatchObject({
      method: 'POST',
      body: { planId: aWeekSheet().plan?.id, swimmers: [{ day: saturday, swimmerHours: 15 }], tablets: null },
    });
  });

  it('does not say that the plan has changed to whoever changed it', async () => {
    const sheet = aWeekSheet();
    const shown = await showTryIt(sheet, startOn(sheet));
    await tryOneMore(shown);
    await advise(shown, { code: 'planned', changed: [], keeps: true });
    const use = shown.section.getByRole('button', { name: 'Use it in the plan' });
    await waitFor(() => expect(use).not.toHaveAttribute('aria-disabled'));
    const days = sheet.days.map((day) => (day.day === saturday ? { ...day, swimmerHours: 15 } : day));
    shown.state.sheet = { ...sheet, days, plan: { ...sheet.plan!, id: idOf(77) } };
    await shown.user.click(use);
    expect(await shown.section.findByText('the sheet says 15')).toBeVisible();
    expect(shown.section.queryByText(/starts anew/)).toBeNull();
    expect(swimmers(shown)).toHaveValue('15');
  });

  it('offers no use of what the planner refuses', async () => {
    const shown = await showTryIt(aWeekSheet(), startOn(aWeekSheet()));
    await tryOneMore(shown);
    await advise(shown, { code: 'refused' });
    expect(await shown.section.findByText(/No plan can be made with this/)).toBeVisible();
    expect(shown.section.queryByRole('button', { name: 'Use it in the plan' })).toBeNull();
  });

  it('lets a viewer try, and says who may use it', async () => {
    const sheet = aWeekSheet();
    const shown = await showTryIt({ ...sheet, me: { ...sheet.me, role: 'viewer' } }, startOn(sheet));
    await tryOneMore(shown);
    expect(shown.section.getByText(/An owner or a caretaker uses it in the plan/)).toBeVisible();
    expect(shown.section.queryByRole('button', { name: 'Use it in the plan' })).toBeNull();
  });

  it('says that it works with a connection, and keeps what was typed', async () => {
    const shown = await showTryIt(aWeekSheet(), 'no answer');
    await shown.user.click(more(shown));
    expect(await shown.section.findByText(/as soon as there is a connection/)).toBeVisible();
    expect(swimmers(shown)).toHaveValue('15');
    shown.state.start = startOn(aWeekSheet());
    await shown.user.click(shown.section.getByRole('button', { name: 'Try again' }));
    await waitFor(() => expect(shown.threads.asked.some(({ kind }) => kind === 'course')).toBe(true));
  });

  it('moves a dose to an evening that has none', async () => {
    const shown = await showTryIt(aWeekSheet(), startOn(aWeekSheet()));
    const { user, section } = shown;
    await user.selectOptions(section.getByRole('combobox', { name: 'Move a dose' }), '65 g granules, Sat 11');
    const to = section.getByRole('combobox', { name: 'To' });
    await waitFor(() => expect(to).toHaveTextContent('Sun 12'));
    // Thursday and Friday have doses of their own.
    expect(to).not.toHaveTextContent('Fri 10');
    await user.selectOptions(to, 'Sun 12');
    await waitFor(() =>
      expect(shown.threads.asked.at(-1)).toMatchObject({
        changes: { moves: [{ doseId: idOf(105), toDay: '2026-07-12' }] },
      }),
    );
  });

  it('says what is in the plan, with the way back for those who may', async () => {
    const tryOut = {
      ...{ id: idOf(40), takenBy: 'Tom', takenAt: aWeekSheet().now },
      changes: {
        swimmers: [{ day: saturday, swimmerHours: 24 }],
        sky: [{ day: '2026-07-10', sky: 0.31 }],
        tablets: null,
        moves: [],
      },
    };
    const sheet = aWeekSheet({}, { tryOuts: [tryOut] });
    const shown = await showTryIt(sheet, startOn(sheet));
    const said = 'Tom changed the plan: 24 swimmer-hours on Saturday and an overcast sky on Friday.';
    expect(shown.section.getByText(said)).toBeVisible();
    await shown.user.click(shown.section.getByRole('button', { name: /^Put back: 24/ }));
    await waitFor(() => expect(shown.sent).toHaveLength(1));
    expect(shown.sent[0]).toMatchObject({ method: 'DELETE', address: `/api/try-outs/${tryOut.id}` });
  });

  it('says what the server says when nothing can be tried', async () => {
    const shown = await showTryIt(aWeekSheet(), { status: 409, code: 'conflict' });
    swimmers(shown).focus();
    expect(await shown.section.findByText(/^No\./)).toBeVisible();
  });
});

describe('without a plan', () => {
  it('there is nothing to try', async () => {
    const sheet = aWeekSheet();
    await showSheet({ ...sheet, plan: { ...sheet.plan!, cost: null } });
    expect(screen.queryByRole('heading', { name: 'Try it' })).toBeNull();
  });
});
