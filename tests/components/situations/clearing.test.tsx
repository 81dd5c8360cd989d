import { screen, waitFor, within } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { aClearing } from '../../support/situations';
import { showSituations } from './show-situations';

vi.setConfig({ testTimeout: 20_000 });
afterEach(() => {
  vi.unstubAllGlobals();
  vi.restoreAllMocks();
});

/** Five days, one of them 182 px wide. */
const plot = 910;
const xOf = (day: number, hour: number) => ((day * 24 + hour) / 120) * plot;

async function drawn() {
  showSituations(aClearing(), { kind: 'clearing', plot });
  const picture = await screen.findByRole('img', { name: /^Free chlorine from/ }, { timeout: 15_000 });
  return picture.parentElement!;
}

describe('free chlorine of a clearing', () => {
  it('says in one sentence what is drawn', async () => {
    await drawn();
    expect(
      screen.getByRole('img', {
        name: 'Free chlorine from Thursday 9 July to Monday 13 July, never over 10: 4 readings, 0.6, 4.2, 6.9, 8.5; 1 of 3 not under the ordinary band.',
      }),
    ).toBeInTheDocument();
  });

  it('draws the band of each morning 18 px wide, readings filled outside it and hollow inside', async () => {
    const chart = await drawn();
    const bars = [...chart.querySelectorAll('[data-mark="ordinary-band"] rect')];
    expect(bars.map((bar) => bar.getAttribute('width'))).toEqual(['18', '18', '18', '18']);
    expect(Number(bars[0]?.getAttribute('x')) + 9).toBeCloseTo(xOf(1, 7 + 1 / 6), 1);
    // The morning that is still to come stands at eight.
    expect(Number(bars[3]?.getAttribute('x')) + 9).toBeCloseTo(xOf(4, 8), 1);
    const outside = [...chart.querySelectorAll('[data-mark="outside"]')].map((dot) => Number(dot.getAttribute('cx')));
    expect(outside).toHaveLength(2);
    expect(outside[0]).toBeCloseTo(xOf(1, 7 + 1 / 6), 1);
    expect(chart.querySelectorAll('[data-mark="inside"].fill-paper-lift')).toHaveLength(2);
  });

  it('names ten, the swim limit and the lowest level on their lines, and hatches each', async () => {
    const chart = await drawn();
    const said = [...chart.querySelectorAll('text')].map(({ textContent }) => textContent);
    expect(said).toEqual(
      expect.arrayContaining([
        'Never over 10',
        'Swim limit 4',
        'Lowest level 2: below it germs are killed too slowly',
        'now, 08:10',
        '8.5',
      ]),
    );
    // What lies in a layer of its own is drawn a moment later.
    await waitFor(() =>
      expect(chart.querySelectorAll('.recharts-reference-area path[fill="url(#chart-hatch)"]')).toHaveLength(3),
    );
  });

  it('counts the mornings and says how far each lay below', async () => {
    await drawn();
    const lane = screen.getByRole('region', { name: 'Mornings' });
    for (const words of ['before', '1st of two', 'the 2nd, if both hold', '3.7 below', '1.0 below', 'inside'])
      expect(within(lane).getByText(words)).toBeInTheDocument();
    expect(within(lane).getAllByText('not yet')).toHaveLength(2);
    expect(within(lane).getByText('no')).toBeInTheDocument();
    expect(within(lane).getByText('not said')).toBeInTheDocument();
    expect(within(lane).getByText('yes')).toBeInTheDocument();
  });

  it('is there as figures too', async () => {
    await drawn();
    const table = screen.getByRole('table', {
      name: 'Readings against the ordinary band of the morning',
      hidden: true,
    });
    expect(table).toHaveTextContent('Fri 10, 07:104.27.9 to 9.13.7 below');
    expect(
      screen.getByRole('table', { name: /^Free chlorine, hour by hour, from Thu 9, 18:00/, hidden: true }),
    ).toBeInTheDocument();
  });

  it('on a phone has its steps below as a list', async () => {
    showSituations(aClearing(), { kind: 'clearing', width: 390 });
    const steps = await screen.findByRole('region', { name: 'Steps' });
    expect(within(steps).getByText('Earlier days, all done')).toBeInTheDocument();
    expect(within(steps).getByRole('heading', { name: 'Sunday 12 July' })).toBeInTheDocument();
  });
});
