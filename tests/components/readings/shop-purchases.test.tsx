import { screen, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { HouseholdProduct } from '@/lib/schemas/household-product';
import { type WeekSheet, weekSheetSchema } from '@/lib/schemas/week-sheet';
import { aWeekSheet } from '@/tests/support/week-sheet';
import { fakeTestServer } from './fake-test-server';
import { fill, openTest, save, screenOf, user } from './render-test';

beforeEach(() => {
  localStorage.clear();
  screenOf('phone');
});
afterEach(() => vi.unstubAllGlobals());

const week = weekSheetSchema.parse(aWeekSheet());
const shelf = (stock: number): HouseholdProduct[] => {
  const ids = new Set(week.doses.flatMap(({ product, form }) => (form === 'granular' && product ? [product] : [])));
  return [...ids].map((id) => ({
    ...{ id, form: 'granular' as const, substance: 'calcium-hypochlorite' as const, strength: 65, alkali: 0 },
    ...{ labelWay: 'dissolve' as const, measure: 50, stock, storedAt: 25 },
  }));
};

async function savedSlip(sheet: WeekSheet, products: HouseholdProduct[]) {
  fakeTestServer(sheet, products);
  await openTest(sheet, { kind: 'quick' });
  await user.click(screen.getByRole('radio', { name: 'Shop slip' }));
  fill('Free chlorine', '3');
  fill('pH', '7.4');
  await user.click(save());
  return within(await screen.findByRole('region', { name: 'What did the shop say to buy?' }));
}
const tell = (section: Awaited<ReturnType<typeof savedSlip>>, name: string | RegExp) =>
  user.click(section.getByRole('button', { name }));

describe('what the shop said to buy', () => {
  it('is nothing where the shelf holds enough, and says so of each', async () => {
    const section = await savedSlip(week, shelf(4000));
    expect(await section.findByText('This week needs nothing from the shop: buy nothing.')).toBeInTheDocument();
    await tell(section, /^Chlorine granules/);
    expect(section.getByText(/This week takes .* g; 4 kg stands on the shelf\. Buy none\./)).toBeInTheDocument();
    await tell(section, /^Stabilizer/);
    expect(section.getByText(/This week does not need it\./)).toBeInTheDocument();
  });

  it('says what is needed, and that of what the shop said nothing is', async () => {
    const section = await savedSlip(week, shelf(10));
    expect(await section.findByText(/^To buy for this week: Chlorine granules/)).toBeInTheDocument();
    await tell(section, /^Soda/);
    expect(section.getByText(/buy nothing of it/)).toBeInTheDocument();
    await tell(section, /^Chlorine granules/);
    expect(section.queryByText(/buy nothing of it/)).toBeNull();
    expect(section.getByText(/This week needs it: .* of which 10 g stands on the shelf/)).toBeInTheDocument();
  });

  it('keeps away what Wadewell never plans', async () => {
    const section = await savedSlip(week, shelf(4000));
    await section.findByText(/buy nothing/);
    for (const name of [/copper/, /clearing/, /blend/]) await tell(section, name);
    expect(section.getAllByText(/Keep away: not planned by Wadewell\./)).toHaveLength(3);
  });

  it.each([
    ['no plan', { plan: null }],
    ['a stale plan', { plan: week.plan && { ...week.plan, stale: true } }],
    ['a plan that waits for a measurement', { plan: week.plan && { ...week.plan, cost: null } }],
  ])('says that nothing can be said yet with %s', async (_, changes) => {
    const section = await savedSlip({ ...week, ...changes }, shelf(4000));
    expect(await section.findByText(/^No plan stands/)).toBeInTheDocument();
    expect(section.queryByRole('button')).toBeNull();
  });
});
