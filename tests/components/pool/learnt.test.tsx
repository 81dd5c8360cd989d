import { screen, waitFor, within } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { PoolProfile } from '@/components/pool/pool-profile';
import { type Learnt, learntSchema } from '@/lib/schemas/learnt';
import { enteredSize, setupAnswers } from '@/tests/support/setup-answers';
import { renderWithWords } from '@/tests/support/with-words';
import { aLearntPool, untaught, withRow } from './a-learnt-pool';
import { fakePoolServer } from './fake-pool-server';
import { household, user } from './render-step';

afterEach(() => vi.unstubAllGlobals());

type Answer = Learnt | { status: number; code: string; message: string };

/** The pool page of a household, with what its server says of learning, before and after it begins again. */
async function showPool(
  learnt: Answer,
  {
    afterwards = untaught,
    mayForget = true,
    us = false,
  }: { afterwards?: Answer; mayForget?: boolean; us?: boolean } = {},
) {
  const size = { step: 'size', answers: { ...enteredSize, volume: 68, unit: 'm3', sure: true } } as const;
  const { answer } = fakePoolServer(setupAnswers.map((step) => (step.step === 'size' ? size : step)));
  const sent: string[] = [];
  let now: Answer = learnt;
  const reply = (what: Answer) =>
    'status' in what
      ? Response.json({ error: { ...what, problems: [] } }, { status: what.status })
      : Response.json(learntSchema.parse(what));
  vi.stubGlobal(
    'fetch',
    vi.fn<typeof fetch>(async (address, options) => {
      if (String(address) !== '/api/learnt') return answer(address, options);
      if (options?.method === 'DELETE') {
        sent.push('DELETE');
        if (!('status' in afterwards)) now = afterwards;
        return reply(afterwards);
      }
      return reply(now);
    }),
  );
  const setting = { ...household, ...(us ? { unitSystem: 'us' as const, locale: 'en-US' } : {}) };
  renderWithWords(<PoolProfile household={setting} mayForget={mayForget} />);
  const section = within(await screen.findByRole('region', { name: 'What your pool has taught us' }));
  await waitFor(() => expect(section.queryByRole('status', { name: /Looking up/ })).not.toBeInTheDocument());
  return { section, sent };
}

const rowOf = async (section: Awaited<ReturnType<typeof showPool>>['section'], name: string) =>
  within((await section.findByRole('heading', { level: 3, name })).closest('section')!);

describe('what the pool has taught', () => {
  it('stands in bars and in words, with what was assumed before', async () => {
    const { section } = await showPool(aLearntPool());
    const loss = await rowOf(section, 'A usual day');
    for (const words of [
      'free chlorine lost from 3.0 mg/L, nobody swimming',
      'before: 0.8 to 2.2',
      'learnt: 1.2 to 1.5',
    ])
      expect(loss.getByText(words)).toBeInTheDocument();
    expect(loss.getByText('Loses about 1.4 mg/L')).toBeInTheDocument();
    expect(loss.getByText('Less than such a pool with this stabilizer usually loses.')).toBeInTheDocument();
    const tablet = await rowOf(section, 'A slow tablet');
    expect(tablet.getByText('in your feeder, pump on 8 h a day')).toBeInTheDocument();
    expect(tablet.getByText('Lasts about 7 days')).toBeInTheDocument();
  });

  it('is said in one sentence, thing by thing', async () => {
    const { section } = await showPool(aLearntPool());
    const sentence = (await section.findByRole('figure')).querySelector('figcaption')?.textContent ?? '';
    expect(sentence).toMatch(
      /^What we assumed of the pool before, and what it has taught: A usual day 0\.8 to 2\.2 mg\/L before, 1\.2 to 1\.5 mg\/L now; /,
    );
    expect(sentence).toContain('Its size 61 to 75 m³ before, 69 to 74 m³ now');
  });

  it('draws each bar from its tenth to its ninetieth percentile on one axis', async () => {
    const { section } = await showPool(aLearntPool());
    const svg = (await section.findByText('learnt: 69 to 74')).closest('svg')!;
    const [before, learnt] = [...svg.querySelectorAll('rect')].map((bar) => ({
      from: Number(bar.getAttribute('x')),
      width: Number(bar.getAttribute('width')),
    }));
    // 61 to 75 and 69 to 74: the lower bar is 5/14 as wide and begins 8/14 along the upper one.
    expect(learnt!.width / before!.width).toBeCloseTo(5 / 14, 2);
    expect((learnt!.from - before!.from) / before!.width).toBeCloseTo(8 / 14, 2);
  });

  it('says a clear and different volume first, and for what it is used', async () => {
    const { section } = await showPool(aLearntPool());
    expect(
      await screen.findByRole('heading', { level: 1, name: 'It behaves as if it held 71 m³.' }),
    ).toBeInTheDocument();
    expect(
      screen.getByText(
        'You entered 68 m³, and that stays. 11 tests say chlorine spreads a little thinner, so chlorine is worked out for 71 m³; everything else for 68 m³.',
      ),
    ).toBeInTheDocument();
    const size = await rowOf(section, 'Its size');
    expect(
      size.getByText(/^Chlorine is worked out for 71 m³, everything else for the 68 m³ you entered\./),
    ).toBeInTheDocument();
  });

  it.each([
    ['is not clear', { clear: false }],
    ['has the entered one in its likely range', { learnt: { p10: 66, p50: 71, p90: 76 } }],
  ])('leaves the headline to the entered volume while the learnt one %s', async (_why, change) => {
    await showPool(withRow(aLearntPool(), 'volume', change));
    await screen.findByText(/Behaves like 71/);
    expect(screen.getByRole('heading', { level: 1, name: 'Alder Row: 68 m³' })).toBeInTheDocument();
  });

  it('asks for a tape measure where the volume lies further off than it may be used', async () => {
    const far = withRow(aLearntPool({ measureVolumeAgain: true }), 'volume', {
      learnt: { p10: 76, p50: 78.2, p90: 80 },
    });
    const { section } = await showPool(far);
    const size = await rowOf(section, 'Its size');
    expect(size.getByText('Measure the pool again.')).toBeInTheDocument();
    expect(
      size.getByText(/Until it is measured, chlorine is worked out for 78 m³, everything else for 68 m³\.$/),
    ).toBeInTheDocument();
    expect(screen.getByRole('heading', { level: 1, name: 'Alder Row: 68 m³' })).toBeInTheDocument();
  });

  it('owns up to what it still guesses', async () => {
    const { section } = await showPool(aLearntPool());
    const swimmer = await rowOf(section, 'A swimmer');
    expect(swimmer.getByText(/^No test has told of it yet\./)).toBeInTheDocument();
    const guesses = within(screen.getByRole('heading', { level: 2, name: 'What still guesses' }).closest('section')!);
    expect(guesses.getByText(/^The sun; A swimmer\. Tests on mornings/)).toBeInTheDocument();
  });

  it('is in US measures for those who use them', async () => {
    const { section } = await showPool(aLearntPool(), { us: true });
    const size = await rowOf(section, 'Its size');
    // 71 m3 are 18,756 US gallons.
    expect(size.getByText('Behaves like 18800 US gal')).toBeInTheDocument();
    expect(size.getByText('learnt: 18200 to 19500')).toBeInTheDocument();
    expect((await rowOf(section, 'A usual day')).getByText('Loses about 1.4 ppm')).toBeInTheDocument();
  });

  it('can be read as a table', async () => {
    const { section } = await showPool(aLearntPool());
    await user.click(await section.findByRole('button', { name: 'See as a table' }));
    const row = section.getByRole('row', { name: /^Its size/ });
    expect(
      within(row)
        .getAllByRole('cell')
        .map(({ textContent }) => textContent),
    ).toEqual(['61 to 75 m³', '69 to 74 m³', '5']);
    expect(section.getAllByRole('row')).toHaveLength(6);
  });
});

describe('why we think so', () => {
  const noted = aLearntPool({
    stoodOut: [
      {
        takenAt: '2026-06-03T09:00:00-04:00',
        kind: 'unrecorded-dose',
        quantity: 'freeChlorine',
        measured: 5,
        low: 1.04,
        high: 2,
      },
      {
        takenAt: '2026-06-02T09:00:00-04:00',
        kind: 'questioned',
        quantity: 'freeChlorine',
        measured: 12,
        low: 2,
        high: 4,
      },
      {
        takenAt: '2026-05-20T09:00:00-04:00',
        kind: 'questioned',
        quantity: 'tabletsLeft',
        measured: 3,
        low: 0.2,
        high: 1.4,
      },
      { takenAt: '2026-05-19T09:00:00-04:00', kind: 'believed', quantity: 'pH', measured: 7.9, low: 7.3, high: 7.6 },
    ],
  });

  it('unfolds how many tests counted and which of them stood out, with their days', async () => {
    const { section } = await showPool(noted);
    const loss = await rowOf(section, 'A usual day');
    const open = loss.getByRole('button', { name: 'Why we think so: A usual day' });
    expect(open).toHaveAttribute('aria-expanded', 'false');
    await user.click(open);
    expect(open).toHaveAttribute('aria-expanded', 'true');
    expect(loss.getByText('11 tests so far; 9 of them made this clearer.')).toBeVisible();
    expect(loss.getAllByRole('listitem').map(({ textContent }) => textContent)).toEqual([
      '3 June: Free chlorine of 5.0 is more than can be left of what was recorded, 1.0 to 2.0 mg/L. Somebody added some; that taught nothing about the pool.',
      '2 June: Free chlorine of 12.0 was far from the 2.0 to 4.0 mg/L that was expected. It counted little.',
    ]);
  });

  it('tells of counts in the feeder where tablets are spoken of', async () => {
    const { section } = await showPool(noted);
    const tablet = await rowOf(section, 'A slow tablet');
    await user.click(tablet.getByRole('button', { name: /^Why/ }));
    expect(tablet.getByText(/^Before 20 May: 3 whole tablets left, far from the 0\.2 to 1\.4/)).toBeVisible();
  });

  it('says so where nothing stood out', async () => {
    const { section } = await showPool(aLearntPool());
    const size = await rowOf(section, 'Its size');
    await user.click(size.getByRole('button', { name: /^Why/ }));
    expect(size.getByText('No test stood out.')).toBeVisible();
    expect(size.getByText(/^Before them we assumed 61 to 75 m³/)).toBeVisible();
  });
});

describe('before there are tests enough', () => {
  it.each([
    [0, /^Nothing yet\. The first test says where the water stands/],
    [2, /^Not much yet: 2 tests are too few to tell this pool from others\./],
  ])('%i tests are a sentence and no bar', async (readings, words) => {
    const { section } = await showPool(aLearntPool({ readings, ...(readings === 0 ? { rows: [] } : {}) }));
    expect(await section.findByText(words)).toBeInTheDocument();
    expect(section.queryByText(/^before:/)).not.toBeInTheDocument();
    expect(screen.queryByText('What still guesses')).not.toBeInTheDocument();
    expect(screen.getByRole('heading', { level: 1, name: 'Alder Row: 68 m³' })).toBeInTheDocument();
  });
});

describe('starting again', () => {
  const open = { name: 'Start learning again…' };

  it('is asked once more, then the bars are gone', async () => {
    const { section, sent } = await showPool(aLearntPool());
    await user.click(await section.findByRole('button', open));
    const dialog = within(await screen.findByRole('dialog', { name: 'Start learning again?' }));
    expect(dialog.getByText(/^The log and the drawing stay\..* about three weeks\./)).toBeInTheDocument();
    expect(sent).toEqual([]);
    await user.click(dialog.getByRole('button', { name: 'Yes, start again' }));
    expect(await section.findByText(/^Nothing yet\./)).toBeInTheDocument();
    expect(sent).toEqual(['DELETE']);
    expect(screen.getByRole('heading', { level: 1, name: 'Alder Row: 68 m³' })).toBeInTheDocument();
  });

  it('keeps everything when it is not confirmed', async () => {
    const { section, sent } = await showPool(aLearntPool());
    await user.click(await section.findByRole('button', open));
    await user.click(await screen.findByRole('button', { name: 'Keep what it taught' }));
    await waitFor(() => expect(screen.queryByRole('dialog')).not.toBeInTheDocument());
    expect(sent).toEqual([]);
    expect(section.getByText('learnt: 69 to 74')).toBeInTheDocument();
  });

  it('says why it was not done', async () => {
    const refused = { status: 403, code: 'not-allowed', message: 'Only an owner can let the pool be learnt anew.' };
    const { section } = await showPool(aLearntPool(), { afterwards: refused });
    await user.click(await section.findByRole('button', open));
    await user.click(await screen.findByRole('button', { name: 'Yes, start again' }));
    expect(await screen.findByRole('alert')).toHaveTextContent(/^Nothing was put aside\./);
    expect(section.getByText('learnt: 69 to 74')).toBeInTheDocument();
  });

  it('is an owner’s, and others read so', async () => {
    const { section } = await showPool(aLearntPool(), { mayForget: false });
    expect(await section.findByText('An owner of this household can start learning again.')).toBeInTheDocument();
    expect(section.queryByRole('button', open)).not.toBeInTheDocument();
  });
});

it('says when it could not be looked up, and looks again', async () => {
  const { section } = await showPool({ status: 500, code: 'unexpected', message: 'a fault' });
  expect(await section.findByText('What the pool has taught could not be looked up.')).toBeInTheDocument();
  expect(section.getByRole('button', { name: 'Try again' })).toBeInTheDocument();
});
