import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import words from '@/lib/messages/en/situations.json';
import { type SituationKind, situationKinds, type Situations } from '@/lib/schemas/situation';
import { branches, severityOf } from '@/lib/situations/codes';
import { aClearing, aSituations, aStep, now, situationId } from '../../support/situations';
import { inOrder, showSituations } from './show-situations';

vi.setConfig({ testTimeout: 20_000 });
afterEach(() => {
  vi.unstubAllGlobals();
  vi.restoreAllMocks();
});

const steps = () => screen.findByRole('region', { name: 'Steps' });

describe.each(situationKinds)('%s, open', (kind: SituationKind) => {
  it.each(branches[kind])('leads along %s: stop first, then the way, the steps, the end', async (branch) => {
    const cautions = (['liquid-low', 'never-mix'] as const).map((code) => ({ code, severity: severityOf(code) }));
    showSituations(
      aSituations({ kind, procedure: { branch, cautions, steps: [aStep('skim')], callWhen: ['doctor-first'] } }),
      { kind },
    );
    const shown = await steps();
    const way = screen.getByText(/^So: /);
    expect(way.textContent).not.toMatch(/[{}]/);
    const stop = screen.getByText(words.caution['never-mix'].title);
    const care = screen.getByText(words.caution['liquid-low'].title);
    const end = screen.getByRole('region', { name: 'How it ends' });
    expect(inOrder([stop, care, way, shown, end])).toBe(true);
    expect(within(end).getByText(words.done['ticks-and-test'])).toBeInTheDocument();
    expect(within(end).getByText(words.call['doctor-first'])).toBeInTheDocument();
  });
});

const storm = (changes: Parameters<typeof aStep>[1] = {}): Situations =>
  aSituations({ kind: 'storm', procedure: { branch: 'look-round', steps: [aStep('skim', changes)] } });
const done = { doneAt: '2026-07-12T08:05:00+02:00', doneBy: 'Joost' };

describe('a step', () => {
  it('is ticked once by a double click, and shows at once what was pressed', async () => {
    let answer: (situations: Situations) => void = () => {};
    const answers = [new Promise<Situations>((resolve) => (answer = resolve))];
    const { sent } = showSituations(storm(), { kind: 'storm', answers });
    const box = within(await steps()).getByRole('checkbox', { name: /^Skim/ });
    fireEvent.click(box);
    fireEvent.click(box);
    expect(await screen.findByText('Writing it down')).toBeInTheDocument();
    expect(box).toBeChecked();
    answer(storm(done));
    expect(await screen.findByText('Joost, 08:05')).toBeInTheDocument();
    expect(sent).toEqual([
      { address: `/api/situations/${situationId}/ticks`, method: 'POST', body: { step: 'skim', done: true } },
    ]);
  });

  it('can be taken back', async () => {
    const { sent } = showSituations(storm(done), { kind: 'storm', answers: [storm()] });
    const box = within(await steps()).getByRole('checkbox', { name: /^Skim/ });
    expect(box).toBeChecked();
    fireEvent.click(box);
    await waitFor(() => expect(box).not.toBeChecked());
    expect(sent).toMatchObject([{ body: { step: 'skim', done: false } }]);
  });

  it('that did not reach the server is open again, and says so', async () => {
    showSituations(storm(), { kind: 'storm', answers: ['no answer'] });
    const box = within(await steps()).getByRole('checkbox', { name: /^Skim/ });
    fireEvent.click(box);
    await waitFor(() => expect(box).toHaveAttribute('aria-invalid', 'true'));
    expect(box).not.toBeChecked();
  });

  it('cannot be ticked by who only looks', async () => {
    showSituations(storm(done), { kind: 'storm', mayOpen: false });
    const list = await steps();
    expect(within(list).queryByRole('checkbox')).not.toBeInTheDocument();
    expect(within(list).getByText('(done)')).toBeInTheDocument();
    expect(within(list).getByText('You can look at the steps, but not tick them.')).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'Begun by mistake' })).not.toBeInTheDocument();
  });

  it('that is a dose leads to the week sheet, one that is a test to its page; a seen drain waits for its morning', async () => {
    showSituations(aClearing(), { kind: 'clearing' });
    const list = await steps();
    expect(within(list).getByText('2.1 L liquid chlorine')).toBeInTheDocument();
    expect(within(list).getByText('About 20:40, pump on until 23:40')).toBeInTheDocument();
    expect(within(list).getByRole('link', { name: 'See the steps on the week sheet' })).toHaveAttribute(
      'href',
      '/week',
    );
    expect(within(list).getByRole('link', { name: 'Enter a test' })).toHaveAttribute('href', '/test');
    const drain = within(list).getByRole('checkbox', { name: /^The bottom drain is plain to see/ });
    expect(drain).toHaveAttribute('aria-disabled', 'true');
    expect(within(list).getByText('It can be ticked on its day.')).toBeInTheDocument();
  });

  it('late at night belongs to the household’s day', async () => {
    const late = { at: '2026-07-11T22:30:00Z' };
    showSituations(storm(late), { kind: 'storm' });
    expect(within(await steps()).getByRole('heading', { name: 'Sunday 12 July' })).toHaveAttribute(
      'aria-current',
      'date',
    );
  });

  it('of a named adult names them', async () => {
    const step = aStep('adult-tests-weekly', { kind: 'test', at: now });
    showSituations(aSituations({ kind: 'away', procedure: { branch: 'with-adult', steps: [step] } }), { kind: 'away' });
    expect(await screen.findByText('Ilse tests every week')).toBeInTheDocument();
  });
});

describe('the answers', () => {
  it('can be given again, from those that stand', async () => {
    const { sent, user } = showSituations(aClearing(), { kind: 'clearing', answers: [aClearing()] });
    expect(
      await screen.findByText(/Stabilizer is 34 mg\/L; up to 60 mg\/L no water needs replacing first\./),
    ).toBeInTheDocument();
    expect(screen.getByText(/Evening 3 of 4 at most\./)).toBeInTheDocument();
    await user.click(screen.getByRole('button', { name: 'Answer again' }));
    expect(screen.getByRole('radio', { name: 'not at all' })).toBeChecked();
    await user.click(screen.getByRole('radio', { name: 'hazy' }));
    await user.click(screen.getByRole('button', { name: 'Keep these answers' }));
    await waitFor(() => expect(screen.queryByRole('radio')).not.toBeInTheDocument());
    expect(sent).toEqual([
      {
        ...{ address: `/api/situations/${situationId}`, method: 'PUT' },
        body: { situation: { kind: 'clearing', answers: { drain: 'hazy', look: 'green', addedInLastDay: 'no' } } },
      },
    ]);
  });
});

describe('the end', () => {
  it('is offered as done only when its rule is met', async () => {
    showSituations(storm(), { kind: 'storm' });
    await steps();
    expect(screen.queryByRole('button', { name: 'It is done' })).not.toBeInTheDocument();
  });

  it('ends, and says what the water needs', async () => {
    const finished = aSituations({
      kind: 'storm',
      procedure: { branch: 'look-round', done: true, steps: [aStep('skim', done)] },
    });
    const { sent } = showSituations(finished, { kind: 'storm', answers: [aSituations()] });
    fireEvent.click(await screen.findByRole('button', { name: 'It is done' }));
    expect(await screen.findByText(/^It is written down as over\./)).toHaveAttribute('role', 'status');
    expect(sent).toMatchObject([{ address: `/api/situations/${situationId}/end`, body: { ending: 'done' } }]);
    expect(await screen.findByRole('button', { name: 'Begin' })).toBeInTheDocument();
  });

  it.each([
    ['Begun by mistake', 'mistake', 'Yes, begun by mistake'],
    ['A professional has taken over', 'professional', 'Yes, they have'],
  ] as const)('%s is asked once more, with what it means for the water', async (button, ending, yes) => {
    const { sent, user } = showSituations(storm(), { kind: 'storm', answers: [aSituations()] });
    await user.click(await screen.findByRole('button', { name: button }));
    const dialog = await screen.findByRole('dialog');
    expect(dialog).toHaveTextContent(/needs a test before anyone swims/);
    expect(sent).toEqual([]);
    await user.click(within(dialog).getByRole('button', { name: 'Leave it open' }));
    await waitFor(() => expect(screen.queryByRole('dialog')).not.toBeInTheDocument());
    await user.click(screen.getByRole('button', { name: button }));
    await user.click(await screen.findByRole('button', { name: yes }));
    await waitFor(() => expect(sent).toMatchObject([{ body: { ending } }]));
  });

  it('has the professional’s phone one tap away', async () => {
    const procedure = { branch: 'treatment-evenings', callWhen: ['four-evenings'] };
    showSituations(aSituations({ kind: 'clearing', procedure }), { kind: 'clearing' });
    const call = await screen.findByRole('link', { name: /Pond and Sons/ });
    expect(call).toHaveAttribute('href', 'tel:5550100');
  });

  it('says when it is time to call a professional', async () => {
    showSituations(aSituations({ kind: 'stain', procedure: { branch: 'professional', callNow: true } }), {
      kind: 'stain',
    });
    expect(await screen.findByText('It is time to call a professional.')).toBeInTheDocument();
  });
});

describe('the headline', () => {
  it.each([
    [{ code: 'dose-tonight', at: '2026-07-12T20:40:00+02:00' }, 'Tonight: a dose, about 20:40.'],
    [{ code: 'dose-on', at: '2026-07-13T20:40:00+02:00' }, 'Next: a dose tomorrow, about 20:40.'],
    [{ code: 'test-next', at: '2026-07-13T08:00:00+02:00' }, 'Next: a test, Monday morning.'],
    [{ code: 'test-next', at: '2026-07-10T08:00:00+02:00' }, 'A test was due Friday morning.'],
    [{ code: 'test-next' }, 'Next: a test.'],
    [{ code: 'out-accident' }, 'Stay out: an accident in the water.'],
  ])('%o says it in words', async (headline, said) => {
    showSituations(aSituations({ kind: 'storm', procedure: { branch: 'look-round', headline } }), { kind: 'storm' });
    expect(await screen.findByRole('heading', { level: 1, name: said })).toBeInTheDocument();
  });
});
