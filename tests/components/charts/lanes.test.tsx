import { screen, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { aWeekSheet } from '../../support/week-sheet';
import { showSheet } from '../week-sheet/show-sheet';

beforeEach(() => localStorage.clear());
afterEach(() => vi.restoreAllMocks());

const plot = 910;
const xAt = (hour: number) => (hour / 168) * plot;

/** The charts of a sheet, drawn 910 px wide; one hour is 5.4 px. */
async function drawn() {
  const sheet = aWeekSheet();
  const page = await showSheet(sheet, { plot });
  const chart = async (name: RegExp) => (await screen.findByRole('img', { name }, { timeout: 15_000 })).parentElement!;
  const chlorine = await chart(/^Free chlorine hour by hour: about \d\.\d now/);
  return { ...page, sheet, chart, chlorine };
}

function xOfPath(path: Element | null | undefined): number[] {
  return [...(path?.getAttribute('d') ?? '').matchAll(/[ML](-?[\d.]+),/g)].map(([, x]) => Number(x));
}

describe('the charts of the week', () => {
  it('share one time axis', async () => {
    const { chart, chlorine } = await drawn();
    const lanes = [chlorine, await chart(/^pH hour by hour/), await chart(/^Stabilizer hour by hour/)];
    const nights = lanes.map((lane) =>
      [...lane.querySelectorAll('.recharts-reference-area.text-night path')].map((night) => night.getAttribute('x')),
    );
    expect(nights[0]).toHaveLength(8);
    expect(nights[1]).toEqual(nights[0]);
    expect(nights[2]).toEqual(nights[0]);
  });

  it('draw what was promised thin up to now, and from now on what is expected at full weight', async () => {
    const { chlorine } = await drawn();
    const [behind, ahead] = ['1.69', '2.6'].map((weight) =>
      [...chlorine.querySelectorAll('.text-teal path.recharts-line-curve')].find((path) =>
        path.getAttribute('stroke-width')?.startsWith(weight),
      ),
    );
    const now = xAt(2 * 24 + 10 + 1 / 3);
    expect(xOfPath(behind)[0]).toBeCloseTo(0, 3);
    expect(xOfPath(behind).at(-1)).toBeCloseTo(now, 2);
    expect(xOfPath(ahead)[0]).toBeCloseTo(now, 2);
    // The plan runs 168 hours from Sunday 19:00 and ends before the week does.
    expect(xOfPath(ahead).at(-1)).toBeCloseTo(xAt(6 * 24 + 19), 2);
  });

  it('mark a drop test with a dot and a strip between two steps with a bar', async () => {
    const { chlorine } = await drawn();
    expect(chlorine.querySelectorAll('.recharts-scatter-symbol circle')).toHaveLength(1);
    expect(chlorine.querySelectorAll('.recharts-errorBar')).toHaveLength(2);
    expect(within(chlorine).getByText('Drop kit 3.3')).toBeInTheDocument();
    expect(within(chlorine).getByText('Strip: between')).toBeInTheDocument();
    expect(within(chlorine).getByText('1 and 3')).toBeInTheDocument();
  });

  it('label limits, now and doses on the lines themselves', async () => {
    const { chlorine } = await drawn();
    const words = [...chlorine.querySelectorAll('text')].map(({ textContent }) => textContent);
    expect(words).toEqual(
      expect.arrayContaining([
        'Swim limit 4, from the label: no one swims above',
        expect.stringMatching(/^Lowest level 2\.\d: below it germs are killed too slowly$/),
        expect.stringMatching(/^now, 10:20 \d\.\d$/),
        '+0.9',
        '95 g granules',
        'good range',
      ]),
    );
    expect(chlorine.querySelectorAll('.recharts-legend-wrapper')).toHaveLength(0);
  });
});
