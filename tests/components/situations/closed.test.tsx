import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { cautionsBefore } from '@/lib/client/cautions-before';
import { questionsOf } from '@/components/situations/questions';
import words from '@/lib/messages/en/situations.json';
import { type SituationKind, situationKinds } from '@/lib/schemas/situation';
import { aSituations } from '../../support/situations';
import { inOrder, showSituations } from './show-situations';

vi.setConfig({ testTimeout: 20_000 });
afterEach(() => {
  vi.unstubAllGlobals();
  vi.restoreAllMocks();
});

const begin = () => screen.findByRole('button', { name: 'Begin' });

describe.each(situationKinds)('%s, not begun', (kind: SituationKind) => {
  it('says what protects first, then asks, then can be begun', async () => {
    showSituations(aSituations(), { kind });
    const button = await begin();
    expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent(words.kind[kind].name);
    const cautions = screen.getByRole('region', { name: 'Cautions' });
    const titles = cautionsBefore(kind).map(({ code }) => within(cautions).getByText(words.caution[code].title));
    const stops = titles.filter((_, index) => cautionsBefore(kind)[index]!.severity === 'stop');
    const others = titles.filter((title) => !stops.includes(title));
    const questions = screen.queryByRole('region', { name: 'Questions' });
    expect(questions !== null).toBe(questionsOf(kind).length > 0);
    expect(inOrder([...stops, ...others, ...(questions ? [questions] : []), button])).toBe(true);
    expect(screen.getByText('It leads the plan until it is done.')).toBeInTheDocument();
  });

  it('has nothing chosen beforehand, and does not begin unanswered', async () => {
    const { sent } = showSituations(aSituations(), { kind, answers: [aSituations({ kind })] });
    const button = await begin();
    for (const radio of screen.queryAllByRole('radio')) expect(radio).not.toBeChecked();
    fireEvent.click(button);
    if (questionsOf(kind).length > 0) {
      expect((await screen.findAllByText(/^Choose (one|a day)\.$/)).length).toBeGreaterThan(0);
      expect(sent).toEqual([]);
    } else await waitFor(() => expect(sent).toMatchObject([{ body: { situation: { kind, answers: {} } } }]));
  });
});

describe('a page of one kind', () => {
  it('of an accident: everyone out stands there before the server has answered, above everything else', () => {
    showSituations(new Promise(() => {}), { kind: 'accident' });
    const [first] = screen.getAllByText('Stop');
    const title = screen.getByText('Everyone out of the water, now.');
    expect(inOrder([first!, title, screen.getByText('What is open is being looked up')])).toBe(true);
    expect(screen.queryByRole('radio')).not.toBeInTheDocument();
    expect(screen.getAllByRole('link', { name: 'Emergency card' })[0]).toHaveAttribute('href', '/help/emergency');
  });

  it('asks further only what the answer before leaves open, and sends no answer to what is not asked', async () => {
    const { sent, user } = showSituations(aSituations(), {
      kind: 'accident',
      answers: [aSituations({ kind: 'accident' })],
    });
    await begin();
    await user.click(screen.getByRole('radio', { name: 'Vomit' }));
    await user.click(await screen.findByRole('radio', { name: 'yes' }));
    await user.click(screen.getByRole('radio', { name: 'A dead animal' }));
    expect(screen.queryByText('Is it more than swallowed water?')).not.toBeInTheDocument();
    await user.click(await begin());
    expect(await screen.findByText('Choose one.')).toBeInTheDocument();
    await user.click(screen.getByRole('radio', { name: 'another one' }));
    await user.click(await begin());
    await waitFor(() => expect(sent).toHaveLength(1));
    expect(sent[0]).toMatchObject({
      address: '/api/situations',
      body: { situation: { kind: 'accident', answers: { what: 'dead-animal', animal: 'other' } } },
    });
  });

  it('is begun once by two presses, and by a press again after no answer', async () => {
    const { sent } = showSituations(aSituations(), { kind: 'drain-cover', answers: ['no answer'] });
    fireEvent.click(await begin());
    expect(await screen.findByRole('alert')).toBeInTheDocument();
    fireEvent.click(await begin());
    await waitFor(() => expect(sent).toHaveLength(2));
    const ids = sent.map(({ body }) => (body as { id: string }).id);
    expect(new Set(ids).size).toBe(1);
  });

  it('does not leave a pool alone for more than seven days, and says why beside the question', async () => {
    const { sent, user } = showSituations(aSituations(), { kind: 'away' });
    await begin();
    fireEvent.change(screen.getByLabelText('The day you leave'), { target: { value: '2026-07-14' } });
    fireEvent.change(screen.getByLabelText('The day you are back'), { target: { value: '2026-07-24' } });
    await user.click(screen.getByRole('radio', { name: /^Nobody, up to 7 days/ }));
    await user.click(await begin());
    expect(await screen.findByText(/Longer than seven days needs a named adult/)).toBeInTheDocument();
    await user.click(screen.getByRole('radio', { name: /^A named adult/ }));
    expect(screen.getByText('Write who looks after the pool.')).toBeInTheDocument();
    expect(sent).toEqual([]);
  });

  it('while another is open: why not, the way there, and the cautions all the same', async () => {
    showSituations(aSituations({ kind: 'clearing' }), { kind: 'storm' });
    expect(
      await screen.findByText(/^Only one can be open at a time, and now it is: Green, cloudy\./),
    ).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'To the open one' })).toHaveAttribute('href', '/situations/clearing');
    expect(screen.queryByRole('button', { name: 'Begin' })).not.toBeInTheDocument();
    expect(screen.getByText(words.caution.thunder.title)).toBeInTheDocument();
  });

  it('tells who only looks whom to call', async () => {
    showSituations(aSituations(), { kind: 'accident', mayOpen: false });
    expect(await screen.findByText(/You see this page and change nothing/)).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'Begin' })).not.toBeInTheDocument();
    expect(screen.queryByRole('radio')).not.toBeInTheDocument();
    expect(screen.getByText('Everyone out of the water, now.')).toBeInTheDocument();
  });

  it('says the level of a day in the household’s unit', async () => {
    showSituations(aSituations(), { kind: 'stabilizer-high', unitSystem: 'us', locale: 'en-US' });
    await begin();
    expect(screen.getByText(/Elsewhere 6 in of level a day/)).toBeInTheDocument();
  });

  it('keeps the cautions when the server does not answer, and can ask again', async () => {
    showSituations(Promise.reject(new TypeError('Failed to fetch')), { kind: 'accident' });
    expect(await screen.findByText('What is open could not be looked up.')).toBeInTheDocument();
    expect(screen.getByText('Everyone out of the water, now.')).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Try again' })).toBeInTheDocument();
  });
});

describe('the index', () => {
  it('groups all of them by when, most urgent first, and marks the open one', async () => {
    showSituations(aSituations({ kind: 'clearing' }));
    const index = await screen.findByRole('navigation', { name: 'Situations by urgency' });
    expect(await within(index).findByText('open, day 4')).toBeInTheDocument();
    const links = within(index).getAllByRole('link');
    expect(links.map((link) => link.getAttribute('href'))).toEqual(
      [
        ...[
          'accident',
          'clearing',
          'combined-chlorine',
          'drain-cover',
          'quick-raise',
          'storm',
          'cover',
          'stain',
          'away',
        ],
        ...['stabilizer-high', 'hardness-high', 'opening', 'closing'],
      ].map((kind) => `/situations/${kind}`),
    );
    expect(
      within(index)
        .getAllByRole('heading')
        .map(({ textContent }) => textContent),
    ).toEqual(Object.values(words.group));
  });

  it('lists what is over with its days and how it ended', async () => {
    showSituations(
      aSituations({}, [
        {
          ...{ id: '0b8d3f4e-6b0e-4a1c-9d0b-3f5a6c7d8e90', kind: 'storm', ending: 'professional', endedBy: 'Joost' },
          // Past midnight at the pool, still the day before in Greenwich.
          ...{ openedAt: '2026-06-01T00:30:00+02:00', endedAt: '2026-06-02T09:00:00+02:00' },
        },
      ]),
    );
    const over = await screen.findByRole('region', { name: 'Over' });
    expect(over).toHaveTextContent('Storm1 June to 2 June 2026, a professional took over, Joost');
  });
});
